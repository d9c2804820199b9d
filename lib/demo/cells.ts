import type { OtherWorkCode } from "@/lib/ledger/other-work";

/** A cell of Larkmoor Stringworks with the other work that is usual there, likeliest first. */
export interface DemoCell {
  name: string;
  otherWork: readonly OtherWorkCode[];
}

/** The eleven cells in the order in which an instrument meets them first. */
export const cells = [
  { name: "Mill", otherWork: ["moving-material", "tool-care", "stock-count", "maintenance"] },
  { name: "CNC", otherWork: ["tool-care", "maintenance", "jigs", "moving-material"] },
  { name: "Body", otherWork: ["jigs", "tool-care", "moving-material", "waiting-lead"] },
  { name: "Binding", otherWork: ["tool-care", "jigs", "waiting-material"] },
  { name: "Neck", otherWork: ["jigs", "tool-care", "waiting-lead", "prototype"] },
  { name: "Spray", otherWork: ["maintenance", "cleaning", "moving-material", "waiting-lead"] },
  { name: "Buff", otherWork: ["maintenance", "tool-care", "moving-material"] },
  { name: "Pickups", otherWork: ["stock-count", "prototype", "jigs", "waiting-material"] },
  { name: "Assembly", otherWork: ["waiting-material", "stock-count", "jigs", "waiting-lead"] },
  { name: "Final set-up", otherWork: ["tool-care", "waiting-lead", "prototype"] },
  { name: "Inspection", otherWork: ["waiting-lead", "stock-count", "tool-care", "training"] },
] as const satisfies readonly DemoCell[];

export type CellName = (typeof cells)[number]["name"];
