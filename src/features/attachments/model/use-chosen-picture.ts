import { useCallback, useEffect, useRef, useState } from 'react';
import { PICTURE_MAX_BYTES } from '#shared/contracts/attachments.js';

const TYPES = new Set(['image/jpeg', 'image/png', 'image/webp']);

export interface ChosenPicture {
  picture: File | null;
  /** To look at before it is sent; null where there is nothing to see. */
  previewUrl: string | null;
  problem: 'tooLarge' | 'notAPicture' | null;
  choose: (file: File | null) => void;
}

/** The picture that a person chose on their device, looked at before anything of it is sent. */
export function useChosenPicture(): ChosenPicture {
  const [chosen, setChosen] = useState<{ picture: File; previewUrl: string } | null>(null);
  const open = useRef<string | null>(null);
  const close = useCallback(() => {
    if (open.current !== null) URL.revokeObjectURL(open.current);
    open.current = null;
  }, []);
  useEffect(() => close, [close]);
  const choose = useCallback(
    (file: File | null) => {
      close();
      if (file === null) {
        setChosen(null);
        return;
      }
      open.current = URL.createObjectURL(file);
      setChosen({ picture: file, previewUrl: open.current });
    },
    [close],
  );
  const picture = chosen?.picture ?? null;
  const problem =
    picture === null
      ? null
      : !TYPES.has(picture.type)
        ? 'notAPicture'
        : picture.size > PICTURE_MAX_BYTES
          ? 'tooLarge'
          : null;
  return { picture, problem, choose, previewUrl: problem === null ? (chosen?.previewUrl ?? null) : null };
}
