import { boundaryMs } from "@/lib/time/wall-time";

/** Finds boundaries given in local time; each is worked out once, as that is slow. */
export interface ZoneClock {
  zone: string;
  /** Epoch seconds of a date and a time "HH:MM"; skipped and doubled times as `boundaryMs` has it. */
  secondOf: (date: string, time: string) => number;
}

/** A clock for many boundaries in one zone. */
export function zoneClock(zone: string): ZoneClock {
  const known = new Map<string, number>();
  return {
    zone,
    secondOf: (date, time) => {
      const local = `${date}T${time}`;
      const second = known.get(local) ?? Math.floor(boundaryMs(local, zone) / 1000);
      known.set(local, second);
      return second;
    },
  };
}
