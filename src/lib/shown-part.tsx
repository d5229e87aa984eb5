import { useEffect, useState } from 'react';
import { flushSync } from 'react-dom';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';

/** So many entries are drawn at once: a calendar may hold hundreds, and a telephone draws a few dozen quickly. */
const PART = 40;

export interface ShownPart<T> {
  shown: readonly T[];
  /** How many are still to come, and the way to the next part of them. */
  left: number;
  more: () => void;
}

/** The first part of a long list; all of it on paper. */
export function useShownPart<T>(items: readonly T[]): ShownPart<T> {
  const [count, setCount] = useState(PART);
  useEffect(() => {
    const showAll = () => {
      flushSync(() => {
        setCount(Number.POSITIVE_INFINITY);
      });
    };
    window.addEventListener('beforeprint', showAll);
    return () => {
      window.removeEventListener('beforeprint', showAll);
    };
  }, []);
  const shown = items.slice(0, count);
  return {
    shown,
    left: items.length - shown.length,
    more: () => {
      setCount(count + PART);
    },
  };
}

/** Below a part of a list: how much of it is still to come. */
export function MoreOfThem({ left, more }: Pick<ShownPart<unknown>, 'left' | 'more'>) {
  const { t } = useTranslation('common');
  if (left === 0) return null;
  return (
    <p className="mt-3">
      <Button onClick={more}>{t('moreOfThem', { count: left })}</Button>
    </p>
  );
}
