import { z } from "zod";
import { chosen, formId, line } from "@/lib/forms";

/** A browser that is to become a kiosk of a cell. */
export const enrolmentForm = z.strictObject({ id: formId, name: line(40), cell: chosen });

/** What is shown once: the code, where it is keyed, and until when. */
export interface GivenCode {
  name: string;
  cell: string;
  /** As it is read aloud, `K7MR-4XPT`. */
  code: string;
  /** The page where it is keyed. */
  address: string;
  /** Rows of the QR code that opens that page with the code filled in; true is dark. */
  dots: readonly (readonly boolean[])[];
  /** The site's wall clock when it ends. */
  until: string;
}

/** A kiosk's new name and cell; no cell leaves it where it is. */
export const kioskForm = z.strictObject({
  kiosk: formId,
  name: line(40),
  cell: chosen.or(z.literal("").transform(() => null)),
});

/** A kiosk that is taken out of use. */
export const kioskChoice = z.strictObject({ kiosk: formId });
