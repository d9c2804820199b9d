import "server-only";
import writeXlsx from "write-excel-file/node";
import { siteOf } from "@/app/_server/site";
import type { Scope } from "@/db/client";
import { exportPeriod } from "@/db/pay/exports";
import { writeCsv } from "@/lib/csv/write";
import type { FileFormat, PayFile } from "@/lib/periods/file";
import { fileTable, type TableCell } from "@/lib/periods/file-table";
import { no, type Result } from "@/lib/result";

const mediaTypes: Record<FileFormat, string> = {
  csv: "text/csv; charset=utf-8",
  json: "application/json; charset=utf-8",
  xlsx: "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet",
};

interface FileAsked {
  periodId: string;
  revision?: number | undefined;
  format: FileFormat;
  by: string;
  now: Date;
}

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** Answers with the file of a closed period, or says why there is none. */
export async function payFileResponse(
  scope: Scope,
  asked: FileAsked,
): Promise<Response | Result<never>> {
  if (!UUID.test(asked.periodId)) return no("notFound", "There is no such pay period here.");
  const { name: siteName } = await siteOf(scope.siteId);
  const write = (file: PayFile) => writers[asked.format](file);
  const found = await exportPeriod(scope, { ...asked, siteName, write });
  if (!found.ok) return found;
  const { bytes, digest, revision, from, to } = found.value;
  const name = `hours-${from}-to-${to}-r${revision}.${asked.format}`;
  return new Response(new Uint8Array(bytes), {
    headers: {
      "content-type": mediaTypes[asked.format],
      "content-disposition": `attachment; filename="${name}"`,
      "content-length": String(bytes.length),
      digest: `sha-256=${Buffer.from(digest, "hex").toString("base64")}`,
      etag: `"${digest}"`,
      "cache-control": "no-store",
    },
  });
}

const writers: Record<FileFormat, (file: PayFile) => Promise<Uint8Array>> = {
  csv: async (file) => Buffer.from(writeCsv({ ...csvOf(file), bom: true })),
  json: async (file) => Buffer.from(`${JSON.stringify(file, null, 2)}\n`),
  xlsx: async (file) => {
    const { header, rows } = fileTable(file);
    const bold = header.map((value) => ({ value, type: String, fontWeight: "bold" as const }));
    return writeXlsx([bold, ...rows.map((row) => row.map(sheetCell))], {
      sheet: "Hours",
      stickyRowsCount: 1,
    }).toBuffer();
  },
};

function csvOf(file: PayFile) {
  const { header, rows } = fileTable(file);
  const cellOf = (cell: TableCell) => ("text" in cell ? cell.text : { number: cell.hours });
  return { header, rows: rows.map((row) => row.map(cellOf)) };
}

/** Text is typed as text, so that a spreadsheet runs none of it. */
function sheetCell(cell: TableCell) {
  return "text" in cell
    ? { value: cell.text, type: String }
    : { value: Number(cell.hours), type: Number, format: "0.00" };
}
