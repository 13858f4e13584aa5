import { HARTREE_EV } from '../chemistry/constants';
import { cite } from './cite';
import type { Line } from './landmark';
import type { Evidence, Step } from './record';

type Frontier = NonNullable<Step['orbitals']>['alpha'];

/** Collects the highest occupied and the lowest empty orbital of one spin while a list goes by. */
export class FrontierOrbitals {
  private homo: { ev: number; line: Line } | null = null;
  private lumo: { ev: number; line: Line } | null = null;

  add(energyEv: number, occupied: boolean, line: Line): void {
    if (occupied) {
      if (this.homo === null || energyEv > this.homo.ev) this.homo = { ev: energyEv, line };
    } else if (this.lumo === null || energyEv < this.lumo.ev) this.lumo = { ev: energyEv, line };
  }

  get isEmpty(): boolean {
    return this.homo === null && this.lumo === null;
  }

  /** The two energies, eV, with their lines kept as evidence under `orbitals.<spin>`. */
  read(holder: { evidence: Evidence }, spin: 'alpha' | 'beta'): Frontier {
    if (this.homo) cite(holder, `orbitals.${spin}.homoEv`, this.homo.line);
    if (this.lumo) cite(holder, `orbitals.${spin}.lumoEv`, this.lumo.line);
    return { homoEv: this.homo?.ev ?? null, lumoEv: this.lumo?.ev ?? null };
  }
}

/** Hartree to eV with no more digits than a printed orbital energy carries. */
export function toOrbitalEv(energyHartree: number): number {
  return Number((energyHartree * HARTREE_EV).toFixed(6));
}
