import { err, ok, type Result } from '../../result';
import { basisSets, hasPotential } from './basis-sets';
import { brokenSymmetryPlan, type BrokenSymmetryPlan } from './broken-symmetry';
import { coordinateLine } from './coordinate-line';
import type { Deck, DeckRefusal, DeckRequest } from './deck-request';
import { functionalNames } from './functional-names';
import { solvents } from './solvents';
import { titleLine } from './title-line';

const dispersionKeyword = { none: null, 'D3(0)': 'GD3', 'D3(BJ)': 'GD3BJ', D4: null } as const;
const gridKeyword = { normal: 'FineGrid', fine: 'UltraFine', 'very fine': 'SuperFine' } as const;

/**
 * Gaussian 16 input: link-0 lines, route, title, charge and multiplicity, atoms, basis and potential
 * sections, each closed by a blank line. Source: Gaussian 16 User's Reference (route keywords, Gen/GenECP,
 * Guess=Fragment, title section).
 * @param request - already passed by `checkDeckRequest`
 */
export function gaussianDeck(request: DeckRequest): Result<Deck, DeckRefusal> {
  const { method, task, structure } = request;
  const spelling = functionalNames[method.functional]?.Gaussian;
  if (!spelling || 'refusal' in spelling) throw new Error('gaussianDeck takes only checked requests');
  if (method.dispersion === 'D4')
    return err({ code: 'dispersion not available', message: 'Gaussian 16 has D3, no D4' });
  if (method.relativity === 'ZORA')
    return err({ code: 'relativity not available', message: 'Gaussian has Douglas–Kroll–Hess, no ZORA' });
  if (method.solvation?.model === 'COSMO')
    return err({ code: 'solvation not available', message: 'Gaussian has IEFPCM, CPCM and SMD, no COSMO' });
  const broken = task === 'broken symmetry' ? brokenSymmetryPlan(request) : null;
  if (broken && 'refusal' in broken) return err(broken.refusal);

  const bases = basisByElement(request);
  const mixed = new Set(bases.values()).size > 1;
  const withPotential = [...bases].filter(([element, name]) => {
    const basis = basisSets[name];
    return basis !== undefined && hasPotential(basis, element);
  });
  const basisKeyword = !mixed
    ? (basisSets[[...bases.values()][0] ?? '']?.names.Gaussian ?? '')
    : withPotential.length > 0
      ? 'GenECP'
      : 'Gen';
  const solvent = method.solvation ? solvents[method.solvation.solvent]?.names.Gaussian : undefined;
  const unrestricted = request.multiplicity > 1 || broken !== null || task === 'stability';
  const route = [
    `#p ${unrestricted ? 'U' : 'R'}${spelling.keyword}/${basisKeyword}`,
    ...taskKeywords(request, broken?.plan ?? null),
    dispersionKeyword[method.dispersion] &&
      `EmpiricalDispersion=${dispersionKeyword[method.dispersion] ?? ''}`,
    method.solvation && `SCRF=(${method.solvation.model},Solvent=${solvent ?? ''})`,
    `Int=(${[`Grid=${gridKeyword[method.grid]}`, ...(method.relativity === 'DKH2' ? ['DKH'] : [])].join(',')})`,
    // XQC: fall back on the quadratically convergent SCF when the usual one has not converged.
    `SCF=(${method.scf.difficult ? 'XQC,NoVarAcc,' : ''}MaxCycle=${method.scf.maxIterations})`,
    'Pop=Regular',
    ...method.extra.keywords,
  ].filter((keyword) => keyword !== null && keyword !== '');

  const fragmentOf = broken ? fragments(broken.plan) : null;
  const sections = [
    [
      `%chk=${request.jobKey}.chk`,
      `%nprocshared=${request.cores}`,
      // Gaussian takes memory beyond %mem; the manual advises to leave some of the job's for the system.
      `%mem=${Math.max(200, Math.floor(request.memoryMb * 0.85))}MB`,
      ...wrapRoute(route),
    ],
    [titleLine(request)],
    [
      fragmentOf?.header(request) ?? `${request.charge} ${request.multiplicity}`,
      ...structure.positionsAngstrom.map((position, index) => {
        const element = structure.elements[index] ?? '';
        const symbol = fragmentOf ? `${element}(Fragment=${fragmentOf.number(index)})` : element;
        return coordinateLine(symbol.padEnd(fragmentOf ? 16 : 3), position);
      }),
    ],
    ...(mixed ? [basisSection(bases)] : []),
    ...(mixed && withPotential.length > 0
      ? [withPotential.flatMap(([element, name]) => [`${element} 0`, basisSets[name]?.names.Gaussian ?? ''])]
      : []),
    ...(method.extra.lines.length > 0 ? [[...method.extra.lines]] : []),
  ];
  return ok({
    text: `${sections.map((section) => section.join('\n')).join('\n\n')}\n\n`,
    extension: 'gjf',
    notes: broken
      ? ['The guess is put together from the ions as fragments; negative multiplicity means spin down.']
      : [],
  });
}

