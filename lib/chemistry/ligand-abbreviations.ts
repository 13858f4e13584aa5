/**
 * Abbreviations of ligands, groups and solvents that formulas are written with, and their composition as bound
 * (acac, ox, Cp … without the proton they lose). Source: IUPAC Red Book 2005, table VII, and common practice;
 * "Ac" and "Pr" are left out because they are elements.
 */
export const ligandAbbreviations: Readonly<Record<string, string>> = {
  acac: 'C5H7O2',
  bipy: 'C10H8N2',
  bpy: 'C10H8N2',
  cyclam: 'C10H24N4',
  dien: 'C4H13N3',
  dmf: 'C3H7NO',
  DMF: 'C3H7NO',
  dmso: 'C2H6OS',
  DMSO: 'C2H6OS',
  edta: 'C10H12N2O8',
  en: 'C2H8N2',
  gly: 'C2H4NO2',
  mal: 'C3H2O4',
  ox: 'C2O4',
  phen: 'C12H8N2',
  py: 'C5H5N',
  pz: 'C4H4N2',
  salen: 'C16H14N2O2',
  tacn: 'C6H15N3',
  terpy: 'C15H11N3',
  thf: 'C4H8O',
  THF: 'C4H8O',
  tmeda: 'C6H16N2',
  tren: 'C6H18N4',
  trien: 'C6H18N4',
  tu: 'CH4N2S',
  Bu: 'C4H9',
  Cp: 'C5H5',
  Et: 'C2H5',
  Me: 'CH3',
  OAc: 'C2H3O2',
  Ph: 'C6H5',
};
