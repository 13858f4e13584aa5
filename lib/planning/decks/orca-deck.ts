import { atomicNumber } from '../../chemistry/elements';
import { err, ok, type Result } from '../../result';
import { basisSets } from './basis-sets';
import { brokenSymmetryPlan } from './broken-symmetry';
import { coordinateLines } from './coordinate-line';
import type { Deck, DeckRefusal, DeckRequest } from './deck-request';
import { functionalNames, isHybrid, isMetaGga } from './functional-names';
import { solvents } from './solvents';
import { titleLine } from './title-line';

const dispersionKeyword = { none: null, 'D3(0)': 'D3ZERO', 'D3(BJ)': 'D3BJ', D4: 'D4' } as const;
const gridKeyword = { normal: 'DefGrid1', fine: 'DefGrid2', 'very fine': 'DefGrid3' } as const;
const optKeyword = { loose: 'LooseOpt', normal: 'Opt', tight: 'TightOpt' } as const;

/**
 * ORCA 5/6 input. ORCA has no title: the first line is a comment, which the output echoes in its input
 * file section. Source: ORCA 5 manual, sections on general input, SCF, CPCM, frequencies, broken symmetry.
 * @param request - already passed by `checkDeckRequest`
 */
export function orcaDeck(request: DeckRequest): Result<Deck, DeckRefusal> {
  const { method, task, structure } = request;
  const notes: string[] = [];
  const spelling = functionalNames[method.functional]?.ORCA;
  if (!spelling || 'refusal' in spelling) throw new Error('orcaDeck takes only checked requests');
  const relativistic = method.relativity !== 'none';
  if (relativistic && !method.basis.startsWith('def2-'))
    return err({ code: 'relativity not available', message: 'ORCA has recontracted sets for def2 only' });
  if (
    relativistic &&
    structure.elements.some(
      (element) => (basisSets['def2-SVP']?.potentialFrom ?? 0) <= (atomicNumber(element) ?? 0),
    )
  )
    return err({
      code: 'relativity not available',
      message: 'elements from Rb on need SARC bases with a scalar relativistic Hamiltonian; not written here',
    });
  if (method.solvation && method.solvation.model !== 'CPCM' && method.solvation.model !== 'SMD')
    return err({
      code: 'solvation not available',
      message: `ORCA has CPCM and SMD, no ${method.solvation.model}`,
    });

  const broken = task === 'broken symmetry' ? brokenSymmetryPlan(request) : null;
  if (broken && 'refusal' in broken) return err(broken.refusal);
  const multiplicity = broken ? broken.plan.highSpinMultiplicity : request.multiplicity;
  const solvent = method.solvation ? (solvents[method.solvation.solvent]?.names.ORCA ?? '') : null;
  const prefix = method.relativity === 'ZORA' ? 'ZORA-' : method.relativity === 'DKH2' ? 'DKH-' : '';

  const numerical = isMetaGga(method.functional);
  const frequencies = task === 'frequencies' || task === 'optimisation and frequencies';
  if (frequencies && numerical) notes.push('Frequencies of a meta-GGA are taken numerically (6N gradients).');
  const auxiliary = relativistic ? 'SARC/J' : method.basis.startsWith('def2-') ? 'def2/J' : 'AutoAux';
  const keywords = [
    multiplicity === 1 && task !== 'stability' ? 'RKS' : 'UKS',
    spelling.keyword,
    `${prefix}${basisSets[method.basis]?.names.ORCA ?? ''}`,
    isHybrid(method.functional) ? 'RIJCOSX' : 'RI',
    auxiliary,
    dispersionKeyword[method.dispersion],
    method.relativity === 'ZORA' ? 'ZORA' : method.relativity === 'DKH2' ? 'DKH2' : null,
    solvent === null ? null : `CPCM(${solvent})`,
    gridKeyword[method.grid],
    'TightSCF',
    method.scf.difficult ? 'SlowConv' : null,
    task === 'optimisation' || task === 'optimisation and frequencies'
      ? optKeyword[method.optimisation.convergence]
      : null,
    frequencies ? (numerical ? 'NumFreq' : 'Freq') : null,
    ...method.extra.keywords,
  ].filter((keyword) => keyword !== null);

  const scf = [
    `  MaxIter ${method.scf.maxIterations}`,
    ...(method.scf.difficult ? ['  DIISMaxEq 15', '  DirectResetFreq 5'] : []),
    ...(task === 'stability' ? ['  STABPerform true', '  STABRestartUHFifUnstable true'] : []),
    ...(broken
      ? [
          `  FlipSpin ${broken.plan.flipped.map((site) => site.atomIndex).join(',')}`,
          `  FinalMs ${((request.multiplicity - 1) / 2).toFixed(1)}`,
        ]
      : []),
  ];
  const perElement = Object.entries(method.basisPerElement).filter(([element]) =>
    structure.elements.includes(element),
  );
  const lines = [
    `# ${titleLine(request)}`,
    `! ${keywords.join(' ')}`,
    `%pal nprocs ${request.cores} end`,
    // %maxcore is per process; a quarter stays free for what ORCA takes beyond it (manual's advice).
    `%maxcore ${Math.max(100, Math.floor((request.memoryMb * 0.75) / request.cores))}`,
    '%scf',
    ...scf,
    'end',
    ...(task.startsWith('optimisation') ? ['%geom', `  MaxIter ${method.optimisation.maxSteps}`, 'end'] : []),
    ...(method.solvation?.model === 'SMD'
      ? ['%cpcm', '  smd true', `  SMDsolvent "${solvent ?? ''}"`, 'end']
      : []),
    ...(perElement.length > 0
      ? [
          '%basis',
          ...perElement.map(
            ([element, name]) => `  NewGTO ${element} "${prefix}${basisSets[name]?.names.ORCA ?? ''}" end`,
          ),
          'end',
        ]
      : []),
    ...method.extra.lines,
    `* xyz ${request.charge} ${multiplicity}`,
    ...coordinateLines(structure.elements, structure.positionsAngstrom),
    '*',
  ];
  if (broken)
    notes.push('ORCA converges the high-spin determinant first, then turns the flipped sites round.');
  return ok({ text: `${lines.join('\n')}\n`, extension: 'inp', notes });
}
