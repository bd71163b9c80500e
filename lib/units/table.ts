/** Pasted blocks: rows of a table, and maps. */
export type { Column, LineError } from './block-text'
export { formatTable, keepUntouchedTable, parseTable } from './table-text'
export type { Table, TableResult } from './table-text'
export { formatMatrix, keepUntouchedMatrix, parseMatrix } from './matrix-text'
export type { Matrix, MatrixResult, MatrixShape } from './matrix-text'
