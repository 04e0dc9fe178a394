import { useState } from 'react';
import type { Band, BandDraft } from '#shared/contracts/api.generated';
import { THIN_SPACE } from '#shared/format/numbers';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { Sheet } from '../../../components/ui/sheet';
import { useDiscardBandDraft } from '../api/discard-band-draft';
import { usePublishBands } from '../api/publish-bands';
import type { DraftEdits } from '../hooks/use-draft-edits';
import { bandKey, bandWords, limitText } from '../model/band-form';

interface DraftSheetProps {
  draft: BandDraft;
  edits: DraftEdits;
  /** Bands that differ from those in force, with everything typed. */
  changed: readonly Band[];
  /** Other figures that differ, in words. */
  changedSettings: readonly { place: string; text: string }[];
}

/** What the draft changes, and the two steps: save it, publish it with a reason. */
export function DraftSheet({ draft, edits, changed, changedSettings }: DraftSheetProps) {
  const [publishing, setPublishing] = useState(false);
  const discard = useDiscardBandDraft();
  return (
    <Sheet
      title={`Draft of rules ${draft.ruleSetVersion}`}
      aside={edits.unsaved ? 'not saved' : draftState(draft)}
    >
      <div className="sheet-body grid gap-4">
        <WhatDiffers changed={changed} changedSettings={changedSettings} />
        <ProblemNotice error={edits.error ?? discard.error} />
        <div className="grid justify-items-start gap-3">
          <Button
            busy={edits.saving}
            blockedBy={edits.unsaved ? edits.fault : 'Saving opens once a figure is changed.'}
            onClick={edits.save}
          >
            Save the draft
          </Button>
          {edits.unsaved && <Button onClick={edits.forget}>Forget what is not saved</Button>}
          <Button kind="primary" blockedBy={publishBlock(draft, edits)} onClick={() => setPublishing(true)}>
            {`Publish rules ${draft.ruleSetVersion}`}
          </Button>
          {draft.version > 0 && (
            <Button
              busy={discard.isPending}
              onClick={() => discard.mutate(draft.version, { onSuccess: edits.forget })}
            >
              Discard the draft
            </Button>
          )}
        </div>
      </div>
      {publishing && <PublishDialog draft={draft} onClose={() => setPublishing(false)} />}
    </Sheet>
  );
}

function WhatDiffers({ changed, changedSettings }: Pick<DraftSheetProps, 'changed' | 'changedSettings'>) {
  if (changed.length + changedSettings.length === 0) {
    return <p className="text-control text-ink-soft">Nothing differs from the rules in force.</p>;
  }
  return (
    <ul aria-label="What differs from the rules in force" className="text-table">
      {changed.map((band) => (
        <ChangedBand key={bandKey(band)} band={band} />
      ))}
      {changedSettings.map(({ place, text }) => (
        <li key={place} className="border-t border-rule py-1.5">
          {text}
        </li>
      ))}
    </ul>
  );
}

const draftState = ({ version }: BandDraft) => (version > 0 ? 'saved' : 'not begun');

function publishBlock(draft: BandDraft, edits: DraftEdits): string | null {
  if (edits.unsaved) return 'Publishing opens once the draft is saved.';
  return draft.version > 0 ? null : 'Publishing opens once a draft is saved.';
}

function ChangedBand({ band }: { band: Band }) {
  const { name, unit } = bandWords(band.parameter);
  const text = (value: number) => limitText(value, band.parameter);
  return (
    <li className="border-t border-rule py-1.5">
      <b className="font-semibold">{name}</b>{' '}
      <span className="text-ink-soft">
        {`${band.classKv}${THIN_SPACE}kV, ${band.frequencyHz}${THIN_SPACE}Hz: `}
        {`${text(band.typical[0])} to ${text(band.typical[1])}, outer ${text(band.outer[0])} to ${text(band.outer[1])}${unit ? `${THIN_SPACE}${unit}` : ''}`}
      </span>
    </li>
  );
}

function PublishDialog({ draft, onClose }: { draft: BandDraft; onClose: () => void }) {
  const publish = usePublishBands();
  return (
    <WordsDialog
      title={`Publish rules ${draft.ruleSetVersion}`}
      description="They are in force at once, for every filing from now on. What was filed before keeps the rules that it was judged by until its reviewer checks it again."
      label="Reason, shown to applicants"
      confirm={`Publish rules ${draft.ruleSetVersion}`}
      busy={publish.isPending}
      error={publish.error}
      onConfirm={(reason) => publish.mutate({ version: draft.version, reason }, { onSuccess: onClose })}
      onClose={onClose}
    />
  );
}
