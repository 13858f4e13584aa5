import { electronCount, multiplicityFits } from '../../chemistry/electron-count';
import { atomicNumber, elementSymbol } from '../../chemistry/elements';
import { isJobKey } from '../job-key';
import { basisSets } from './basis-sets';
import type { DeckRefusal, DeckRequest } from './deck-request';
import { forbiddenExtra } from './extra-lines';
import { functionalNames, hasOwnDispersion } from './functional-names';
import { solvents } from './solvents';

/** Beyond this no group runs DFT by hand-made decks; a pasted protein is the usual cause. */
export const mostAtoms = 1000;
/** Two nuclei closer than this (Å) are a mistake; the shortest real bond, H–H, has 0.74. */
const closestAngstrom = 0.5;

/**
 * First reason why a deck must not be written, or null. What depends on one program's abilities alone
 * (solvent, task) is judged by that program's own writer.
 */
export function checkDeckRequest(request: DeckRequest): DeckRefusal | null {
  return checkStructure(request) ?? checkElectrons(request) ?? checkMethod(request) ?? checkExtra(request);
}

function checkStructure({ structure, jobKey }: DeckRequest): DeckRefusal | null {
  const { elements, positionsAngstrom: positions } = structure;
  if (!isJobKey(jobKey)) return { code: 'bad job key', message: `"${jobKey}" is no job key` };
  if (elements.length === 0) return { code: 'bad structure', message: 'the structure has no atoms' };
  if (elements.length > mostAtoms)
    return {
      code: 'too many atoms',
      message: `${elements.length} atoms; decks are written for up to ${mostAtoms}`,
    };
  if (elements.length !== positions.length)
    return { code: 'bad structure', message: `${elements.length} elements, ${positions.length} positions` };
  const unknown = elements.find((element) => elementSymbol(element) !== element);
  if (unknown !== undefined) return { code: 'unknown element', message: `"${unknown}" is no element symbol` };
  for (let i = 0; i < positions.length; i++) {
    const here = positions[i];
    if (!here?.every((value) => Number.isFinite(value) && Math.abs(value) < 10_000))
      return { code: 'bad structure', message: `atom ${i + 1} has no usable position` };
    for (let j = 0; j < i; j++) {
      const there = positions[j];
      if (there && Math.hypot(here[0] - there[0], here[1] - there[1], here[2] - there[2]) < closestAngstrom)
        return { code: 'bad structure', message: `atoms ${j + 1} and ${i + 1} lie on top of each other` };
    }
  }
  return null;
}

function checkElectrons({ structure, charge, multiplicity }: DeckRequest): DeckRefusal | null {
  const electrons = Number.isInteger(charge) ? electronCount(structure.elements, charge) : null;
  if (electrons === null || electrons === 0)
    return { code: 'impossible multiplicity', message: `charge ${charge} leaves no electrons` };
  if (!multiplicityFits(electrons, multiplicity))
    return {
      code: 'impossible multiplicity',
      message: `${electrons} electrons cannot have multiplicity ${multiplicity}`,
    };
  return null;
}

function checkMethod({ method, structure }: DeckRequest): DeckRefusal | null {
  const { program } = method;
  const spelling = functionalNames[method.functional]?.[program];
  if (!spelling)
    return {
      code: 'functional not available',
      message: `no functional "${method.functional}"; known: ${Object.keys(functionalNames).join(', ')}`,
    };
  if ('refusal' in spelling) return { code: 'functional not available', message: spelling.refusal };
  for (const element of new Set(structure.elements)) {
    const name = method.basisPerElement[element] ?? method.basis;
    const basis = basisSets[name];
    if (!basis)
      return {
        code: 'basis not available',
        message: `no basis "${name}"; known: ${Object.keys(basisSets).join(', ')}`,
      };
    if (basis.names[program] === null)
      return { code: 'basis not available', message: `${program}'s library has no ${name}` };
    if (!basis.covers(atomicNumber(element) ?? 0, program))
      return {
        code: 'basis missing for element',
        message: `${name} has no functions for ${element} in ${program}`,
      };
  }
  const stranger = Object.keys(method.basisPerElement).find((element) => elementSymbol(element) !== element);
  if (stranger !== undefined)
    return {
      code: 'unknown element',
      message: `"${stranger}" in the bases per element is no element symbol`,
    };
  if (method.dispersion !== 'none' && hasOwnDispersion(method.functional))
    return { code: 'dispersion not available', message: `${method.functional} has its own dispersion term` };
  if (method.solvation && !solvents[method.solvation.solvent])
    return {
      code: 'solvation not available',
      message: `no solvent "${method.solvation.solvent}"; known: ${Object.keys(solvents).join(', ')}`,
    };
  return null;
}

function checkExtra({ method }: DeckRequest): DeckRefusal | null {
  const bad = forbiddenExtra(method);
  return bad === null ? null : { code: 'bad extra line', message: bad };
}
