/** A substance of known mass susceptibility, cgs-emu. */
export interface Calibrant {
  id: 'HgCo(NCS)4' | '[Ni(en)3]S2O3' | 'water';
  /** χ_g in cm³/g at the reference temperature */
  chiGCm3PerGram: number;
  referenceKelvin: number;
  /** Relative standard uncertainty of χ_g */
  relativeU: number;
  /** Weiss-like temperature θ of χ_g ∝ 1/(T + θ) near room temperature; null: independent of temperature */
  lawThetaKelvin: number | null;
  tag: 'handbook' | 'soft';
  source: string;
  caution: string | null;
}

export const calibrants: readonly Calibrant[] = [
  {
    id: 'HgCo(NCS)4',
    chiGCm3PerGram: 16.44e-6,
    referenceKelvin: 293.15,
    relativeU: 0.005,
    lawThetaKelvin: 10,
    tag: 'handbook',
    source:
      'Figgis & Nyholm, J. Chem. Soc. 1958, 4190 (±0.5 %); temperature law Figgis & Nyholm 1959, 331 (recalled)',
    caution: 'mercury and cobalt compound; the law holds near room temperature only',
  },
  {
    id: '[Ni(en)3]S2O3',
    chiGCm3PerGram: 11.04e-6,
    referenceKelvin: 293.15,
    // 10.8 to 11.0 are printed as well: half of that spread.
    relativeU: 0.01,
    lawThetaKelvin: 43,
    tag: 'soft',
    source: 'Curtis, J. Chem. Soc. 1961, 3147 (recalled; 10.8–11.0 are also printed)',
    caution: 'value and temperature law are soft: prefer another calibrant for absolute work',
  },
  {
    id: 'water',
    chiGCm3PerGram: -0.72e-6,
    referenceKelvin: 293.15,
    relativeU: 0.01,
    lawThetaKelvin: null,
    tag: 'handbook',
    source: 'International Critical Tables, as quoted in 1958 (which measured −0.73)',
    caution: null,
  },
];

export interface CalibrantSusceptibility {
  chiGCm3PerGram: number;
  uCm3PerGram: number;
  source: string;
  tag: 'handbook' | 'soft';
  /** false outside 273–313 K, where the law is not supported */
  supported: boolean;
}

/**
 * Mass susceptibility of a calibrant at a temperature: χ_g(T) = χ_g(T₀)(T₀ + θ)/(T + θ).
 * @param temperatureKelvin - > 0
 * @returns cm³/g, cgs-emu; `supported` says whether T lies in the range of the law
 * Checked against: tests/published/magnetism-magnetometry.test.ts.
 */
export function calibrantSusceptibility(
  id: Calibrant['id'],
  temperatureKelvin: number,
): CalibrantSusceptibility {
  const calibrant = calibrants.find((candidate) => candidate.id === id);
  if (!calibrant) throw new RangeError(`no calibrant "${id}"`);
  if (!(temperatureKelvin > 0))
    throw new RangeError(`temperatureKelvin must be above 0, received ${temperatureKelvin}`);
  const { lawThetaKelvin: theta, referenceKelvin, chiGCm3PerGram, relativeU, source, tag } = calibrant;
  const chi =
    theta === null
      ? chiGCm3PerGram
      : (chiGCm3PerGram * (referenceKelvin + theta)) / (temperatureKelvin + theta);
  return {
    chiGCm3PerGram: chi,
    uCm3PerGram: Math.abs(chi) * relativeU,
    source,
    tag,
    supported: temperatureKelvin >= 273 && temperatureKelvin <= 313,
  };
}
