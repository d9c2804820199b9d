import { checkDigit } from "@/lib/codes/damm";

/** What a badge's bar code and QR code carry: `W`, the worker's number and its check digit. */
export function badgeCode(workerNumber: string): string {
  return `W${workerNumber}${checkDigit(workerNumber)}`;
}

/**
 * What the code on a carrier (rack, trolley, conveyor hanger) carries: `C`, its number and its check
 * digit. Scanning it means every ticket hung on it.
 */
export function carrierCode(carrierNumber: string): string {
  return `C${carrierNumber}${checkDigit(carrierNumber)}`;
}
