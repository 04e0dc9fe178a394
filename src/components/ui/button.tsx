import { useId, type ButtonHTMLAttributes, type ReactNode } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { classNames } from './class-names';

export type ButtonKind = 'primary' | 'secondary' | 'destructive' | 'plain';

interface Looks {
  kind?: ButtonKind;
  small?: boolean;
}

function looksOf({ kind = 'secondary', small }: Looks, extra?: string): string {
  return classNames('button', kind !== 'secondary' && `button-${kind}`, small && 'button-small', extra);
}

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement>, Looks {
  /** What opens the button, while it is closed: said beside it and to screen readers. */
  blockedBy?: string | null;
  /** While its work is under way: the button stays, cannot be pressed again and says so. */
  busy?: boolean;
}

/** A button. Closed ones are dashed and say beside them what opens them. */
export function Button({ kind, small, blockedBy, busy, className, ...rest }: ButtonProps) {
  const reasonId = useId();
  const closed = Boolean(blockedBy) || rest.disabled === true;
  const button = (
    <button
      type="button"
      {...rest}
      className={looksOf({ kind, small }, className)}
      disabled={closed}
      aria-disabled={busy || undefined}
      aria-busy={busy || undefined}
      aria-describedby={blockedBy ? reasonId : rest['aria-describedby']}
      onClick={busy ? (event) => event.preventDefault() : rest.onClick}
    />
  );
  if (!blockedBy) return button;
  return (
    <span className="blocked">
      {button}
      <span id={reasonId} className="blocked-reason">
        {blockedBy}
      </span>
    </span>
  );
}

interface ButtonLinkProps extends LinkProps, Looks {}

/** A place to go that weighs as much as a button. */
export function ButtonLink({ kind, small, className, ...rest }: ButtonLinkProps) {
  return <Link {...rest} className={looksOf({ kind, small }, className)} />;
}

interface IconButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  label: string;
  children: ReactNode;
}

/** A button that shows a sign only; its name is for screen readers and the tooltip. */
export function IconButton({ label, className, children, ...rest }: IconButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      className={classNames('icon-button', className)}
      aria-label={label}
      title={label}
    >
      {children}
    </button>
  );
}
