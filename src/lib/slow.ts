import { useEffect, useState } from 'react';

/** True once something has gone on for a while: what is over at once needs no word about it. */
export function useSlow(isGoingOn: boolean, afterMs = 400): boolean {
  const [isSlow, setSlow] = useState(false);
  useEffect(() => {
    if (!isGoingOn) return undefined;
    const timer = setTimeout(() => {
      setSlow(true);
    }, afterMs);
    return () => {
      clearTimeout(timer);
      setSlow(false);
    };
  }, [isGoingOn, afterMs]);
  return isSlow;
}
