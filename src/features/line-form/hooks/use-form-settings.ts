import { useCallback, useMemo } from 'react';
import { dimensionsAt } from '#shared/checks/rules/drawing/voltage-table';
import type { Band } from '#shared/checks/rule-set';
import { useRules } from '../../../lib/queries/get-rules';
import { useConductors } from '../../../lib/queries/list-conductors';
import type { LineForm } from '../model/form-types';
import { siHint, typicalHint } from '../model/hints';
import { readNumber } from '../model/number-text';

const DECLARED = /^\/declared\/\d+\/([rxb][01])$/;

/** What rules and library add to the form: hints under its fields, choices, assumptions. */
export function useFormSettings(form: LineForm) {
  const rules = useRules();
  const { items: conductors } = useConductors();
  const { bands, owner } = rules;
  const hintAt = useCallback(
    (pointer: string) => {
      const key = DECLARED.exec(pointer)?.[1];
      const typical = key ? typicalHint(form, key, bands as readonly Band[]) : undefined;
      const si = siHint(form, pointer, owner.baseMva);
      return [si, typical].filter(Boolean).join('; ') || undefined;
    },
    [form, bands, owner],
  );
  const classesKv = useMemo(() => {
    const own = bands.filter((b) => b.frequencyHz === Number(form.frequencyHz)).map((b) => b.classKv);
    return [...new Set(own)].sort((a, b) => a - b);
  }, [bands, form.frequencyHz]);
  const view = useMemo(
    () => ({
      hintAt,
      conductors,
      ownersResistivityOhmM: owner.earthResistivityOhmM,
      ownersBaseMva: owner.baseMva,
      classesKv,
    }),
    [hintAt, conductors, owner, classesKv],
  );
  const voltage = readNumber(form.nominalVoltageKv.text);
  const clearanceM = voltage.kind === 'number' ? (dimensionsAt(voltage.value)?.leastHeightM ?? null) : null;
  return { view, clearanceM };
}
