import { useCallback, useEffect, useRef, useState } from 'react';

export interface Sending<T> {
  /** From 0 to 1; null while nothing is on its way. */
  share: number | null;
  /** What stood in the way of the last try; null where nothing did. */
  trouble: unknown;
  /** True after the person stopped it. */
  wasStopped: boolean;
  send: () => Promise<T | null>;
  stop: () => void;
}

type Work<T> = (watch: {
  onProgress: (sentBytes: number, ofBytes: number) => void;
  signal: AbortSignal;
}) => Promise<T>;

/** One sending at a time, with how far it is and a way to stop it. Leaving the screen stops it. */
export function useSending<T>(work: Work<T>): Sending<T> {
  const [share, setShare] = useState<number | null>(null);
  const [trouble, setTrouble] = useState<unknown>(null);
  const [wasStopped, setWasStopped] = useState(false);
  const running = useRef<AbortController | null>(null);
  useEffect(
    () => () => {
      running.current?.abort();
    },
    [],
  );
  const stop = useCallback(() => {
    running.current?.abort();
  }, []);
  const send = async () => {
    if (running.current !== null) return null;
    const controller = new AbortController();
    running.current = controller;
    setShare(0);
    setTrouble(null);
    setWasStopped(false);
    try {
      return await work({
        signal: controller.signal,
        onProgress: (sent, of) => {
          setShare(of === 0 ? 0 : Math.min(1, sent / of));
        },
      });
    } catch (cause) {
      if (controller.signal.aborted) setWasStopped(true);
      else setTrouble(cause);
      return null;
    } finally {
      running.current = null;
      setShare(null);
    }
  };
  return { share, trouble, wasStopped, send, stop };
}
