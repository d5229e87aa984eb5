import { Undo2, X } from 'lucide-react';
import { createContext, useCallback, useContext, useEffect, useRef, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';

export interface ToastOptions {
  /** Takes back what happened. The toast then stays longer. */
  onUndo?: (() => void) | undefined;
}

interface ToastItem extends ToastOptions {
  id: number;
  text: string;
}

type Say = (text: string, options?: ToastOptions) => void;

const SayContext = createContext<Say | null>(null);

const PLAIN_MS = 6_000;
const UNDO_MS = 20_000;
const AGAIN_MS = 1_500;
const AT_ONCE_MAX = 3;

/** Says what happened, at the foot of the screen. It waits while the pointer or the focus is on it. */
export function ToastProvider({ children }: { children: ReactNode }) {
  const [items, setItems] = useState<readonly ToastItem[]>([]);
  const nextId = useRef(1);
  const say = useCallback<Say>((text, options = {}) => {
    const item = { ...options, text, id: nextId.current++ };
    setItems((before) => [...before.slice(1 - AT_ONCE_MAX), item]);
  }, []);
  const drop = useCallback((id: number) => {
    setItems((before) => before.filter((item) => item.id !== id));
  }, []);
  return (
    <SayContext value={say}>
      {children}
      <div className="toasts" role="status" aria-live="polite" aria-relevant="additions">
        {items.map((item) => (
          <Toast key={item.id} item={item} onGone={drop} />
        ))}
      </div>
    </SayContext>
  );
}

/** `const say = useToast(); say('Bird-scaring is taken out.', { onUndo })` */
export function useToast(): Say {
  const say = useContext(SayContext);
  if (say === null) throw new Error('useToast needs a ToastProvider above it');
  return say;
}

function Toast({ item, onGone }: { item: ToastItem; onGone: (id: number) => void }) {
  const { t } = useTranslation('common');
  const box = useRef<HTMLDivElement>(null);
  const { id, onUndo } = item;
  useEffect(() => {
    const look = () => {
      // Somebody is reading it or about to press: ask again a little later.
      const isHeld =
        box.current?.matches(':hover') === true || box.current?.contains(document.activeElement) === true;
      if (isHeld) timer = setTimeout(look, AGAIN_MS);
      else onGone(id);
    };
    let timer = setTimeout(look, onUndo ? UNDO_MS : PLAIN_MS);
    return () => {
      clearTimeout(timer);
    };
  }, [id, onUndo, onGone]);
  return (
    <div className="toast" ref={box}>
      <span>{item.text}</span>
      <span className="flex flex-none">
        {onUndo && (
          <button
            type="button"
            onClick={() => {
              onGone(id);
              onUndo();
            }}
          >
            <Undo2 aria-hidden size={20} />
            {t('undo')}
          </button>
        )}
        <button
          type="button"
          aria-label={t('close')}
          onClick={() => {
            onGone(id);
          }}
        >
          <X aria-hidden size={20} />
        </button>
      </span>
    </div>
  );
}
