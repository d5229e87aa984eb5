import { useCallback, useEffect, useState } from 'react';

/** A guess for the width of one letter, as a share of the size of the type, where nothing can be measured. */
const LETTER_SHARE = 0.56;

/** Width of a text in the board's type, in pixels. Measures again when the type has arrived. */
export function useTextWidth(sizePx: number): (text: string) => number {
  const [measured, setMeasured] = useState<CanvasRenderingContext2D | null>(null);
  useEffect(() => {
    if (typeof CanvasRenderingContext2D === 'undefined') return undefined;
    let gone = false;
    const ready = () => {
      const context = document.createElement('canvas').getContext('2d');
      if (gone || context === null) return;
      context.font = `${String(sizePx)}px ${getComputedStyle(document.body).fontFamily}`;
      setMeasured(context);
    };
    void document.fonts.ready.then(ready);
    return () => {
      gone = true;
    };
  }, [sizePx]);
  return useCallback(
    (text: string) => measured?.measureText(text).width ?? text.length * sizePx * LETTER_SHARE,
    [sizePx, measured],
  );
}
