import type { Doing, Folded } from "@/lib/timeline/schema";
import { timeText } from "./clock";
import { letterOf } from "./tickets";

/** Writes a fold in the notation of the scenario tables. */
export function foldedRows(
  name: string,
  { segments, reports, looseEnds }: Folded,
  scenario: { showsCells: boolean; nameOf(id: string): string },
): string[] {
  return [
    ...segments.map(({ start, end, doing, cell, said }) =>
      [
        "=",
        name,
        timeText(start),
        end === null ? "..." : timeText(end),
        doingText(doing),
        ...(said ? ["(said)"] : []),
        ...(scenario.showsCells ? ["in", cell ?? "nowhere"] : []),
      ].join(" "),
    ),
    ...reports.map(({ atMs, ticket, operation, good, rework, scrap }) =>
      ["+", name, timeText(atMs / 1000), itemText({ ticket, operation }), good, rework, scrap].join(
        " ",
      ),
    ),
    ...looseEnds.map(({ code, subject, settled }) =>
      ["?", name, code, scenario.nameOf(subject), ...(settled ? ["(settled)"] : [])].join(" "),
    ),
  ];
}

function doingText(doing: Doing): string {
  if (doing.kind === "indirect") return `other ${doing.code}`;
  if (doing.kind !== "work") return doing.kind;
  const activity = doing.activity === "inspect" ? "inspecting" : doing.activity;
  return [activity, ...doing.items.map((item) => itemText(item) + weightText(item.weight))].join(
    " ",
  );
}

function itemText({ ticket, operation }: { ticket: string; operation: string }): string {
  const letter = letterOf(ticket);
  return operation === "120" ? letter : `${letter}/${operation}`;
}

function weightText(weight: number): string {
  return weight === 1 ? "" : `*${weight}`;
}
