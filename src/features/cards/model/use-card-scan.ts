import { useEffect, useRef, useState, type RefObject } from 'react';
import { scannedCode } from './scanned-code.js';

/** What browsers that can read squares offer; not in TypeScript's library yet. */
interface Detector {
  detect: (source: HTMLVideoElement) => Promise<readonly { rawValue: string }[]>;
}
type DetectorClass = new (options: { formats: readonly string[] }) => Detector;

const LOOK_EVERY_MS = 300;

function detectorClass(): DetectorClass | null {
  return (globalThis as { BarcodeDetector?: DetectorClass }).BarcodeDetector ?? null;
}

/** Whether this browser can read a card with its camera. */
export function canScan(): boolean {
  const media = navigator.mediaDevices as MediaDevices | undefined;
  return detectorClass() !== null && media?.getUserMedia !== undefined;
}

/** Looks through the camera for a card while the component is on screen; the camera is let go with it. */
export function useCardScan(onFound: (code: string) => void): {
  video: RefObject<HTMLVideoElement | null>;
  isClosed: boolean;
} {
  const video = useRef<HTMLVideoElement>(null);
  const found = useRef(onFound);
  const [isClosed, setIsClosed] = useState(false);
  useEffect(() => {
    found.current = onFound;
  }, [onFound]);
  useEffect(() => {
    let stream: MediaStream | null = null;
    let timer: ReturnType<typeof setTimeout> | undefined;
    let isOver = false;
    const hasEnded = () => isOver;
    const look = async (detector: Detector) => {
      if (isOver || video.current === null) return;
      const seen = await detector.detect(video.current).catch(() => []);
      const code = seen.map(({ rawValue }) => scannedCode(rawValue)).find((each) => each !== null);
      if (hasEnded()) return;
      if (code !== undefined) found.current(code);
      else timer = setTimeout(() => void look(detector), LOOK_EVERY_MS);
    };
    const begin = async () => {
      const Detector = detectorClass();
      if (Detector === null) throw new Error('This browser reads no squares');
      stream = await navigator.mediaDevices.getUserMedia({ video: { facingMode: 'environment' } });
      if (hasEnded() || video.current === null) {
        stop();
        return;
      }
      video.current.srcObject = stream;
      await video.current.play();
      await look(new Detector({ formats: ['qr_code'] }));
    };
    const stop = () => {
      for (const track of stream?.getTracks() ?? []) track.stop();
    };
    begin().catch(() => {
      if (!isOver) setIsClosed(true);
    });
    return () => {
      isOver = true;
      clearTimeout(timer);
      stop();
    };
  }, []);
  return { video, isClosed };
}
