import { err, ok, type Result } from '../../result';
import { basisSets } from './basis-sets';
import { brokenSymmetryPlan } from './broken-symmetry';
import { coordinateLines } from './coordinate-line';
import type { Deck, DeckRefusal, DeckRequest } from './deck-request';
import { functionalNames } from './functional-names';
import { solvents } from './solvents';
import { titleLine } from './title-line';

const gridPoints = { normal: [302, 75], fine: [590, 99], 'very fine': [974, 125] } as const;
const optConvergence = { loose: 'gau_loose', normal: 'gau', tight: 'gau_tight' } as const;

/**
 * Psi4 1.3 input. The job key stands in a comment, which the output echoes in its input file section.
 * Source: Psi4 manual (molecule, basis, DFT, SCF, PCM); run for real in tests/integration/decks.test.ts.
 * @param request - already passed by `checkDeckRequest`
 */
export function psi4Deck(request: DeckRequest): Result<Deck, DeckRefusal> {
  const { method, task, structure } = request;
  const spelling = functionalNames[method.functional]?.Psi4;
  if (!spelling || 'refusal' in spelling) throw new Error('psi4Deck takes only checked requests');
  const refusal = unable(request);
  if (refusal) return err(refusal);
  const notes: string[] = [];
  const suffix = { none: '', 'D3(0)': '-d3', 'D3(BJ)': '-d3bj', D4: '' }[method.dispersion];
  if (suffix !== '')
    notes.push('Psi4 calls the separate program dftd3 for this dispersion term; it must be installed.');
  if (method.solvation)
    notes.push("Psi4 needs to be built with PCMSolver for this; Debian's package is not.");
  const unrestricted = request.multiplicity > 1 || task === 'broken symmetry';
  const [spherical, radial] = gridPoints[method.grid];
  const call = `'${spelling.keyword}${suffix}', return_wfn=True`;
  const lines = [
    `# ${titleLine(request)}`,
    `memory ${Math.max(250, Math.floor(request.memoryMb * 0.9))} MB`,
    'molecule {',
    `  ${request.charge} ${request.multiplicity}`,
    ...coordinateLines(structure.elements, structure.positionsAngstrom).map((line) => `  ${line}`),
    '  units angstrom',
    '  symmetry c1',
    '  no_reorient',
    '  no_com',
    '}',
    ...basisLines(request),
    'set {',
    `  reference ${unrestricted ? 'uks' : 'rks'}`,
    '  scf_type df',
    '  guess sad',
    `  maxiter ${method.scf.maxIterations}`,
    `  dft_spherical_points ${spherical}`,
    `  dft_radial_points ${radial}`,
    ...(method.scf.difficult ? ['  damping_percentage 40'] : []),
    ...(task.startsWith('optimisation')
      ? [
          `  geom_maxiter ${method.optimisation.maxSteps}`,
          `  g_convergence ${optConvergence[method.optimisation.convergence]}`,
        ]
      : []),
    ...(task === 'broken symmetry' ? ['  guess_mix true'] : []),
    ...(method.solvation ? ['  pcm true', '  pcm_scf_type total'] : []),
    ...method.extra.keywords.map((keyword) => `  ${keyword}`),
    '}',
    ...pcmLines(request),
    ...method.extra.lines,
    ...(task.startsWith('optimisation') ? [`energy_last, wfn = optimize(${call})`] : []),
    ...(task === 'frequencies' || task === 'optimisation and frequencies'
      ? [`energy_last, wfn = frequency(${call})`]
      : []),
    ...(task === 'single point' || task === 'broken symmetry' ? [`energy_last, wfn = energy(${call})`] : []),
    // After frequencies the last determinant belongs to a displaced structure: no populations then.
    ...(task.endsWith('frequencies') ? [] : ["oeprop(wfn, 'MULLIKEN_CHARGES', 'LOWDIN_CHARGES')"]),
  ];
  return ok({ text: `${lines.join('\n')}\n`, extension: 'in', notes });
}

function unable(request: DeckRequest): DeckRefusal | null {
  const { method, task } = request;
  if (task === 'stability')
    return {
      code: 'task not available',
      message: 'Psi4 1.3 has stability analysis for Hartree–Fock only, not for a functional',
    };
  if (method.relativity !== 'none')
    return {
      code: 'relativity not available',
      message: `Psi4 1.3 has no ${method.relativity} with gradients; use core potentials`,
    };
  if (method.dispersion === 'D4')
    return { code: 'dispersion not available', message: 'Psi4 1.3 has D3, no D4' };
  if (method.solvation) {
    const { model, solvent } = method.solvation;
    if (model !== 'CPCM' && model !== 'IEFPCM')
      return { code: 'solvation not available', message: `Psi4 has CPCM and IEFPCM, no ${model}` };
    if (solvents[solvent]?.names.Psi4 === null)
      return { code: 'solvation not available', message: `Psi4's solvent library has no ${solvent}` };
    if (task !== 'single point' && task !== 'broken symmetry')
      return {
        code: 'solvation not available',
        message: 'Psi4 has no gradients with PCM: only single points',
      };
  }
  if (task !== 'broken symmetry') return null;
  const broken = brokenSymmetryPlan(request);
  if ('refusal' in broken) return broken.refusal;
  const { sites } = broken.plan;
  return sites.length === 2 && request.multiplicity === 1 && sites.every((site) => site.unpaired === 1)
    ? null
    : {
        code: 'task not available',
        message:
          'Psi4 breaks symmetry by mixing one orbital pair: two sites with one electron each, net singlet',
      };
}

function basisLines({ method, structure }: DeckRequest): string[] {
  const name = (basis: string) => basisSets[basis]?.names.Psi4 ?? '';
  const single = [...new Set(structure.elements)].filter(
    (element) => method.basisPerElement[element] !== undefined,
  );
  if (single.length === 0) return [`set basis ${name(method.basis)}`];
  return [
    'basis {',
    `  assign ${name(method.basis)}`,
    ...single.map(
      (element) => `  assign ${element} ${name(method.basisPerElement[element] ?? method.basis)}`,
    ),
    '}',
  ];
}

function pcmLines({ method }: DeckRequest): string[] {
  if (!method.solvation) return [];
  return [
    'pcm = {',
    '  Units = Angstrom',
    '  Medium {',
    `    SolverType = ${method.solvation.model}`,
    `    Solvent = ${solvents[method.solvation.solvent]?.names.Psi4 ?? ''}`,
    '  }',
    '  Cavity {',
    '    Type = GePol',
    '    Area = 0.3',
    '    RadiiSet = UFF',
    '    Scaling = True',
    '  }',
    '}',
  ];
}
