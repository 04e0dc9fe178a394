import type { ReactNode } from 'react';
import { Brand } from '../../../components/ui/brand';
import { TitleBlock } from '../../../components/ui/title-block';
import { useDocumentTitle } from '../../../hooks/use-document-title';
import { BalancedMark } from './balanced-mark';

interface FrontDoorProps {
  title: string;
  lead: ReactNode;
  /** The grid owner's name, once it is set up. */
  owner: string | null;
  children: ReactNode;
  /** At the foot of the door. */
  foot?: ReactNode;
}

/** The frame of every page before the sign-in: the mark as a drawing, the door beside it. */
export function FrontDoor({ title, lead, owner, children, foot }: FrontDoorProps) {
  useDocumentTitle(title);
  return (
    <div className="grid min-h-dvh grid-rows-[1fr_auto]">
      <main className="m-auto grid w-full max-w-[1180px] p-4 field:p-8 table:grid-cols-[minmax(0,1fr)_404px]">
        <section
          className="sheet order-2 !mt-0 flex flex-col table:order-none table:min-h-[560px]"
          aria-label="About"
        >
          <div className="grid flex-1 place-items-center px-4 pt-6 field:px-10 field:pt-9">
            <BalancedMark />
          </div>
          <div className="[&_.title-block]:w-auto [&_.title-block]:border-x-0 [&_.title-block]:border-b-0">
            <TitleBlock
              label="Title block"
              cells={[
                { label: 'Drawn for', value: owner ?? 'a grid owner', span: 6, lead: true, fold: 'name' },
                { label: 'Subject', value: 'Line data of connection applications', span: 6, fold: 'state' },
                { label: 'Weighs', value: 'declared, recomputed, typical', span: 12, fold: 'due' },
              ]}
            />
          </div>
        </section>
        <section
          className="sheet !mt-0 flex flex-col border-b-[1.5px] border-b-ink px-6 pt-8 pb-6 field:px-10 field:pt-10 table:border-b table:border-l-[1.5px] table:border-b-rule-strong table:border-l-ink"
          aria-labelledby="door-title"
        >
          <div className="mb-7">
            <Brand large />
          </div>
          <h1 id="door-title">{title}</h1>
          <p className="mt-1 mb-5 text-ink-soft">{lead}</p>
          {children}
          {foot && <div className="mt-auto pt-8 text-table text-ink-soft">{foot}</div>}
        </section>
      </main>
      <footer className="px-4 pb-6 text-center text-label text-ink-soft">
        The check does not replace an engineering study by licensed engineers. Local codes govern.
      </footer>
    </div>
  );
}
