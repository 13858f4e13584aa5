import { AVOGADRO_PER_MOL, BOHR_MAGNETON_J_PER_T, BOLTZMANN_J_PER_K } from '../chemistry/constants';

/**
 * Factor of μ_eff = f √(χ_M T) with χ_M in cm³/mol (cgs-emu) and T in K, μ in μ_B: f = √(3 k_B/(N_A μ_B²)) in cgs,
 * 2.827869. In SI numbers √(30 k_B/N_A)/μ_B, since 1 cm³/mol ≙ 4π·10⁻⁶ m³/mol and μ₀ = 4π·10⁻⁷ (to 10⁻¹⁰).
 * Source: CODATA 2022. Checked against: tests/published/magnetism-magnetometry.test.ts.
 */
export const MOMENT_FACTOR = Math.sqrt((30 * BOLTZMANN_J_PER_K) / AVOGADRO_PER_MOL) / BOHR_MAGNETON_J_PER_T;
