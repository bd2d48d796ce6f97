import type { ComputedTable, IssuedRow } from './request';

/** What a revision freezes: the computed table and its rows with their ±. */
export interface IssuedTable {
  table: ComputedTable;
  rows: readonly IssuedRow[];
}
