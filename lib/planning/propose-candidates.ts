import { multiplicityFits } from '../chemistry/electron-count';
import { groundTerm } from '../chemistry/ground-term';
import { jahnTeller } from '../chemistry/jahn-teller';
import { err, ok, type Result } from '../result';
import type { Candidate, CandidateList, CandidateSite, LeftOutCandidate } from './candidate';
import { complexSchema, type ComplexInput } from './complex';
import { findGeometry } from './coordination-geometries';
import { lessLikely, metalOptions, type MetalOption } from './metal-options';
import { resolveComplex, type ComplexProblem, type ResolvedComplex } from './resolve-complex';
import { spinFlips } from './spin-flips';

export type CandidateProblem =
  | ComplexProblem
  | { code: 'bad complex' | 'unknown geometry' | 'too many candidates'; message: string };

/** More than this is a sign that the geometry should be fixed first; the list says so. */
const mostCandidates = 200;

/**
 * Spin states × geometries that are worth calculating for a complex, and what was left out and why.
 * Several metals of the same kind (element, oxidation state, coordination number) share their geometry
 * and spin state; for two of a kind the mixed spin states are proposed as well. Every candidate's
 * multiplicity is checked against the parity of all electrons, core and radical ligands included.
 * Errors: see `CandidateProblem`.
 */
export function proposeCandidates(input: ComplexInput): Result<CandidateList, CandidateProblem> {
  const parsed = complexSchema.safeParse(input);
  if (!parsed.success) {
    const issue = parsed.error.issues[0];
    return err({ code: 'bad complex', message: `${issue?.path.join('.') ?? ''}: ${issue?.message ?? ''}` });
  }
  const resolved = resolveComplex(parsed.data);
  if (!resolved.ok) return resolved;
  const complex = resolved.value;
  for (const metal of complex.metals) {
    if (metal.geometry === null) continue;
    const geometry = findGeometry(metal.geometry);
    if (!geometry || geometry.coordinationNumber !== metal.coordinationNumber)
      return err({
        code: 'unknown geometry',
        message: `${metal.geometry} is no geometry for coordination number ${metal.coordinationNumber}`,
      });
  }

  const perMetal = complex.metals.map((metal) => metalOptions(metal, complex));
  const leftOut = uniqueLeftOut(perMetal.flatMap((item) => item.leftOut));
  const radicals = complex.ligands.flatMap(({ ligand, count }) =>
    ligand.unpairedElectrons > 0 ? Array.from({ length: count }, () => ligand) : [],
  );
  if (complex.metals.length + radicals.length > 12)
    return err({ code: 'too many candidates', message: 'more than twelve metals and radical ligands' });

  const candidates: Candidate[] = [];
  for (const choice of combinations(
    complex,
    perMetal.map((item) => item.options),
  )) {
    const sites: CandidateSite[] = [
      ...complex.metals.map((metal, index) => metalSite(metal.element, metal.dElectrons, choice[index])),
      ...radicals.map((ligand) => ({
        kind: 'ligand' as const,
        name: ligand.name,
        unpaired: ligand.unpairedElectrons,
        spinUp: true,
        geometry: null,
        state: null,
        groundTerm: null,
        jahnTeller: null,
      })),
    ];
    for (const flips of spinFlips(sites.map((site) => site.unpaired))) {
      if (complex.metals.length === 1 && !isFirstOfEquals(sites, flips)) continue;
      if (candidates.length >= mostCandidates)
        return err({
          code: 'too many candidates',
          message: `more than ${mostCandidates} candidates: fix the geometry of some metals first`,
        });
      const candidate = buildCandidate(sites, flips, choice);
      // The sum of the sites always has the parity of the electrons when the ligands were checked: a
      // mismatch is a bug in the electron counting, not bad input.
      if (!multiplicityFits(complex.electrons, candidate.multiplicity))
        throw new Error(`${complex.electrons} electrons cannot have multiplicity ${candidate.multiplicity}`);
      candidates.push(candidate);
    }
  }
  return ok({ formula: complex.formula, electrons: complex.electrons, candidates, leftOut });
}

/** Around one metal, equal radical ligands are interchangeable: of each set only "down before up" is kept. */
function isFirstOfEquals(sites: readonly CandidateSite[], flips: readonly boolean[]): boolean {
  return sites.every((site, index) => {
    const before = sites[index - 1];
    return !(site.kind === 'ligand' && before?.name === site.name && flips[index - 1] && !flips[index]);
  });
}

