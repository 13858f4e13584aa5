/** Name as printed, susceptibility in 10⁻⁶ cm³/mol, and how well the value is supported. */
export type PascalRow = readonly [name: string, value: number, tag: 'handbook' | 'soft'];
