import { ArrowLeft } from 'lucide-react';
import { createContext, useContext, useEffect, useRef, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { IconLink } from './button.js';
import { classNames } from './class-names.js';

/** The one scrolling column of a screen. */
export function Page({ className, children }: { className?: string | undefined; children: ReactNode }) {
  return (
    <main id="content" tabIndex={-1} className={classNames('page', className)}>
      {children}
    </main>
  );
}

export interface MastProps {
  title: ReactNode;
  /** Second line: where, which year, a state chip. */
  under?: ReactNode;
  /** Address of the screen one level up; drawn as a back arrow. */
  backTo?: string | undefined;
  /** Square buttons at the end of the line, or the main action on a wide screen (inside <ThumbBar>). */
  children?: ReactNode;
}

/** What the shell puts at the end of every top screen's mast on a phone: the way to the account. */
export const MastEnd = createContext<ReactNode>(null);

/** The first screen after loading is read from its start anyway; only a change of screen moves the focus. */
let firstHeading: HTMLHeadingElement | null = null;

/** Head of a screen. Its heading takes the focus when the screen opens, so that it is read first. */
export function Mast({ title, under, backTo, children }: MastProps) {
  const { t } = useTranslation('common');
  const heading = useRef<HTMLHeadingElement>(null);
  const mastEnd = useContext(MastEnd);
  useEffect(() => {
    firstHeading ??= heading.current;
    const isFirst = heading.current === firstHeading;
    // Never pull a person out of a field of the new screen.
    const holdsFocus = document.activeElement?.closest('main') instanceof HTMLElement;
    if (!isFirst && !holdsFocus) heading.current?.focus({ preventScroll: true });
  }, []);
  return (
    <div className="mast">
      {backTo !== undefined && (
        <IconLink
          to={backTo}
          label={t('back')}
          icon={<ArrowLeft aria-hidden className="turns" size={22} />}
        />
      )}
      <div className="mast-words">
        <h1 ref={heading} tabIndex={-1}>
          {title}
        </h1>
        {under !== undefined && <div className="mast-under">{under}</div>}
      </div>
      {children}
      {backTo === undefined && mastEnd}
    </div>
  );
}

/**
 * Holds the one main action: above the rail on a phone, in its place on a wide screen. Put it into the mast
 * (`<Mast …><ThumbBar>…</ThumbBar></Mast>`) or at the end of a form.
 */
export function ThumbBar({ note, children }: { note?: ReactNode; children: ReactNode }) {
  return (
    <div className="thumb">
      {children}
      {note !== undefined && <p className="thumb-note">{note}</p>}
    </div>
  );
}

/** One column on a phone, two from 1024 px. */
export function Columns({
  wider,
  className,
  children,
}: {
  wider?: 'first' | undefined;
  className?: string | undefined;
  children: ReactNode;
}) {
  return (
    <div className={classNames('columns', wider === 'first' && 'seven-five', className)}>{children}</div>
  );
}
