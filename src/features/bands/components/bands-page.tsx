import type { ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { Band, BandDraft, RuleSetSummary, Rules } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { THIN_SPACE } from '#shared/format/numbers';
import { EmptyState } from '../../../components/feedback/empty-state';
import { PageHead } from '../../../components/ui/page-head';
import { SegmentChoice } from '../../../components/ui/segment';
import { Sheet } from '../../../components/ui/sheet';
import { TitleBlock } from '../../../components/ui/title-block';
import { useRules } from '../../../lib/queries/get-rules';
import { toleranceRows, uncertaintyRows } from '../../../lib/rule-words';
import { useBandDraft } from '../api/get-band-draft';
import { useRuleSets } from '../api/list-rule-sets';
import { useDraftEdits } from '../hooks/use-draft-edits';
import { bandKey, bandsOf, changedBands, classesOf, editedBands } from '../model/band-form';
import { changedSettings, settingGroups } from '../model/settings-form';
import { BandTable } from './band-table';
import { CalendarSheet } from './calendar-sheet';
import { ClassChoice } from './class-choice';
import { DraftSheet } from './draft-sheet';
import { HistorySheet } from './history-sheet';
import { SettingsSheets } from './settings-sheet';

/** The rules as an administrator drafts and publishes them: bands of a class, or the figures beside them. */
export function BandsPage() {
  const draft = useBandDraft();
  const sets = useRuleSets();
  const rules = useRules();
  const edits = useDraftEdits(draft);
  const classes = classesOf(draft.bands);
  const [shown, setShown] = useShownClass(classes);
  const [part, setPart] = usePart();
  const inForce = new Map((rules.bands as Band[]).map((band) => [bandKey(band), band]));
  const changed = changedBands(editedBands(draft.bands, edits.bands) ?? draft.bands, [...inForce.values()]);
  const settingsNow = settingsInForce(rules);
  const otherChanges = changedSettings(settingGroups(draft), edits.settings, settingsNow);
  const bands = shown ? bandsOf(draft.bands, shown.classKv, shown.frequencyHz) : [];
  return (
    <>
      <PageHead
        title={part === 'bands' && shown ? `Typical bands, ${shown.classKv}${THIN_SPACE}kV` : TITLES[part]}
        lead={LEADS[part]}
        block={
          part === 'calendar' ? undefined : (
            <DraftBlock
              draft={draft}
              sets={sets}
              about={part === 'bands' && shown ? shown : null}
              changed={part === 'bands' ? changed.length : otherChanges.length}
            />
          )
        }
      />
      <div className="mb-4 flex flex-wrap items-end gap-4">
        <SegmentChoice
          label="Part of the rules"
          value={part}
          onChange={setPart}
          options={[
            { value: 'bands', label: 'Bands' },
            { value: 'settings', label: 'Tolerances, inputs, windows' },
            { value: 'calendar', label: 'Calendar' },
          ]}
        />
        {part === 'bands' && (
          <ClassChoice classes={classes} shown={shown} changed={changed} onChange={setShown} />
        )}
      </div>
      <div className="bands-columns">
        <div>
          {part === 'bands' && (
            <Sheet main title="Bounds" aside="Per kilometre, at rated frequency">
              {bands.length > 0 ? (
                <BandTable bands={bands} inForce={inForce} edits={edits.bands} onEdit={edits.editBand} />
              ) : (
                <EmptyState title="There are no bands for this class." />
              )}
            </Sheet>
          )}
          {part === 'settings' && <SettingsSheets draft={draft} edits={edits} inForce={settingsNow} />}
          {part === 'calendar' && <CalendarSheet />}
        </div>
        <div>
          {/* The calendar holds from the moment that it is saved: it is no part of the draft. */}
          {part !== 'calendar' && (
            <DraftSheet draft={draft} edits={edits} changed={changed} changedSettings={otherChanges} />
          )}
          <HistorySheet sets={sets} />
        </div>
      </div>
    </>
  );
}

const TITLES = {
  bands: 'Typical bands',
  settings: 'Tolerances, inputs and windows',
  calendar: 'Working days',
} as const;

type Part = keyof typeof TITLES;

const LEADS: Readonly<Record<Part, ReactNode>> = {
  bands: (
    <>
      Outside its typical band a value is graded <strong>Explain</strong>, outside the outer limits{' '}
      <strong>Must answer</strong>.
    </>
  ),
  settings: 'How far a declared value may lie from what the geometry gives, and how long each step may take.',
  calendar: 'The days on which windows run: the weekend and the holidays are left out.',
};

/** Which part of the rules is shown stands in the address too. */
function usePart(): [Part, (part: Part) => void] {
  const [params, setParams] = useSearchParams();
  const asked = params.get('part') ?? '';
  const part = Object.hasOwn(TITLES, asked) ? (asked as Part) : 'bands';
  const show = (next: Part) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (next === 'bands') after.delete('part');
        else after.set('part', next);
        return after;
      },
      { replace: true },
    );
  return [part, show];
}

