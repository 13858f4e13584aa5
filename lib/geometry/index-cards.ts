import type { IndexKey } from './index-keys';
import { THETA_CONVENTION } from './theta';

export interface IndexCard {
  /** As the trade writes it. */
  symbol: string;
  name: string;
  formula: string;
  /** What the letters of the formula stand for. */
  where: string;
  source: string;
  /** Values and what they mean, from one end to the other. */
  meanings: readonly { value: string; meaning: string }[];
  /** When the index says nothing. */
  limits: string;
  /** What two sources may do differently, and what is done here; null when nothing is left open. */
  convention: string | null;
}

/** What the explanation of each index says: one table for the screen, the report and the manual. */
export const indexCards: Record<IndexKey, IndexCard> = {
  meanDistanceAngstrom: {
    symbol: 'l̄',
    name: 'Mean metal–donor distance',
    formula: 'l̄ = (1/n) Σ lᵢ',
    where: 'lᵢ: distances from the metal to its n donor atoms, Å',
    source: 'Arithmetic mean; donors by covalent radii (Cordero et al., Dalton Trans. 2008, 2832)',
    meanings: [
      {
        value: 'longer',
        meaning: 'larger ion, higher coordination number, or high spin with filled antibonding orbitals',
      },
    ],
    limits: 'Mixes donor elements: compare the means per element instead when there are several.',
    convention:
      'A donor lies within the sum of covalent radii + 0.45 Å; Mn, Fe and Co count with the high-spin radius unless their spin is given.',
  },
  baurDistortion: {
    symbol: 'D',
    name: 'Bond-length distortion (Baur)',
    formula: 'D = (1/n) Σ |lᵢ − l̄| / l̄',
    where: 'lᵢ: metal–donor distances, l̄ their mean',
    source: 'W. H. Baur, Acta Cryst. 1974, B30, 1195',
    meanings: [
      { value: '0', meaning: 'all distances equal' },
      { value: '0.01', meaning: 'distances differ by about 1 % of the mean' },
      { value: 'above 0.05', meaning: 'a clear split, as in elongated copper(II)' },
    ],
    limits:
      'With several donor elements it mostly measures that their radii differ. Long contacts are not counted.',
    convention: null,
  },
  meanSquareDistortion: {
    symbol: 'Δ',
    name: 'Mean-square relative distortion',
    formula: 'Δ = (1/n) Σ ((lᵢ − l̄)/l̄)²',
    where: 'lᵢ: metal–donor distances, l̄ their mean',
    source: 'I. D. Brown & R. D. Shannon, Acta Cryst. 1973, A29, 266',
    meanings: [
      { value: '0', meaning: 'all distances equal' },
      { value: '0.008', meaning: 'four distances of 2.00 Å and two of 2.40 Å' },
    ],
    limits: 'As for D; weighs single long bonds more.',
    convention: 'Printed as it is; many papers multiply by 10³ or 10⁴.',
  },
  tau4: {
    symbol: 'τ₄',
    name: 'Four-coordinate geometry index',
    formula: 'τ₄ = (360° − (α + β)) / 141°',
    where: 'α, β: the two largest donor–metal–donor angles',
    source: 'L. Yang, D. R. Powell, R. P. Houser, Dalton Trans. 2007, 955',
    meanings: [
      { value: '0', meaning: 'square plane' },
      { value: '0.43', meaning: 'see-saw with 180° and 120°' },
      {
        value: '0.85',
        meaning: 'trigonal pyramid with the metal in the base, or a tetrahedron flattened to 120°',
      },
      { value: '1', meaning: 'tetrahedron' },
    ],
    limits:
      'Four-coordinate centres only. Two angles alone cannot tell a see-saw from a flattened tetrahedron: see τ₄′ and the shape measures.',
    convention:
      'The published divisor 141° is used; the exact one (141.0576°) gives values smaller by at most 0.0004.',
  },
  tau4Prime: {
    symbol: 'τ₄′',
    name: 'Four-coordinate geometry index, corrected',
    formula: 'τ₄′ = (β − α)/(360° − θ) + (180° − β)/(180° − θ)',
    where: 'β ≥ α: the two largest angles; θ = arccos(−1/3) = 109.471°',
    source: 'A. Okuniewski, D. Rosiak, J. Chojnacki, B. Becker, Polyhedron 2015, 90, 47',
    meanings: [
      { value: '0', meaning: 'square plane' },
      { value: '0.24', meaning: 'see-saw with 180° and 120°' },
      { value: '1', meaning: 'tetrahedron' },
    ],
    limits: 'Four-coordinate centres only.',
    convention: null,
  },
  tau5: {
    symbol: 'τ₅',
    name: 'Five-coordinate geometry index',
    formula: 'τ₅ = (β − α)/60°',
    where: 'β ≥ α: the two largest donor–metal–donor angles',
    source:
      'A. W. Addison, T. N. Rao, J. Reedijk, J. van Rijn, G. C. Verschoor, J. Chem. Soc., Dalton Trans. 1984, 1349',
    meanings: [
      { value: '0', meaning: 'square pyramid, whatever its basal angle' },
      { value: '0.5', meaning: 'half way' },
      { value: '1', meaning: 'trigonal bipyramid' },
    ],
    limits: 'Five-coordinate centres only. Says nothing of distances.',
    convention: null,
  },
  sigmaDegrees: {
    symbol: 'Σ',
    name: 'Octahedral angular distortion',
    formula: 'Σ = Σ |90° − φᵢ|, i = 1 … 12',
    where: 'φᵢ: the cis angles',
    source: 'J. K. McCusker, A. L. Rheingold, D. N. Hendrickson, Inorg. Chem. 1996, 35, 2100',
    meanings: [
      { value: '0°', meaning: 'all cis angles 90°' },
      {
        value: 'some tens of degrees',
        meaning:
          'usual with small chelate rings; high-spin centres lie above low-spin ones of the same ligand',
      },
      { value: '211°', meaning: 'trigonal prism with equal edges' },
    ],
    limits: 'Six-coordinate centres only.',
    convention: 'The cis angles are the twelve smallest of the fifteen.',
  },
  thetaDegrees: {
    symbol: 'Θ',
    name: 'Octahedral twist',
    formula: 'Θ = Σ |60° − θᵢ|, i = 1 … 24',
    where:
      'θᵢ: twist angles between neighbouring donors of two opposite faces, four pairs of faces, six angles each',
    source: 'M. Marchivie, P. Guionneau, J.-F. Létard, D. Chasseau, Acta Cryst. 2005, B61, 25',
    meanings: [
      { value: '0°', meaning: 'octahedron' },
      { value: 'larger', meaning: 'twisted towards a trigonal prism' },
    ],
    limits: 'Six-coordinate centres only.',
    convention: THETA_CONVENTION,
  },
  angleVarianceDegrees2: {
    symbol: 'σ²',
    name: 'Bond-angle variance',
    formula: 'σ² = Σ (θᵢ − θ₀)² / (m − 1)',
    where: 'octahedron: m = 12 cis angles, θ₀ = 90°; tetrahedron: m = 6 angles, θ₀ = 109.471°',
    source: 'K. Robinson, G. V. Gibbs, P. H. Ribbe, Science 1971, 172, 567',
    meanings: [
      { value: '0', meaning: 'regular polyhedron' },
      { value: '96 deg²', meaning: 'Mg1 site of forsterite, a distorted octahedron' },
    ],
    limits:
      'Four- and six-coordinate centres; for a square plane or a prism it only says "far from regular".',
    convention: 'Four donors are always held against the tetrahedron, six against the octahedron.',
  },
  quadraticElongation: {
    symbol: '⟨λ⟩',
    name: 'Quadratic elongation',
    formula: '⟨λ⟩ = (1/n) Σ (lᵢ/l₀)²',
    where: 'l₀: centre-to-vertex distance of the regular polyhedron of the same volume',
    source: 'K. Robinson, G. V. Gibbs, P. H. Ribbe, Science 1971, 172, 567',
    meanings: [
      { value: '1', meaning: 'regular polyhedron' },
      { value: '1.027', meaning: 'Mg1 site of forsterite' },
    ],
    limits: 'Four- and six-coordinate centres that enclose a volume: not for a square plane.',
    convention: null,
  },
  shapes: {
    symbol: 'S',
    name: 'Continuous shape measures',
    formula: 'S = 100 min Σ |qₖ − pₖ|² / Σ |qₖ − q₀|²',
    where:
      'q: donors and metal, q₀ their centroid; p: ideal polyhedron; least over pairing, rotation, translation and scale',
    source:
      'M. Pinsky & D. Avnir, Inorg. Chem. 1998, 37, 5575; S. Alvarez, D. Avnir, M. Llunell, M. Pinsky, New J. Chem. 2002, 26, 996',
    meanings: [
      { value: '0', meaning: 'the ideal polyhedron' },
      { value: 'below 1', meaning: 'close to it' },
      { value: 'above 3', meaning: 'clearly distorted' },
      { value: '16.7', meaning: 'an octahedron measured against the trigonal prism' },
      { value: '33.3', meaning: 'a square plane measured against the tetrahedron' },
    ],
    limits: 'Coordination numbers 2 to 9. The ranges are common practice, not limits of a law.',
    convention:
      'The metal counts as a point. Where a symbol covers several shapes (A-2, SPY-5, SS-4), the angle is stated.',
  },
  path: {
    symbol: 'φ',
    name: 'Place on the interconversion path',
    formula: 'φ = 100 arcsin(√S_A/10)/θ;  deviation = 100 ((arcsin(√S_A/10) + arcsin(√S_B/10))/θ − 1)',
    where: 'A, B: ends of the path; S_A, S_B: shape measures; θ = arcsin(√S_AB/10)',
    source:
      'D. Casanova, J. Cirera, M. Llunell, P. Alemany, D. Avnir, S. Alvarez, J. Am. Chem. Soc. 2004, 126, 1755',
    meanings: [
      { value: '0 %', meaning: 'the first polyhedron' },
      { value: '100 %', meaning: 'the second' },
      {
        value: 'deviation below 10 %',
        meaning: 'on the path; beyond that the coordinate means little (common practice)',
      },
    ],
    limits: 'SP-4 to T-4, TBPY-5 to SPY-5 (104.48°), OC-6 to TPR-6.',
    convention: 'Shape measures with the metal.',
  },
  axial: {
    symbol: 'T',
    name: 'Axial and equatorial distances, tetragonality',
    formula: 'T = mean equatorial distance ÷ mean axial distance',
    where: 'axis: the trans pair that differs most from the other four, an apex, the poles, or long contacts',
    source: 'B. J. Hathaway & D. E. Billing, Coord. Chem. Rev. 1970, 5, 143 (from memory)',
    meanings: [
      { value: 'below 1', meaning: 'elongated' },
      { value: '1', meaning: 'regular' },
      { value: 'above 1', meaning: 'compressed' },
    ],
    limits:
      'Five and six donors, and four with one or two long contacts on an axis. With several donor elements it may show their radii.',
    convention: 'Means closer than 0.02 Å are called regular.',
  },
  planeDisplacement: {
    symbol: 'd',
    name: 'Displacement from the mean plane of the donors',
    formula: 'distance of the metal from the least-squares plane',
    where: 'plane: all of three or four donors, the equatorial ones of five or six',
    source: 'Least squares',
    meanings: [
      { value: '0 Å', meaning: 'in the plane' },
      { value: '0.2–0.5 Å', meaning: 'usual towards the apex of a square pyramid (common practice)' },
    ],
    limits: 'Not when the donors are more than 0.5 Å (root mean square) from any plane.',
    convention: null,
  },
  chelatePlaneAngleDegrees: {
    symbol: 'ω',
    name: 'Angle between the two chelate planes',
    formula: 'angle between the planes (metal, donor, donor) of two chelate rings',
    where: 'two rings without a common donor',
    source: 'Elementary geometry',
    meanings: [
      { value: '0°', meaning: 'square plane' },
      { value: '90°', meaning: 'tetrahedron' },
    ],
    limits: 'Exactly two chelate rings of up to eight members.',
    convention: null,
  },
  bondValenceSum: {
    symbol: 'V',
    name: 'Bond valence sum',
    formula: 'V = Σ exp((R₀ − Rᵢ)/b)',
    where: 'R₀: tabulated per metal, oxidation state and donor; b = 0.37 Å; Rᵢ: distances',
    source:
      'I. D. Brown & D. Altermatt, Acta Cryst. 1985, B41, 244; parameters from the primary papers named with each',
    meanings: [
      { value: 'within 0.25 of the assumed state', meaning: 'supports it (common practice)' },
      { value: 'off by more than 0.5', meaning: 'does not support it' },
    ],
    limits:
      'Needs a parameter for every donor element. Calculated distances that are too long lower the sum. The parameters fit high-spin ions: low-spin centres with their short bonds give sums above their state.',
    convention: 'Donors of the first sphere; the sum with long contacts stands beside it.',
  },
  ionicRadiusSums: {
    symbol: 'Σr',
    name: 'Sum of ionic radii',
    formula: 'r(cation) + mean r(anion)',
    where:
      'cation at this coordination number, oxidation and spin state; anions O²⁻, F⁻, Cl⁻, Br⁻, I⁻, S²⁻, N³⁻',
    source: 'R. D. Shannon, Acta Cryst. 1976, A32, 751',
    meanings: [{ value: 'near the mean distance', meaning: 'that oxidation and spin state fits' }],
    limits: 'A yardstick for neutral and carbon donors; 3d ions only.',
    convention: 'Effective ionic radii with r(O²⁻, six-coordinate) = 1.40 Å.',
  },
};
