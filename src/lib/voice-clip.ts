import { useCallback, useEffect, useRef, useState } from 'react';

/** In the order in which they are asked for: what every browser that can record offers one of. */
const TYPES = ['audio/webm;codecs=opus', 'audio/webm', 'audio/mp4', 'audio/ogg;codecs=opus'] as const;
/** Enough for a voice: about a quarter of a megabyte a minute. */
const BITS_PER_SECOND = 32_000;

export interface VoiceClip {
  /** False in a browser that cannot record. */
  canRecord: boolean;
  isOn: boolean;
  /** What was recorded, to be heard and sent; null before the first time. */
  clip: Blob | null;
  /** The microphone was refused, or is not there. */
  isRefused: boolean;
  start: () => Promise<void>;
  stop: () => void;
  drop: () => void;
}

/** One short sound that goes with a form. It is in this page alone until it is sent. */
export function useVoiceClip(): VoiceClip {
  const type = supportedType();
  const recorder = useRef<MediaRecorder | null>(null);
  const [isOn, setIsOn] = useState(false);
  const [clip, setClip] = useState<Blob | null>(null);
  const [isRefused, setIsRefused] = useState(false);

  const stop = useCallback(() => {
    if (recorder.current?.state === 'recording') recorder.current.stop();
  }, []);
  useEffect(() => stop, [stop]);

  const start = async () => {
    if (type === null || isOn) return;
    setIsRefused(false);
    try {
      const stream = await navigator.mediaDevices.getUserMedia({ audio: true });
      const parts: Blob[] = [];
      const own = new MediaRecorder(stream, { mimeType: type, audioBitsPerSecond: BITS_PER_SECOND });
      own.addEventListener('dataavailable', ({ data }) => parts.push(data));
      own.addEventListener('stop', () => {
        for (const track of stream.getTracks()) track.stop();
        setClip(new Blob(parts, { type }));
        setIsOn(false);
      });
      recorder.current = own;
      own.start();
      setIsOn(true);
    } catch {
      setIsRefused(true);
    }
  };
  return {
    canRecord: type !== null,
    isOn,
    clip,
    isRefused,
    start,
    stop,
    drop: () => {
      setClip(null);
    },
  };
}

function supportedType(): string | null {
  if (typeof MediaRecorder === 'undefined') return null;
  return TYPES.find((type) => MediaRecorder.isTypeSupported(type)) ?? null;
}
