import { nwchem } from './nwchem/nwchem';
import { orca } from './orca/orca';
import type { ProgramDefinition } from './program';

/** Every program that is read. A further one is added here. */
export const programs: readonly ProgramDefinition[] = [orca, nwchem];
