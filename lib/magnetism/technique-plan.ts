import type { InputQuantity, StepDefinition } from './worked-step';

/** What a technique contributes: its inputs, and the steps from readings to the quantity where the common chain starts. */
export interface TechniquePlan {
  inputs: InputQuantity[];
  steps: StepDefinition[];
  /** The quantity that the steps end with, as observed (before purity): χ_g, χ_M or the moment itself */
  reaches: 'chiG' | 'chiM' | 'muEff';
  warnings: { code: string; message: string; field: string | null }[];
}

/** Volume susceptibility of air at 20 °C and 1 atm, cgs (dimensionless). Gouy-method texts, recalled (soft). */
export const AIR_VOLUME_SUSCEPTIBILITY = 0.029e-6;
export const AIR_SOURCE = 'air at 20 °C, 1 atm: 0.029·10⁻⁶ per cm³ (Gouy-method texts, recalled)';
