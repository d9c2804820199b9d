/** A running camera that reads codes. */
export interface Scan {
  /** Stops reading and lets go of the camera. */
  stop(): void;
  /** Whether this camera has a lamp. */
  hasLamp: boolean;
  setLamp(isOn: boolean): Promise<void>;
}

/** Why there is no camera: the person or the tablet said no, or there is none. */
export type NoCamera = "refused" | "missing";

const camera: MediaStreamConstraints = {
  audio: false,
  video: { facingMode: "environment", width: { ideal: 1280 }, height: { ideal: 720 } },
};

/** A look every 120 ms keeps a slow tablet responsive; a code is read within three looks. */
const LOOK_EVERY_MS = 120;

/**
 * Shows the camera in `video` and calls `onText` for every code it reads, the same one again and
 * again while it is held there. Reads Code 128 and QR. The reader is loaded at the first use.
 */
export async function startScan(
  video: HTMLVideoElement,
  onText: (text: string) => void,
): Promise<Scan | NoCamera> {
  const stream = await openCamera();
  if (typeof stream === "string") return stream;
  const track = stream.getVideoTracks()[0];
  let timer: ReturnType<typeof setTimeout> | undefined;
  let stopped = false;
  video.srcObject = stream;
  const reading = Promise.all([loadReader(), video.play()]).then(([read]) => {
    const look = () => {
      if (stopped) return;
      const text = read(video);
      if (text !== null) onText(text);
      timer = setTimeout(look, LOOK_EVERY_MS);
    };
    look();
  });
  const stop = () => {
    stopped = true;
    clearTimeout(timer);
    for (const each of stream.getTracks()) each.stop();
    video.srcObject = null;
  };
  // Leaving the screen at once breaks off `play()`: that is no fault.
  reading.catch(stop);
  return {
    stop,
    hasLamp: Boolean(track && "torch" in (track.getCapabilities?.() ?? {})),
    async setLamp(isOn) {
      // safe because `torch` is a constraint of the Image Capture draft that the types lack
      await track?.applyConstraints({ advanced: [{ torch: isOn } as MediaTrackConstraintSet] });
    },
  };
}

async function openCamera(): Promise<MediaStream | NoCamera> {
  if (!navigator.mediaDevices?.getUserMedia) return "missing";
  try {
    return await navigator.mediaDevices.getUserMedia(camera);
  } catch (error) {
    return error instanceof DOMException && error.name === "NotAllowedError"
      ? "refused"
      : "missing";
  }
}

/** Loads the reader; it gives the text of the code in a video's picture, or null. */
async function loadReader(): Promise<(video: HTMLVideoElement) => string | null> {
  const [{ BrowserMultiFormatReader }, { BarcodeFormat, DecodeHintType }] = await Promise.all([
    import("@zxing/browser"),
    import("@zxing/library"),
  ]);
  const formats = [BarcodeFormat.CODE_128, BarcodeFormat.QR_CODE];
  const reader = new BrowserMultiFormatReader(
    new Map([[DecodeHintType.POSSIBLE_FORMATS, formats]]),
  );
  const canvas = document.createElement("canvas");
  const picture = canvas.getContext("2d", { willReadFrequently: true });
  return (video) => {
    if (!picture || video.videoWidth === 0) return null;
    [canvas.width, canvas.height] = [video.videoWidth, video.videoHeight];
    picture.drawImage(video, 0, 0);
    try {
      return reader.decodeFromCanvas(canvas).getText();
    } catch {
      return null; // no code in this picture: the reader says so by throwing
    }
  };
}
