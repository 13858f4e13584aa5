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
