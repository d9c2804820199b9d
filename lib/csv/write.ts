import { stringify } from "csv-stringify/sync";
import { assert } from "@/lib/assert";

/**
 * One cell of a file: text, a number, a number in fixed digits (`{ number: "7.50" }`), or nothing.
 * What came from people or other systems is text, also where it looks like a number.
 */
export type CsvCell = string | number | { number: string } | null;

export interface CsvFile {
  header: readonly string[];
  /** One array a row, as long as the header. */
  rows: readonly (readonly CsvCell[])[];
  /** True puts a byte order mark first: spreadsheets on Windows need it to see UTF-8. */
  bom?: boolean;
}

/** What a spreadsheet may take for a formula, full-width forms included. */
const FORMULA_START = /^[=+\-@\t\r\0\uff1d\uff0b\uff0d\uff20]/;
const DECIMAL = /^-?\d+(\.\d+)?$/;

/**
 * Writes a CSV file: comma, CRLF after every row, quotes only where needed (RFC 4180). Text that a
 * spreadsheet could run as a formula gets a leading single quote (OWASP ASVS 5.0, 1.2.10); numbers
 * stay numbers, negative ones too.
 *
 * @throws RangeError for a row that is not as long as the header, or a number that is none
 */
export function writeCsv({ header, rows, bom = false }: CsvFile): string {
  for (const row of rows) {
    assert(row.length === header.length, "writeCsv: every row is as long as the header");
  }
  return stringify(
    [header, ...rows].map((row) => row.map(cellText)),
    {
      bom,
      record_delimiter: "\r\n",
      // An empty value alone in its row would read as a blank line.
      quoted_empty: header.length === 1,
    },
  );
}

function cellText(cell: CsvCell): string {
  if (cell === null) return "";
  if (typeof cell === "string") return FORMULA_START.test(cell) ? `'${cell}` : cell;
  const digits = typeof cell === "number" ? String(cell) : cell.number;
  const isNumber = typeof cell === "number" ? Number.isFinite(cell) : DECIMAL.test(digits);
  assert(isNumber, `writeCsv: ${digits} is no number`);
  return digits;
}
