import { useCallback, useEffect, useRef, useState } from 'react';
import {
  COMPARED_YEARS_MAX,
  finderEndpoints,
  type ComparisonInput,
  type YearsAnswer,
} from '#shared/contracts/finder.js';
import { callApi } from '#src/lib/api-client.js';

type Markers = ComparisonInput['markers'];

export interface YearsWork {
  state: 'idle' | 'running' | 'stopped' | 'done' | 'failed';
  done: number;
  total: number;
  items: readonly YearDay[];
  problem: Error | null;
}
type YearDay = YearsAnswer['items'][number];

const IDLE: YearsWork = { state: 'idle', done: 0, total: 0, items: [], problem: null };
/** Few enough that the pegs fill while one looks on. */
const YEARS_AT_A_TIME = Math.min(5, COMPARED_YEARS_MAX);

/** Looks through many years a few at a time: shows how far it is, can be stopped, and keeps what it has. */
export function useYears(placeId: string): {
  work: YearsWork;
  start: (years: readonly number[], markers: Markers) => void;
  stop: () => void;
} {
  const [work, setWork] = useState(IDLE);
  const controller = useRef<AbortController | null>(null);
  useEffect(() => () => controller.current?.abort(), []);

  const start = useCallback(
    (years: readonly number[], markers: Markers) => {
      controller.current?.abort();
      const mine = new AbortController();
      controller.current = mine;
      setWork({ ...IDLE, state: 'running', total: years.length });
      void lookThrough(placeId, years, markers, mine.signal, setWork);
    },
    [placeId],
  );
  const stop = useCallback(() => {
    controller.current?.abort();
    setWork((now) => (now.state === 'running' ? { ...now, state: 'stopped' } : now));
  }, []);
  return { work, start, stop };
}

async function lookThrough(
  placeId: string,
  years: readonly number[],
  markers: Markers,
  signal: AbortSignal,
  report: (change: (now: YearsWork) => YearsWork) => void,
): Promise<void> {
  try {
    for (let first = 0; first < years.length; first += YEARS_AT_A_TIME) {
      const some = years.slice(first, first + YEARS_AT_A_TIME);
      const { items } = await callApi(finderEndpoints.compareYears, {
        params: { placeId },
        body: { years: some, markers },
        signal,
      });
      if (signal.aborted) return;
      report((now) => ({ ...now, done: now.done + some.length, items: [...now.items, ...items] }));
    }
    report((now) => ({ ...now, state: 'done' }));
  } catch (problem) {
    if (signal.aborted) return;
    const failure = problem instanceof Error ? problem : new Error(String(problem));
    report((now) => ({ ...now, state: 'failed', problem: failure }));
  }
}
