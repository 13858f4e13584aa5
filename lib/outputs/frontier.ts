import { cite } from './cite';
import type { Line } from './landmark';
import type { Evidence, Step } from './record';

type Frontier = NonNullable<Step['orbitals']>['alpha'];

/** Collects the highest occupied and the lowest empty orbital of one spin while a list goes by. */
export class FrontierOrbitals {
  private homo = -Infinity;
  private lumo = Infinity;
  private homoLine: Line | null = null;
  private lumoLine: Line | null = null;

  /** The energy in any one unit. */
  add(energy: number, occupied: boolean, line: Line): void {
    if (occupied) {
      if (energy <= this.homo && this.homoLine) return;
      this.homo = energy;
      this.homoLine = line;
    } else if (energy < this.lumo) {
      this.lumo = energy;
      this.lumoLine = line;
    }
  }

  get isEmpty(): boolean {
    return this.homoLine === null && this.lumoLine === null;
  }

  get hasEmpty(): boolean {
    return this.lumoLine !== null;
  }

  /**
   * The two energies, eV, with their lines kept as evidence under `orbitals.<spin>`.
   * @param factor - eV in the unit of the energies; six decimals are kept where they are converted
   */
  read(holder: { evidence: Evidence }, spin: 'alpha' | 'beta', factor = 1): Frontier {
    const toEv = (energy: number) => (factor === 1 ? energy : Number((energy * factor).toFixed(6)));
    if (this.homoLine) cite(holder, `orbitals.${spin}.homoEv`, this.homoLine);
    if (this.lumoLine) cite(holder, `orbitals.${spin}.lumoEv`, this.lumoLine);
    return {
      homoEv: this.homoLine ? toEv(this.homo) : null,
      lumoEv: this.lumoLine ? toEv(this.lumo) : null,
    };
  }
}
