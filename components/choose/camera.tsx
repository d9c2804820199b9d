"use client";

import { useEffect, useEffectEvent, useRef, useState } from "react";
import { useTranslations } from "use-intl";
import { Plate } from "@/components/ui/plate";
import { type NoCamera, type Scan, startScan } from "@/kiosk/scan";

/**
 * The camera with its seam: bars held across it are read. It stops when the screen goes; where the
 * camera is refused or missing, the leaf says so and the number pad stays.
 */
export function Camera({ onText }: { onText: (text: string) => void }) {
  const t = useTranslations("scan");
  const video = useRef<HTMLVideoElement>(null);
  const [state, setState] = useState<Scan | NoCamera | "opening">("opening");
  const heard = useEffectEvent(onText);
  useEffect(() => {
    let scan: Scan | NoCamera | undefined;
    let isGone = false;
    const stop = () => {
      if (typeof scan === "object") scan.stop();
    };
    if (!video.current) return;
    void startScan(video.current, (text) => heard(text)).then((started) => {
      scan = started;
      if (isGone) stop();
      else setState(started);
    });
    return () => {
      isGone = true;
      stop();
    };
  }, []);
  const word = typeof state === "string" ? state : "hold";
  return (
    <div className="camera">
      <video ref={video} muted playsInline aria-hidden tabIndex={-1} />
      {typeof state === "object" && (
        <>
          <i className="camera-leaf" data-side="book" />
          <i className="camera-leaf" data-side="day" />
          <i className="camera-aim" />
          {state.hasLamp && <Lamp scan={state} />}
        </>
      )}
      <p role="status">{t(word)}</p>
    </div>
  );
}

function Lamp({ scan }: { scan: Scan }) {
  const t = useTranslations("scan");
  const [isOn, setOn] = useState(false);
  const turn = () => {
    setOn(!isOn);
    void scan.setLamp(!isOn);
  };
  return (
    <Plate minor icon="light" aria-pressed={isOn} onClick={turn} className="camera-lamp">
      {isOn ? t("lightOff") : t("lightOn")}
    </Plate>
  );
}
