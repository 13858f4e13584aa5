import { err, ok, type Result } from '../../result';
import { basisSets, hasPotential } from './basis-sets';
import { brokenSymmetryPlan, type BrokenSymmetryPlan } from './broken-symmetry';
import { coordinateLines } from './coordinate-line';
import type { Deck, DeckRefusal, DeckRequest } from './deck-request';
import { functionalNames, isMetaGga } from './functional-names';
import { isLinear } from './is-linear';
import { solvents } from './solvents';
import { titleLine } from './title-line';

/**
 * NWChem 7.0 input. Source: NWChem user documentation (geometry, basis, ECP, DFT, COSMO/SMD, driver,
 * fragment guess); run for real in tests/integration/decks.test.ts.
 * @param request - already passed by `checkDeckRequest`
 */
export function nwchemDeck(request: DeckRequest): Result<Deck, DeckRefusal> {
  const { method, task, structure } = request;
  const refusal = unable(request);
  if (refusal) return err(refusal);
  const broken = task === 'broken symmetry' ? brokenSymmetryPlan(request) : null;
  if (broken && 'refusal' in broken) return err(broken.refusal);

  // Fragments are laid over the molecule in the order of its atoms, so sites come last, one by one.
  const order = broken
    ? [...broken.plan.rest.atomIndices, ...broken.plan.sites.map((site) => site.atomIndex)]
    : structure.elements.map((_, index) => index);
  const elements = order.map((index) => structure.elements[index] ?? '');
  const positions = order.map((index) => structure.positionsAngstrom[index] ?? ([0, 0, 0] as const));
  // Internal coordinates serve only an optimisation, and NWChem stops where it cannot build them: for a
  // linear molecule among others.
  const internal = task.startsWith('optimisation') && !isLinear(structure);
  const geometry = (from: number, to: number, name = '') => [
    `geometry ${name}units angstroms noautosym nocenter${internal ? '' : ' noautoz'}`,
    ...coordinateLines(elements.slice(from, to), positions.slice(from, to)).map((line) => `  ${line}`),
    'end',
  ];

  const lines = [
    'echo',
    `start ${request.jobKey.toLowerCase()}`,
    `title "${titleLine(request)}"`,
    // The directive counts per process.
    `memory total ${Math.max(200, Math.floor((request.memoryMb * 0.9) / request.cores))} mb`,
    `charge ${request.charge}`,
    ...(broken ? [] : geometry(0, elements.length)),
    ...basisLines(request),
    ...(method.relativity === 'ZORA' ? ['relativistic', '  zora on', 'end'] : []),
    ...(method.relativity === 'DKH2' ? ['relativistic', '  douglas-kroll dkh', 'end'] : []),
    ...solvationLines(request),
    ...(broken ? fragmentTasks(request, broken.plan, geometry) : dftBlock(request, request.multiplicity, [])),
    ...(task.startsWith('optimisation')
      ? [
          'driver',
          ...(method.optimisation.convergence === 'normal' ? [] : [`  ${method.optimisation.convergence}`]),
          `  maxiter ${method.optimisation.maxSteps}`,
          'end',
        ]
      : []),
    ...method.extra.lines,
    ...taskLines(request),
  ];
  return ok({
    text: `${lines.join('\n')}\n`,
    extension: 'nw',
    notes: broken
      ? ['Atoms are reordered: the magnetic sites come last, as the fragment guess needs them.']
      : [],
  });
}

function unable({ method, task }: DeckRequest): DeckRefusal | null {
  if (task === 'stability')
    return {
      code: 'task not available',
      message: 'NWChem 7.0 has no stability analysis of a DFT determinant',
    };
  if (method.dispersion === 'D4')
    return { code: 'dispersion not available', message: 'NWChem 7.0 has D3, no D4' };
  if (!method.solvation) return null;
  const { model, solvent } = method.solvation;
  if (model !== 'COSMO' && model !== 'SMD')
    return { code: 'solvation not available', message: `NWChem has COSMO and SMD, no ${model}` };
  if (model === 'SMD' && solvents[solvent]?.names.NWChem === null)
    return {
      code: 'solvation not available',
      message: `no NWChem name for ${solvent} is known here; use COSMO`,
    };
  return null;
}

