import { useId, type ComponentProps, type MouseEvent, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, type LinkProps } from 'react-router-dom';
import { classNames } from './class-names.js';

/** `main` is the one madder action of a screen; `quiet` is underlined words. */
export type ButtonLook = 'main' | 'plain' | 'quiet';

interface Looks {
  look?: ButtonLook | undefined;
  icon?: ReactNode;
  full?: boolean | undefined;
}

export interface ButtonProps extends Omit<ComponentProps<'button'>, 'disabled'>, Looks {
  /** While work is under way: the button stays where it is, but a second press does nothing. */
  busy?: boolean | undefined;
  /** Why the button is closed. It stays reachable, is drawn dashed, and the reason is read with it. */
  closedBecause?: string | undefined;
}

export function Button({ look = 'plain', icon, full, busy, closedBecause, ...rest }: ButtonProps) {
  const { t } = useTranslation('common');
  const reasonId = useId();
  const { children, className, onClick, type = 'button', ...button } = rest;
  const closed = closedBecause !== undefined;
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (closed || busy === true) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <>
      <button
        {...button}
        type={type}
        className={lookClass(look, full, className)}
        onClick={press}
        aria-disabled={closed || undefined}
        aria-busy={busy === true || undefined}
        aria-describedby={closed ? reasonId : button['aria-describedby']}
      >
        {icon}
        {busy === true ? t('loading') : children}
      </button>
      {closed && (
        <span id={reasonId} className="for-ears">
          {t('closedButton', { reason: closedBecause })}
        </span>
      )}
    </>
  );
}

export interface ButtonLinkProps extends LinkProps, Looks {}

export function ButtonLink({ look = 'plain', icon, full, className, children, ...link }: ButtonLinkProps) {
  return (
    <Link {...link} className={lookClass(look, full, className)}>
      {icon}
      {children}
    </Link>
  );
}

/** A link to a file or another site, drawn as a button. */
export function ButtonAnchor({
  look = 'plain',
  icon,
  full,
  className,
  children,
  ...anchor
}: ComponentProps<'a'> & Looks) {
  return (
    <a {...anchor} className={lookClass(look, full, className)}>
      {icon}
      {children}
    </a>
  );
}

export interface IconButtonProps extends Omit<ComponentProps<'button'>, 'children' | 'disabled'> {
  /** Read aloud and shown as a tip: an icon never stands alone. */
  label: string;
  icon: ReactNode;
  closed?: boolean | undefined;
}

export function IconButton({ label, icon, closed, className, onClick, ...button }: IconButtonProps) {
  return (
    <button
      {...button}
      type="button"
      className={classNames('sq', className)}
      aria-label={label}
      title={label}
      aria-disabled={closed === true || undefined}
      onClick={closed === true ? undefined : onClick}
    >
      {icon}
    </button>
  );
}

export function IconLink({
  label,
  icon,
  className,
  ...link
}: Omit<LinkProps, 'children'> & { label: string; icon: ReactNode }) {
  return (
    <Link {...link} className={classNames('sq', className)} aria-label={label} title={label}>
      {icon}
    </Link>
  );
}

function lookClass(look: ButtonLook, full: boolean | undefined, className: string | undefined): string {
  return classNames('btn', look !== 'plain' && look, full === true && 'full', className);
}
