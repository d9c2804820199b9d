"use client";

import { BenchAside } from "@/components/bench/bench-aside";
import { BenchIdle } from "@/components/bench/bench-idle";
import { BenchSeveral } from "@/components/bench/bench-several";
import { BenchWork } from "@/components/bench/bench-work";
import type { SeenBench } from "@/components/bench/seen";
import { KioskFrame } from "@/components/shell/kiosk-frame";

/** A worker's own screen: what the time runs on now, and what may be done about it. */
export function BenchScreen(seen: SeenBench) {
  return (
    <KioskFrame state={seen.state}>
      <Present {...seen} />
    </KioskFrame>
  );
}

function Present(seen: SeenBench) {
  const { doing, items } = seen.view;
  const [item, ...more] = items;
  if (doing?.kind === "work" && item) {
    return more.length > 0 ? <BenchSeveral {...seen} /> : <BenchWork {...seen} item={item} />;
  }
  if (doing && doing.kind !== "unassigned" && doing.kind !== "work") {
    return <BenchAside {...seen} doing={doing} />;
  }
  return <BenchIdle {...seen} />;
}
