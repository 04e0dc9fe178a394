import { DropdownMenu as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

interface MenuProps {
  /** The button that opens the menu; it takes a ref and button props. */
  trigger: ReactNode;
  children: ReactNode;
  align?: 'start' | 'end';
}

/** A list of things to do or places to go, opened by a button; arrow keys, Home, End, letters, Escape. */
export function Menu({ trigger, children, align = 'end' }: MenuProps) {
  return (
    <Radix.Root modal={false}>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content className="menu-panel" align={align} sideOffset={6} collisionPadding={8}>
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

interface MenuItemProps {
  onSelect?: () => void;
  disabled?: boolean;
  /** The child is a link and becomes the item. */
  asLink?: boolean;
  children: ReactNode;
}

export function MenuItem({ onSelect, disabled, asLink, children }: MenuItemProps) {
  return (
    <Radix.Item className="menu-item" onSelect={onSelect} disabled={disabled} asChild={asLink}>
      {children}
    </Radix.Item>
  );
}

interface MenuChoiceProps {
  label: string;
  value: string;
  onChange: (value: string) => void;
  options: readonly { value: string; label: string; detail?: string }[];
}

/** One of several within a menu, such as the organisation one works for. */
export function MenuChoice({ label, value, onChange, options }: MenuChoiceProps) {
  return (
    <Radix.RadioGroup value={value} onValueChange={onChange}>
      <Radix.Label className="menu-label">{label}</Radix.Label>
      {options.map((option) => (
        <Radix.RadioItem key={option.value} value={option.value} className="menu-item">
          <span>
            {option.label}
            {option.detail && <span className="text-label text-ink-soft"> {option.detail}</span>}
          </span>
          <Radix.ItemIndicator>
            <svg width={12} height={10} viewBox="0 0 12 10" aria-label="chosen" role="img">
              <path d="M1 5 4.5 8.5 11 1" fill="none" stroke="currentColor" strokeWidth={1.75} />
            </svg>
          </Radix.ItemIndicator>
        </Radix.RadioItem>
      ))}
    </Radix.RadioGroup>
  );
}

export function MenuLabel({ children }: { children: ReactNode }) {
  return <Radix.Label className="menu-label">{children}</Radix.Label>;
}
