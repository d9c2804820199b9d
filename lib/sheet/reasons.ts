/** Why a step does not apply to an instrument: what the kiosk offers, as it travels in the note. */
export const skipReasons = ["not-on-this", "done-before", "done-elsewhere", "left-out"] as const;
export type SkipReason = (typeof skipReasons)[number];

/** Why an instrument goes to a colleague. */
export const handOverReasons = ["shift-ends", "called-away", "another-skill", "lead-said"] as const;
export type HandOverReason = (typeof handOverReasons)[number];
