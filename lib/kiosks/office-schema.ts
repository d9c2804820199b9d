import { z } from "zod";
import { chosen, formId, line } from "@/lib/forms";

/** A browser that is to become a kiosk of a cell. */
export const enrolmentForm = z.strictObject({ id: formId, name: line(40), cell: chosen });

/** What is shown once: the code, where it is keyed, and until when (epoch milliseconds). */
export interface GivenCode {
  name: string;
  cell: string;
  code: string;
  expiresAtMs: number;
}

/** A kiosk's new name and cell; no cell leaves it where it is. */
export const kioskForm = z.strictObject({
  kiosk: formId,
  name: line(40),
  cell: chosen.or(z.literal("").transform(() => null)),
});

/** A kiosk that is taken out of use. */
export const kioskChoice = z.strictObject({ kiosk: formId });
