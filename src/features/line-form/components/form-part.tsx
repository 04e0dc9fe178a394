import type { ReactNode } from 'react';

interface FormPartProps {
  title: string;
  note?: ReactNode;
  children: ReactNode;
}

/** A ruled-off part of the form: its name, a word on how to fill it, its fields. */
export function FormPart({ title, note, children }: FormPartProps) {
  return (
    <fieldset className="min-w-0 border-t border-rule px-4 pt-4 pb-6 first:border-t-0 field:px-6">
      <legend className="float-left w-full text-h3 font-strong">{title}</legend>
      <div className="clear-both">
        {note && <p className="mb-3 text-table text-ink-soft">{note}</p>}
        {children}
      </div>
    </fieldset>
  );
}

/** Fields in pairs; one beneath the other on a phone. */
export function FieldGrid({ children }: { children: ReactNode }) {
  return <div className="grid gap-x-6 gap-y-4 field:grid-cols-2">{children}</div>;
}
