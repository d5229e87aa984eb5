import { useEffect, useRef, useState } from 'react';

const LONGEST_MS = 60_000;

export interface Clip {
  isOn: boolean;
  /** The microphone is not there, or may not be used. */
  isClosed: boolean;
  content: Blob | null;
  start: () => Promise<void>;
  stop: () => void;
  forget: () => void;
}

/** A few spoken words, kept in memory until they are sent or thrown away. Leaving the screen throws them away. */
export function useClip(): Clip {
  const recorder = useRef<MediaRecorder | null>(null);
  const [isOn, setIsOn] = useState(false);
  const [isClosed, setIsClosed] = useState(false);
  const [content, setContent] = useState<Blob | null>(null);
  const stop = () => {
    if (recorder.current?.state === 'recording') recorder.current.stop();
  };
  useEffect(() => stop, []);
  const start = async () => {
    setContent(null);
    try {
      const stream = await navigator.mediaDevices.getUserMedia({ audio: true });
      const next = new MediaRecorder(stream);
      const parts: Blob[] = [];
      next.addEventListener('dataavailable', ({ data }) => {
        parts.push(data);
      });
      next.addEventListener('stop', () => {
        for (const track of stream.getTracks()) track.stop();
        setIsOn(false);
        setContent(new Blob(parts, { type: next.mimeType }));
      });
      recorder.current = next;
      next.start();
      setIsOn(true);
      setIsClosed(false);
      setTimeout(() => {
        if (next.state === 'recording') next.stop();
      }, LONGEST_MS);
    } catch {
      setIsClosed(true);
    }
  };
  const forget = () => {
    setContent(null);
  };
  return { isOn, isClosed, content, start, stop, forget };
}
