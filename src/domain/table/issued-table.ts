import type { ComputedTable, KeptRow } from './request';

/** What a revision freezes: the computed table, its rows with their ± and the closer ones between them. */
export interface IssuedTable {
  table: ComputedTable;
  /** Ascending by reading: those of the table, and between them those that only look-ups use. */
  rows: readonly KeptRow[];
  /** ± of the whole liquid space, litres: sizes and computing, no dip. */
  brimPlusMinusL: number;
}
