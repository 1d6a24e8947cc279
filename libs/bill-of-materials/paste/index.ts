export { cellDate, cellDecimal, cellMoney, cellWhole, type Cell, type CellBounds } from './cells.js';
export {
  mapColumns,
  type ColumnSpec,
  type MappedColumn,
  type MappedRow,
  type MappedTable,
  type SeriesCell,
} from './map-columns.js';
export { PASTE_LIMITS, readTable } from './read-table.js';
