/** Where a number comes from. `SourceId` keys into the list in `sources.ts`. */
export interface Provenance {
  readonly source: string;
  /** Table, row, equation or file within the source. */
  readonly where: string;
  /**
   * How it was read: in the source itself, in a transcription of it (an open data table), derived by a stated
   * formula from other numbers here, or recalled from memory and still to be compared with the source.
   */
  readonly read: 'source' | 'transcription' | 'derived' | 'memory';
  readonly note?: string;
}

/** One number with its provenance and its relative standard uncertainty. */
export interface Sourced extends Provenance {
  readonly value: number;
  readonly relativeUncertainty: number;
  /** Temperature the value holds at; absent where it hardly matters. */
  readonly temperature_K?: number;
}
