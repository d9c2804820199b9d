/** Where a gauge stands: its height, line and rim follow (a class may set `--h` anew). */
export type GaugeSize = "cell" | "row" | "phone" | "bench" | "wall" | "paper";

/** What the work is doing. Work without a standard needs no state of its own. */
export type GaugeState = "live" | "finished" | "held" | "paused" | "other-work";
