export interface Line {
  /** Decoded (UTF-8, else Latin-1), without the line ending; leading blanks are kept. */
  text: string;
  /** 1-based. */
  number: number;
}

/** Takes the lines after a landmark, one by one. */
export interface Section {
  /** Returns true to be given the next line too, false when this line was the section's last. */
  take(line: Line): boolean;
  /** Takes lines as bytes [from, to) in place of `take`; they are valid during the call only. */
  takeBytes?(bytes: Uint8Array, from: number, to: number): boolean;
  /** Landmarks are not looked for inside (echoed input); only `always` landmarks break it off. */
  exclusive?: boolean;
}

export interface Landmark {
  /** What the line starts with, blanks collapsed, for example "Total DFT energy =". */
  text: string;
  /** Called with the landmark's line; a returned section takes the lines that follow. Closes an open one. */
  read(line: Line): Section | void;
  /**
   * A look at the bytes [from, to) of the line before it becomes text; false passes the line over. For lists
   * of thousands of rows of which one or two count; the bytes are valid during the call only.
   */
  glance?(bytes: Uint8Array, from: number, to: number, lineNumber: number): boolean;
  /** Is looked for inside exclusive sections too (program banners). */
  always?: boolean;
  /** Is looked for only while no section is open (rules and other lines that tables contain too). */
  onlyOutside?: boolean;
  /** Is read from a last line without newline too. */
  evenUnended?: boolean;
}
