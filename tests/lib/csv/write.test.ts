import { parse } from "csv-parse/sync";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type CsvCell, writeCsv } from "@/lib/csv/write";
import checks from "@/tests/checks/csv-files.json";

interface Check {
  source: string;
  given: { rows: string[][]; values: string[]; text_cells: string[]; cell: string; name: string };
  expect: { text: string; out: string[]; written: string; bytes_with_bom: string };
}

/** A check of tests/checks/csv-files.json by its id; its source stands beside its values there. */
function check(id: string): Check {
  return checks.find((entry) => entry.id === id) as unknown as Check;
}

/** What a file of one row and as many columns as cells looks like below its header. */
function written(cells: readonly CsvCell[]): string {
  const header = cells.map((_, column) => `c${column}`);
  return writeCsv({ header, rows: [cells] }).slice(header.join().length + 2);
}

function readBack(text: string): string[][] {
  return parse(text, { record_delimiter: "\r\n", bom: true });
}

describe("writeCsv", () => {
  test("quotes only what needs it, doubles quotes, ends rows with CRLF (RFC 4180)", () => {
    const { given, expect: expected } = check("csv-write");
    expect(written(given.rows[0]!)).toBe(expected.text);
  });
  test("neutralises what a spreadsheet would run (OWASP ASVS 5.0 1.2.10)", () => {
    const { given, expect: expected } = check("inj-neutralise");
    const rows = given.text_cells.map((cell) => [cell]);
    const read = readBack(writeCsv({ header: ["text"], rows })).slice(1);
    expect(read).toEqual(expected.out.map((cell) => [cell]));
  });
  test("quotes come after the leading quote", () => {
    expect(written(['=HYPERLINK("http://x","y")', "b"])).toBe(
      `${check("inj-cell").expect.written},b\r\n`,
    );
  });
  test("a number stays a number, the same as text does not (common practice)", () => {
    expect(written([-1.25, "-1.25", { number: "-1.50" }, null])).toBe("-1.25,'-1.25,-1.50,\r\n");
  });
  test("a formula after an injected separator stays inside its cell", () => {
    const { cell } = check("inj-delim").given;
    expect(readBack(written([cell, "b"]))).toEqual([[cell, "b"]]);
  });
  test("an empty value in a file of one column is told from a blank line (common practice)", () => {
    expect(writeCsv({ header: ["note"], rows: [[""], ["x"]] })).toBe('note\r\n""\r\nx\r\n');
  });
  test("puts the byte order mark first where asked", () => {
    const { given, expect: expected } = check("bom-write");
    const bytes = Buffer.from(writeCsv({ header: [given.name], rows: [], bom: true }));
    expect(bytes.toString("hex").toUpperCase()).toBe(
      `${expected.bytes_with_bom.replaceAll(" ", "")}0D0A`,
    );
  });
  test("full-width signs are neutralised like plain ones", () => {
    expect(written(["＝1+1", "－1", "b"])).toBe("'＝1+1,'－1,b\r\n");
  });
  test("awkward values come back as they were", () => {
    const values = check("csv-round-trip").given.values.filter((value) => value !== "\t");
    expect(readBack(written([...values, "end"]))).toEqual([[...values, "end"]]);
  });
  test("for any text, what is read back is the text, or the text behind one single quote", () => {
    const cells = fc.array(fc.string({ unit: "binary" }), { minLength: 1, maxLength: 6 });
    fc.assert(
      fc.property(cells, (row) => {
        const [, read] = readBack(writeCsv({ header: row.map(() => "h"), rows: [row] }));
        const expected = row.map((cell) =>
          /^[=+\-@\t\r\0＝＋－＠]/.test(cell) ? `'${cell}` : cell,
        );
        expect(read).toEqual(expected);
      }),
    );
  });
  test("refuses a ragged row and what is no number", () => {
    expect(() => writeCsv({ header: ["a"], rows: [["1", "2"]] })).toThrow("as long as");
    expect(() => written([Number.NaN, "b"])).toThrow("NaN is no number");
    expect(() => written([{ number: "=1+1" }, "b"])).toThrow("no number");
  });
});
