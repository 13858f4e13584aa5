/** What can be wrong with an XYZ file. `line` is 1-based in the file as given. */
export type XyzProblemCode =
  | 'empty file'
  | 'no atom count'
  | 'no atoms'
  | 'too few atoms'
  | 'too many atoms'
  | 'incomplete atom line'
  | 'unknown element'
  | 'not a number'
  | 'periodic input'
  | 'coincident atoms';

export interface XyzProblem {
  code: XyzProblemCode;
  line: number;
  /** One sentence on what is wrong and one on what to do. */
  message: string;
}
