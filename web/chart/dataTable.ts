/** A table of numbers: for a person to read (rounded) and for a program (all digits). */
export interface DataTable {
  /** Begins the name of a saved file. */
  readonly fileName: string;
  readonly columns: readonly DataColumn[];
  /** One cell for each column; a text stands as it is. */
  readonly rows: readonly (readonly (number | string)[])[];
}

export interface DataColumn {
  /** For a person, unit included. */
  readonly title: string;
  /** For a program, unit included: 'settlement_m'. */
  readonly key: string;
  readonly text: (value: number) => string;
}

/** Comma-separated values (RFC 4180), every digit that tells one number from another; NaN is an empty cell. */
export function tableAsCsv(table: DataTable): string {
  const header = table.columns.map(({ key }) => key);
  const lines = [header, ...table.rows.map((row) => row.map(fullCell))];
  return lines.map((line) => line.map(quoted).join(',') + '\r\n').join('');
}

/** Tab-separated values with all digits, as a spreadsheet takes them from the clipboard. */
export function tableAsTabs(table: DataTable): string {
  const header = table.columns.map(({ title }) => title);
  const lines = [header, ...table.rows.map((row) => row.map(fullCell))];
  return lines
    .map((line) => line.map((cell) => harmless(cell.replace(/[\t\r\n]/g, ' '))).join('\t'))
    .join('\n');
}

/** A cell as a person reads it. */
export function cellText(table: DataTable, row: number, column: number): string {
  const cell = table.rows[row][column];
  return typeof cell === 'string' ? cell : table.columns[column].text(cell);
}

function fullCell(cell: number | string): string {
  if (typeof cell === 'string') return cell;
  return Number.isNaN(cell) ? '' : String(cell);
}

function quoted(cell: string): string {
  const safe = harmless(cell);
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** A text that a spreadsheet would run as a formula has an apostrophe put before it. */
function harmless(cell: string): string {
  return /^[=+@\t\r]/.test(cell) || /^-[^0-9.]/.test(cell) ? `'${cell}` : cell;
}
