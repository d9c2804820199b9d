/**
 * The other-work codes that a site starts with (common practice: labour that belongs to no ticket).
 * An event may carry any code; the messages have a word for these.
 */
export const otherWorkCodes = [
  "waiting-material",
  "waiting-lead",
  "machine-down",
  "cleaning",
  "meeting",
  "training",
  "maintenance",
  "tool-care",
  "jigs",
  "moving-material",
  "prototype",
  "stock-count",
  "first-aid",
] as const;

export type OtherWorkCode = (typeof otherWorkCodes)[number];
