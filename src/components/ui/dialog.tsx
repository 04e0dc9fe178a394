import { Dialog as Radix } from 'radix-ui';
import { useRef, type ReactNode } from 'react';
import { IconButton } from './button';
import { classNames } from './class-names';

interface DialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  /** What the dialog is for, read out with its title. */
  description?: ReactNode;
  children: ReactNode;
  /** Buttons, in a row ruled off at the foot. */
  foot?: ReactNode;
  wide?: boolean;
  /** Cannot be put aside by Escape or a click beside it; it has no cross either. */
  insistent?: boolean;
}

/** A sheet above the page, which waits. The focus stays inside and goes back to where it came from. */
export function Dialog({
  open,
  onOpenChange,
  title,
  description,
  children,
  foot,
  wide,
  insistent,
}: DialogProps) {
  const opener = useRef<Element | null>(null);
  // Opened by state and not by a trigger of its own, the dialog itself has to know where the focus came from.
  const goBack = (event: Event) => {
    event.preventDefault();
    if (opener.current instanceof HTMLElement && opener.current.isConnected) opener.current.focus();
  };
  const hold = insistent ? (event: Event) => event.preventDefault() : undefined;
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="dialog-veil" />
        <Radix.Content
          className={classNames('dialog', wide && 'dialog-wide')}
          onOpenAutoFocus={() => {
            opener.current = document.activeElement;
          }}
          onCloseAutoFocus={goBack}
          onEscapeKeyDown={hold}
          onInteractOutside={hold}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <div className="dialog-head">
            <div>
              <Radix.Title asChild>
                <h2>{title}</h2>
              </Radix.Title>
              {description && (
                <Radix.Description className="mt-1 text-table text-ink-soft">{description}</Radix.Description>
              )}
            </div>
          </div>
          <div className="dialog-body">{children}</div>
          {foot && <div className="dialog-foot">{foot}</div>}
          {/* Last, so that the focus starts at what the dialog asks for. */}
          {!insistent && (
            <Radix.Close asChild>
              <IconButton label="Close" className="dialog-close">
                <svg width={12} height={12} viewBox="0 0 12 12" aria-hidden="true">
                  <path d="M1 1 11 11M11 1 1 11" stroke="currentColor" strokeWidth={1.5} />
                </svg>
              </IconButton>
            </Radix.Close>
          )}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
