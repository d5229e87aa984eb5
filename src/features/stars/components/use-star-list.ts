import { useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { readListQuery, writeListQuery, type StarListQuery } from '../model/star-list-query.js';

const PAUSE_MS = 250;

export interface StarList {
  query: StarListQuery;
  /** The year once stepping has come to rest: the one to ask the server for. */
  settledYear: number;
  set: (patch: Partial<StarListQuery>) => void;
}

/**
 * What the list shows. It changes on screen at once and stands in the address a moment later, so that stepping
 * through years or typing a name neither asks the server nor writes an address for every step.
 */
export function useStarList(thisYear: number): StarList {
  const [search, setSearch] = useSearchParams();
  const address = search.toString();
  const [query, setQuery] = useState(() => readListQuery(search, thisYear));
  const [settledYear, setSettledYear] = useState(query.year);
  const [seen, setSeen] = useState(address);
  const [written, setWritten] = useState(address);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);

  useEffect(
    () => () => {
      clearTimeout(timer.current);
    },
    [],
  );
  if (address !== seen) {
    setSeen(address);
    // Not our own writing: somebody went back, or followed a link to another list.
    if (address !== written) {
      const read = readListQuery(search, thisYear);
      setWritten(address);
      setQuery(read);
      setSettledYear(read.year);
    }
  }

  const set = (patch: Partial<StarListQuery>) => {
    const next = { ...query, ...patch };
    setQuery(next);
    clearTimeout(timer.current);
    timer.current = setTimeout(() => {
      const after = writeListQuery(search, next, thisYear);
      setSettledYear(next.year);
      setWritten(after.toString());
      setSearch(after, { replace: true, preventScrollReset: true });
    }, PAUSE_MS);
  };
  return { query, settledYear, set };
}
