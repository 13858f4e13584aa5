/**
 * Physical constants and conversions. Source: CODATA 2022 recommended values (NIST SP 961, 2024)
 * unless a line says otherwise. Units are in the names.
 */
export const BOLTZMANN_J_PER_K = 1.380649e-23; // exact (SI 2019)
export const AVOGADRO_PER_MOL = 6.02214076e23; // exact (SI 2019)
export const BOHR_MAGNETON_J_PER_T = 9.2740100657e-24;
export const ELECTRON_G_FACTOR = 2.00231930436092; // magnitude
export const BOHR_ANGSTROM = 0.529177210544;
export const HARTREE_EV = 27.211386245981;
export const HARTREE_KJ_PER_MOL = 2625.4996394799;
export const HARTREE_KCAL_PER_MOL = HARTREE_KJ_PER_MOL / 4.184; // thermochemical calorie, exact
export const HARTREE_CM1 = 219474.63136314;
export const BOLTZMANN_CM1_PER_K = 0.6950348004; // k/(hc)
export const GAS_CONSTANT_J_PER_MOL_K = 8.31446261815324; // exact
export const ATM_PA = 101325; // exact
export const DEBYE_PER_AU = 2.541746473;
/** N_A μ_B²/(3k) in cgs-emu: χ_M T [cm³ K/mol] = this × μ_eff² (CODATA 2022; 1 J/T = 10³ erg/G, 1 J/K = 10⁷ erg/K). */
export const CHI_T_PER_MOMENT_SQUARED =
  (AVOGADRO_PER_MOL * (BOHR_MAGNETON_J_PER_T * 1e3) ** 2) / (3 * BOLTZMANN_J_PER_K * 1e7);
/** μ_eff/μ_B = this × √(χ_M T), χ_M in cm³/mol (cgs-emu): 2.82787. */
export const MOMENT_FACTOR_CGS = 1 / Math.sqrt(CHI_T_PER_MOMENT_SQUARED);
/** Molar susceptibility: χ [m³/mol, SI] = 4π·10⁻⁶ × χ [cm³/mol, cgs-emu]; exact but for 10⁻¹⁰. */
export const MOLAR_SUSCEPTIBILITY_SI_PER_CGS = 4 * Math.PI * 1e-6;
/** Mass susceptibility: χ [m³/kg, SI] = 4π·10⁻³ × χ [cm³/g, cgs-emu]. */
export const MASS_SUSCEPTIBILITY_SI_PER_CGS = 4 * Math.PI * 1e-3;
/** Standard acceleration of gravity, exact (3rd CGPM, 1901). */
export const STANDARD_GRAVITY_CM_PER_S2 = 980.665;