function metalSite(element: string, dElectrons: number, option: MetalOption | undefined): CandidateSite {
  if (!option) throw new Error(`no option for ${element}`);
  const { geometry, state } = option;
  return {
    kind: 'metal',
    name: element,
    unpaired: state.unpaired,
    spinUp: true,
    geometry,
    state,
    groundTerm: groundTerm(geometry, dElectrons, state.unpaired),
    jahnTeller: jahnTeller(geometry, dElectrons, state.unpaired),
  };
}

function buildCandidate(
  upSites: readonly CandidateSite[],
  flips: readonly boolean[],
  choice: readonly MetalOption[],
): Candidate {
  const sites = upSites.map((site, index) => ({ ...site, spinUp: flips[index] ?? true }));
  const total = sites.reduce((sum, site) => sum + site.unpaired, 0);
  const flipped = sites.reduce((sum, site) => sum + (site.spinUp ? 0 : site.unpaired), 0);
  const net = total - 2 * flipped;
  const magneticSites = sites.filter((site) => site.unpaired > 0).length;
  const flippedSites = sites.flatMap((site, index) => (site.spinUp ? [] : [index]));
  const projection = net / 2;
  const geometries = choice.map((option) => option.geometry);
  return {
    key: `${geometries.join('+')}/${sites.map((site) => `${site.spinUp ? '' : '-'}${site.unpaired}`).join(',')}`,
    geometries,
    sites,
    multiplicity: net + 1,
    coupling:
      sites.length === 1
        ? 'single site'
        : magneticSites < 2
          ? 'no coupling'
          : flipped === 0
            ? 'ferromagnetic'
            : 'antiferromagnetic',
    brokenSymmetry:
      flipped === 0
        ? null
        : {
            flippedSites,
            highSpinMultiplicity: total + 1,
            idealS2: projection * (projection + 1) + flipped,
          },
    likelihood: choice.reduce<MetalOption['likelihood']>(
      (worst, option) => lessLikely(worst, option.likelihood),
      'usual',
    ),
    distortedStarts: distortedStarts(sites),
    spinOnlyMomentBohrMagneton: magneticSites > 1 ? null : Math.sqrt(net * (net + 2)),
    notes: [...new Set(choice.flatMap((option) => option.notes))],
  };
}

function distortedStarts(sites: readonly CandidateSite[]): Candidate['distortedStarts'] {
  const strong = sites.filter((site) => site.jahnTeller?.strength === 'strong');
  return [
    ...(strong.some((site) => site.geometry === 'OC-6') ? (['elongated', 'compressed'] as const) : []),
    ...(strong.some((site) => site.geometry === 'T-4') ? (['flattened'] as const) : []),
  ];
}

/** One option per metal; metals of one kind move together, two of a kind may differ in spin. */
function combinations(
  complex: ResolvedComplex,
  options: readonly (readonly MetalOption[])[],
): MetalOption[][] {
  const kinds = new Map<string, number[]>();
  complex.metals.forEach((metal, index) => {
    const kind = `${metal.element} ${metal.oxidationState} ${metal.coordinationNumber} ${metal.geometry ?? ''}`;
    kinds.set(kind, [...(kinds.get(kind) ?? []), index]);
  });
  let choices: MetalOption[][] = [[]];
  for (const members of kinds.values()) {
    const own = options[members[0] ?? 0] ?? [];
    const assignments = own.map((option) => members.map(() => option));
    if (members.length === 2)
      own.forEach((first, index) => {
        for (const second of own.slice(index + 1))
          if (first.geometry === second.geometry)
            assignments.push(
              [first, second].map((option) => ({
                ...option,
                likelihood: 'rare',
                notes: [...option.notes, 'the two equal metals in different spin states'],
              })),
            );
      });
    choices = choices.flatMap((choice) =>
      assignments.map((assignment) => {
        const next = [...choice];
        members.forEach((metal, position) => {
          const option = assignment[position];
          if (option) next[metal] = option;
        });
        return next;
      }),
    );
    if (choices.length > mostCandidates) return choices;
  }
  return choices;
}

function uniqueLeftOut(all: readonly LeftOutCandidate[]): LeftOutCandidate[] {
  return [
    ...new Map(all.map((item) => [`${item.metal} ${item.geometry} ${String(item.unpaired)}`, item])).values(),
  ];
}
