import { useEffect, useRef, useState } from 'react';

/** One piece of long work at a time that a person can stop. */
export interface Stoppable {
  isStopped: boolean;
  /** Begins, and hands out what stops it. */
  begin: () => AbortSignal;
  stop: () => void;
}

export function useStoppable(): Stoppable {
  const running = useRef<AbortController | null>(null);
  const [isStopped, setIsStopped] = useState(false);
  useEffect(() => () => running.current?.abort(), []);
  return {
    isStopped,
    begin: () => {
      running.current?.abort();
      const next = new AbortController();
      running.current = next;
      setIsStopped(false);
      return next.signal;
    },
    stop: () => {
      running.current?.abort();
      setIsStopped(true);
    },
  };
}