interface ShownClass {
  classKv: number;
  frequencyHz: number;
}

const FIRST_SHOWN = { classKv: 230, frequencyHz: 60 };

/** Which class is shown stands in the address. */
function useShownClass(classes: readonly ShownClass[]): [ShownClass | null, (shown: ShownClass) => void] {
  const [params, setParams] = useSearchParams();
  const find = (kv: number, hz: number) => classes.find((c) => c.classKv === kv && c.frequencyHz === hz);
  const shown =
    find(Number(params.get('class')), Number(params.get('hz'))) ??
    find(FIRST_SHOWN.classKv, FIRST_SHOWN.frequencyHz) ??
    classes[0] ??
    null;
  const show = ({ classKv, frequencyHz }: ShownClass) =>
    setParams({ class: String(classKv), hz: String(frequencyHz) }, { replace: true });
  return [shown, show];
}

interface DraftBlockProps {
  draft: BandDraft;
  sets: readonly RuleSetSummary[];
  /** The class shown; without one the figures beside the bands. */
  about: ShownClass | null;
  changed: number;
}

function DraftBlock({ draft, sets, about, changed }: DraftBlockProps) {
  const inForce = sets.find((set) => set.inForce);
  const begun = draft.version > 0;
  return (
    <TitleBlock
      label="Title block of the rules"
      cells={[
        {
          label: about ? 'Voltage class' : 'Part of the rules',
          value: about ? `${about.classKv}${THIN_SPACE}kV` : TITLES.settings,
          aside: about ? `${about.frequencyHz}${THIN_SPACE}Hz, overhead` : undefined,
          span: 6,
          lead: true,
          fold: 'name',
        },
        {
          label: 'State',
          value: begun ? <span className="stamp stamp-draft">Draft</span> : 'as in force',
          span: 4,
          fold: 'state',
        },
        { label: 'Rules', value: draft.ruleSetVersion, span: 2, lead: true, fold: 'revision' },
        {
          label: 'In force',
          value: inForce ? `Rules ${inForce.version}` : 'none',
          aside: inForce?.effectiveFrom ? `since ${formatDate(inForce.effectiveFrom)}` : undefined,
          span: 6,
        },
        {
          label: about ? 'Bands changed' : 'Figures changed',
          value: changed === 0 ? 'none' : changed,
          span: 6,
          fold: 'due',
        },
      ]}
    />
  );
}

/** The settings in force by their place, so that a changed one shows what holds now. */
function settingsInForce(rules: Rules): ReadonlyMap<string, number> {
  return new Map([
    ...toleranceRows(rules.tolerances).flatMap(({ parameter, relative, cap }): [string, number][] => [
      [`tolerances/${parameter}/relative`, relative],
      [`tolerances/${parameter}/cap`, cap],
    ]),
    ...uncertaintyRows(rules.uncertainties).map(({ key, value }): [string, number] => [
      `uncertainties/${key}`,
      value,
    ]),
    ['owner/baseMva', rules.owner.baseMva],
    ['owner/earthResistivityOhmM', rules.owner.earthResistivityOhmM],
  ]);
}
