import { Tabs as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { Link, type To } from 'react-router-dom';
import { classNames } from './class-names';

interface SegmentLink {
  key: string;
  label: ReactNode;
  to: To;
  current: boolean;
}

/** Views of one list as links, so that each has its own address. */
export function SegmentLinks({ label, items }: { label: string; items: readonly SegmentLink[] }) {
  return (
    <nav className="segment" aria-label={label}>
      {items.map((item) => (
        <Link key={item.key} to={item.to} aria-current={item.current ? 'true' : undefined}>
          {item.label}
        </Link>
      ))}
    </nav>
  );
}

interface SegmentChoiceProps<V extends string> {
  label: string;
  value: V;
  onChange: (value: V) => void;
  options: readonly { value: V; label: string }[];
}

/** One of a few, pressed in; for what changes the view at once. */
export function SegmentChoice<V extends string>({ label, value, onChange, options }: SegmentChoiceProps<V>) {
  return (
    <div className="segment" role="group" aria-label={label}>
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          aria-pressed={option.value === value}
          onClick={() => onChange(option.value)}
        >
          {option.label}
        </button>
      ))}
    </div>
  );
}

export interface Tab {
  value: string;
  label: ReactNode;
  content: ReactNode;
}

interface TabsProps {
  label: string;
  tabs: readonly Tab[];
  value?: string;
  onChange?: (value: string) => void;
  className?: string;
}

/** Panels of which one is shown; arrow keys move along the tabs. */
export function Tabs({ label, tabs, value, onChange, className }: TabsProps) {
  const state = value === undefined ? { defaultValue: tabs[0]?.value } : { value };
  return (
    <Radix.Root {...state} onValueChange={onChange} className={className}>
      <Radix.List className="segment" aria-label={label}>
        {tabs.map((tab) => (
          <Radix.Trigger key={tab.value} value={tab.value}>
            {tab.label}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {tabs.map((tab) => (
        <Radix.Content key={tab.value} value={tab.value} className={classNames('mt-4')}>
          {tab.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  );
}