function taskKeywords({ task, method }: DeckRequest, broken: BrokenSymmetryPlan | null): string[] {
  const options = [
    `MaxCycles=${method.optimisation.maxSteps}`,
    ...(method.optimisation.convergence === 'normal'
      ? []
      : [method.optimisation.convergence === 'tight' ? 'Tight' : 'Loose']),
  ];
  if (task === 'optimisation') return [`Opt=(${options.join(',')})`];
  if (task === 'frequencies') return ['Freq'];
  if (task === 'optimisation and frequencies') return [`Opt=(${options.join(',')})`, 'Freq'];
  // Opt: when a lower determinant is found, go on to it. Nosymm so that symmetry hides no instability.
  if (task === 'stability') return ['Stable=Opt', 'NoSymm'];
  if (task === 'broken symmetry' && broken) return [`Guess=Fragment=${fragmentCount(broken)}`, 'NoSymm'];
  return [];
}

const fragmentCount = (plan: BrokenSymmetryPlan): number =>
  plan.sites.length + (plan.rest.atomIndices.length > 0 ? 1 : 0);

/** "total charge, multiplicity, then the same for each fragment", and each atom's fragment number. */
function fragments(plan: BrokenSymmetryPlan) {
  return {
    header: ({ charge, multiplicity }: DeckRequest) =>
      [
        `${charge} ${multiplicity}`,
        ...plan.sites.map((site) => `${site.oxidationState} ${site.spinUp ? '' : '-'}${site.unpaired + 1}`),
        ...(plan.rest.atomIndices.length > 0 ? [`${plan.rest.charge} 1`] : []),
      ].join(' '),
    number: (atomIndex: number) => {
      const site = plan.sites.findIndex((candidate) => candidate.atomIndex === atomIndex);
      return site === -1 ? plan.sites.length + 1 : site + 1;
    },
  };
}

function basisByElement({ structure, method }: DeckRequest): Map<string, string> {
  return new Map(
    structure.elements.map((element) => [element, method.basisPerElement[element] ?? method.basis]),
  );
}

function basisSection(bases: Map<string, string>): string[] {
  const groups = new Map<string, string[]>();
  for (const [element, name] of bases) groups.set(name, [...(groups.get(name) ?? []), element]);
  return [...groups].flatMap(([name, elements]) => [
    `${elements.join(' ')} 0`,
    basisSets[name]?.names.Gaussian ?? '',
    '****',
  ]);
}

/** The route may run over several lines; Gaussian itself wraps at 72 columns. */
function wrapRoute(words: readonly (string | null)[]): string[] {
  const lines: string[] = [];
  for (const word of words) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + 1 + (word ?? '').length <= 72)
      lines[lines.length - 1] = `${last} ${word ?? ''}`;
    else lines.push(word ?? '');
  }
  return lines;
}
