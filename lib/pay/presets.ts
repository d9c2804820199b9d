import type { z } from "zod";
import { type PayPolicy, type PresetName, payPolicy } from "@/lib/pay/schema";

const fortyHours = { overHours: 40, bucket: "overtime" } as const;

/** The policies of CALCULATIONS.md 4 as data; what they leave out is the same for all. */
const presets: Record<PresetName, z.input<typeof payPolicy>> = {
  "us-federal": {
    workweek: { startsOn: "sunday" },
    overtime: { weekly: [fortyHours] },
  },
  "us-california": {
    workweek: { startsOn: "sunday" },
    overtime: {
      daily: [
        { overHours: 8, bucket: "overtime" },
        { overHours: 12, bucket: "double" },
      ],
      weekly: [fortyHours],
      seventhDay: [
        { overHours: 0, bucket: "overtime" },
        { overHours: 8, bucket: "double" },
      ],
    },
    flatSum: "regular-hours",
    limits: "us-california",
  },
  "eu-working-time": { limits: "eu-working-time" },
  straight: {},
};

/** The whole policy behind a preset's name; a policy is itself. */
export function policyOf(asked: PresetName | PayPolicy): PayPolicy {
  return typeof asked === "string" ? payPolicy.parse(presets[asked]) : asked;
}