function basisLines({ method, structure }: DeckRequest): string[] {
  const present = [...new Set(structure.elements)];
  const nameOf = (element: string) => method.basisPerElement[element] ?? method.basis;
  const potentials = present.flatMap((element) => {
    const basis = basisSets[nameOf(element)];
    return basis && hasPotential(basis, element)
      ? [`  ${element} library "${basis.nwchemPotential ?? ''}"`]
      : [];
  });
  const cartesian = present.some((element) => basisSets[nameOf(element)]?.cartesian);
  return [
    `basis "ao basis" ${cartesian ? 'cartesian' : 'spherical'}`,
    ...present.map((element) => `  ${element} library "${basisSets[nameOf(element)]?.names.NWChem ?? ''}"`),
    'end',
    ...(potentials.length > 0 ? ['ecp', ...potentials, 'end'] : []),
  ];
}

function solvationLines({ method }: DeckRequest): string[] {
  if (!method.solvation) return [];
  const solvent = solvents[method.solvation.solvent];
  return method.solvation.model === 'SMD'
    ? ['cosmo', '  do_cosmo_smd true', `  solvent ${solvent?.names.NWChem ?? ''}`, 'end']
    : ['cosmo', `  dielec ${(solvent?.permittivity ?? NaN).toFixed(2)}`, 'end'];
}

function dftBlock({ method, task }: DeckRequest, multiplicity: number, vectors: readonly string[]): string[] {
  const spelling = functionalNames[method.functional]?.NWChem;
  if (!spelling || 'refusal' in spelling) throw new Error('nwchemDeck takes only checked requests');
  const gridWord = { normal: 'medium', fine: 'fine', 'very fine': 'xfine' }[method.grid];
  return [
    'dft',
    `  xc ${spelling.keyword}`,
    ...(multiplicity !== 1 || task === 'broken symmetry' ? ['  odft'] : []),
    `  mult ${multiplicity}`,
    `  iterations ${method.scf.maxIterations}`,
    `  grid ${gridWord}`,
    ...(method.dispersion === 'D3(0)'
      ? ['  disp vdw 3']
      : method.dispersion === 'D3(BJ)'
        ? ['  disp vdw 4']
        : []),
    // Damp the first 30 cycles and shift the virtual orbitals until the change is small.
    ...(method.scf.difficult ? ['  convergence ncydp 30 damp 50 lshift 0.3'] : []),
    ...vectors,
    '  mulliken',
    ...method.extra.keywords.map((keyword) => `  ${keyword}`),
    'end',
  ];
}

/** One calculation per ion and one of the ligands, then the whole with their orbitals as guess. */
function fragmentTasks(
  request: DeckRequest,
  plan: BrokenSymmetryPlan,
  geometry: (from: number, to: number, name?: string) => string[],
): string[] {
  const stem = request.jobKey.toLowerCase();
  const restCount = plan.rest.atomIndices.length;
  const parts = [
    ...(restCount > 0 ? [{ from: 0, to: restCount, charge: plan.rest.charge, multiplicity: 1 }] : []),
    ...plan.sites.map((site, index) => ({
      from: restCount + index,
      to: restCount + index + 1,
      charge: site.oxidationState,
      // A negative multiplicity puts the excess into beta.
      multiplicity: (site.unpaired + 1) * (site.spinUp ? 1 : -1),
    })),
  ];
  const file = (index: number) => `${stem}_part${index + 1}.movecs`;
  return [
    ...geometry(0, restCount + plan.sites.length, 'whole '),
    ...parts.flatMap((part, index) => geometry(part.from, part.to, `part${index + 1} `)),
    ...parts.flatMap((part, index) => [
      `set geometry part${index + 1}`,
      `charge ${part.charge}`,
      ...dftBlock(request, part.multiplicity, [`  vectors input atomic output ${file(index)}`]),
      // A bare ion may not converge fully; its orbitals are only a guess.
      'task dft energy ignore',
    ]),
    'set geometry whole',
    `charge ${request.charge}`,
    ...dftBlock(request, request.multiplicity, [
      `  vectors input fragment ${parts.map((_, index) => file(index)).join(' ')} output ${stem}.movecs`,
    ]),
  ];
}

function taskLines({ task, method }: DeckRequest): string[] {
  // Meta-GGAs have no analytic second derivatives in NWChem; neither have solvated molecules.
  const frequencies =
    isMetaGga(method.functional) || method.solvation
      ? 'task dft frequencies numerical'
      : 'task dft frequencies';
  if (task === 'optimisation') return ['task dft optimize'];
  if (task === 'frequencies') return [frequencies];
  if (task === 'optimisation and frequencies') return ['task dft optimize', frequencies];
  return ['task dft energy'];
}
