import type { Ligand } from './ligand';

const entry = (
  name: string,
  formula: string,
  charge: number,
  donors: string,
  unpairedElectrons = 0,
): Ligand => ({ name, formula, charge, donors: donors.split(' '), unpairedElectrons });

/**
 * Ligands by the abbreviation chemists write. Formulas and charges follow from the structures (IUPAC
 * Red Book 2005, tables IR-7 and IX for names and abbreviations); denticity is the usual one, another
 * is entered as a ligand of one's own. The unit test holds every entry's electron count against its
 * number of unpaired electrons.
 */
export const ligandDictionary: Readonly<Record<string, Ligand>> = {
  // one donor, neutral
  H2O: entry('aqua', 'H2O', 0, 'O'),
  NH3: entry('ammine', 'NH3', 0, 'N'),
  CO: entry('carbonyl', 'CO', 0, 'C'),
  MeCN: entry('acetonitrile', 'C2H3N', 0, 'N'),
  py: entry('pyridine', 'C5H5N', 0, 'N'),
  Him: entry('1H-imidazole', 'C3H4N2', 0, 'N'),
  dmso: entry('dimethyl sulfoxide-κO', 'C2H6OS', 0, 'O'),
  dmf: entry('dimethylformamide-κO', 'C3H7NO', 0, 'O'),
  MeOH: entry('methanol', 'CH4O', 0, 'O'),
  EtOH: entry('ethanol', 'C2H6O', 0, 'O'),
  thf: entry('tetrahydrofuran', 'C4H8O', 0, 'O'),
  PMe3: entry('trimethylphosphane', 'C3H9P', 0, 'P'),
  PPh3: entry('triphenylphosphane', 'C18H15P', 0, 'P'),
  // one donor, charged
  F: entry('fluorido', 'F', -1, 'F'),
  Cl: entry('chlorido', 'Cl', -1, 'Cl'),
  Br: entry('bromido', 'Br', -1, 'Br'),
  I: entry('iodido', 'I', -1, 'I'),
  H: entry('hydrido', 'H', -1, 'H'),
  Me: entry('methyl', 'CH3', -1, 'C'),
  OH: entry('hydroxido', 'HO', -1, 'O'),
  O: entry('oxido', 'O', -2, 'O'),
  S: entry('sulfido', 'S', -2, 'S'),
  SPh: entry('benzenethiolato', 'C6H5S', -1, 'S'),
  OPh: entry('phenolato', 'C6H5O', -1, 'O'),
  CN: entry('cyanido', 'CN', -1, 'C'),
  NCS: entry('thiocyanato-κN', 'CNS', -1, 'N'),
  SCN: entry('thiocyanato-κS', 'CNS', -1, 'S'),
  NCO: entry('cyanato-κN', 'CNO', -1, 'N'),
  N3: entry('azido', 'N3', -1, 'N'),
  NO2: entry('nitrito-κN', 'NO2', -1, 'N'),
  ONO: entry('nitrito-κO', 'NO2', -1, 'O'),
  NO3: entry('nitrato-κO', 'NO3', -1, 'O'),
  SO4: entry('sulfato-κO', 'SO4', -2, 'O'),
  OAc: entry('acetato-κO', 'C2H3O2', -1, 'O'),
  'NO+': entry('nitrosyl, linear, counted as NO+', 'NO', 1, 'N'),
  // two donors
  en: entry('ethane-1,2-diamine', 'C2H8N2', 0, 'N N'),
  bpy: entry("2,2'-bipyridine", 'C10H8N2', 0, 'N N'),
  phen: entry('1,10-phenanthroline', 'C12H8N2', 0, 'N N'),
  pic: entry('2-(aminomethyl)pyridine', 'C6H8N2', 0, 'N N'),
  dppe: entry('ethane-1,2-diylbis(diphenylphosphane)', 'C26H24P2', 0, 'P P'),
  ox: entry('oxalato', 'C2O4', -2, 'O O'),
  acac: entry('acetylacetonato', 'C5H7O2', -1, 'O O'),
  'OAc-κ2': entry('acetato-κ2O', 'C2H3O2', -1, 'O O'),
  'NO3-κ2': entry('nitrato-κ2O', 'NO3', -1, 'O O'),
  CO3: entry('carbonato-κ2O', 'CO3', -2, 'O O'),
  O2: entry('peroxido-κ2O', 'O2', -2, 'O O'),
  gly: entry('glycinato', 'C2H4NO2', -1, 'N O'),
  sal: entry('salicylaldehydato', 'C7H5O2', -1, 'O O'),
  dmg: entry('dimethylglyoximato(1-)', 'C4H7N2O2', -1, 'N N'),
  cat: entry('catecholato', 'C6H4O2', -2, 'O O'),
  bdt: entry('benzene-1,2-dithiolato', 'C6H4S2', -2, 'S S'),
  mnt: entry('maleonitriledithiolato', 'C4N2S2', -2, 'S S'),
  dtc: entry('diethyldithiocarbamato', 'C5H10NS2', -1, 'S S'),
  // three to six donors
  tpy: entry("2,2':6',2''-terpyridine", 'C15H11N3', 0, 'N N N'),
  dien: entry('diethylenetriamine', 'C4H13N3', 0, 'N N N'),
  tacn: entry('1,4,7-triazonane', 'C6H15N3', 0, 'N N N'),
  Tp: entry('hydrotris(pyrazolyl)borato', 'C9H10BN6', -1, 'N N N'),
  trien: entry('triethylenetetramine', 'C6H18N4', 0, 'N N N N'),
  tpa: entry('tris(pyridin-2-ylmethyl)amine', 'C18H18N4', 0, 'N N N N'),
  cyclam: entry('1,4,8,11-tetraazacyclotetradecane', 'C10H24N4', 0, 'N N N N'),
  salen: entry('salen(2-)', 'C16H14N2O2', -2, 'N N O O'),
  por: { ...entry('porphyrinato(2-)', 'C20H12N4', -2, 'N N N N'), planarMacrocycle: true },
  tpp: { ...entry('tetraphenylporphyrinato(2-)', 'C44H28N4', -2, 'N N N N'), planarMacrocycle: true },
  pc: { ...entry('phthalocyaninato(2-)', 'C32H16N8', -2, 'N N N N'), planarMacrocycle: true },
  edta: entry('ethylenediaminetetraacetato', 'C10H12N2O8', -4, 'N N O O O O'),
  // radicals
  'NO•': entry('nitrosyl, counted as neutral radical', 'NO', 0, 'N', 1),
  'O2•-': entry('superoxido', 'O2', -1, 'O', 1),
  'bpy•-': entry("2,2'-bipyridine radical anion", 'C10H8N2', -1, 'N N', 1),
  sq: entry('1,2-benzosemiquinonato', 'C6H4O2', -1, 'O O', 1),
  'bdt•-': entry('benzene-1,2-dithiolato radical anion', 'C6H4S2', -1, 'S S', 1),
  tempo: entry('2,2,6,6-tetramethylpiperidin-1-oxyl', 'C9H18NO', 0, 'O', 1),
};
