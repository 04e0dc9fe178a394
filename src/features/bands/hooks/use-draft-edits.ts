import { useState } from 'react';
import type { BandDraft, SaveBandDraftRequest } from '#shared/contracts/api.generated';
import { useLeaveGuard } from '../../../hooks/use-leave-guard';
import { useSaveBandDraft } from '../api/save-band-draft';
import { editedBands, type BandEdit, type BandEdits } from '../model/band-form';
import { settingFaults, settingGroups, settingParts, type SettingEdits } from '../model/settings-form';

export interface DraftEdits {
  bands: BandEdits;
  settings: SettingEdits;
  editBand: (key: string, edit: BandEdit) => void;
  editSetting: (place: string, text: string) => void;
  /** Something has been typed that the server does not have yet. */
  unsaved: boolean;
  /** Why it cannot be saved; null when it can. */
  fault: string | null;
  save: () => void;
  forget: () => void;
  saving: boolean;
  error: Error | null;
}

/** What has been typed over a draft, kept until the server has it: a refusal loses nothing. */
export function useDraftEdits(draft: BandDraft): DraftEdits {
  const [bands, setBands] = useState<BandEdits>({});
  const [settings, setSettings] = useState<SettingEdits>({});
  const write = useSaveBandDraft();
  const unsaved = Object.keys(bands).length + Object.keys(settings).length > 0;
  useLeaveGuard(unsaved);
  const edited = editedBands(draft.bands, bands);
  const settingsFaulty = Object.keys(settingFaults(settingGroups(draft), settings)).length > 0;
  const forget = () => {
    setBands({});
    setSettings({});
  };
  const request = (): SaveBandDraftRequest => ({
    version: draft.version,
    ...(Object.keys(bands).length > 0 && edited ? { bands: edited } : {}),
    ...settingParts(draft, settings),
  });
  return {
    bands,
    settings,
    editBand: (key, edit) => setBands((before) => ({ ...before, [key]: edit })),
    editSetting: (place, text) => setSettings((before) => ({ ...before, [place]: text })),
    unsaved,
    fault: edited === null || settingsFaulty ? 'Saving opens once the figures marked are mended.' : null,
    save: () => write.mutate(request(), { onSuccess: forget }),
    forget,
    saving: write.isPending,
    error: write.error,
  };
}
