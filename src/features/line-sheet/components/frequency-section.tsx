import { useState } from 'react';
import type { RevisionLine } from '#shared/contracts/api.generated';
import type { OverheadSection, SweepTable } from '#shared/engine/index';
import { figure } from '#shared/format/numbers';
import { FrequencyPlot } from '../../../components/charts/frequency-plot';
import { Notice } from '../../../components/feedback/notice';
import { SkeletonLines } from '../../../components/feedback/skeleton';
import { SegmentChoice } from '../../../components/ui/segment';
import { SheetSection } from '../../../components/ui/sheet';
import { useSweep } from '../api/sweep-section';
import {
  inductanceMilliHenryPerKm,
  sweepAssumptions,
  sweepPoints,
  type Quantity,
} from '../model/sweep-points';

interface FrequencySectionProps {
  line: RevisionLine;
  circuit: number;
  /** The first overhead section and its place; null where no geometry was filed. */
  section: OverheadSection | null;
  index: number;
}

/** How the line behaves over frequency, computed in the browser from the filed geometry. */
export function FrequencySection({ line, circuit, section, index }: FrequencySectionProps) {
  const [sequence, setSequence] = useState<'1' | '0'>('1');
  const { data, error } = useSweep(line.lineHash, index, section);
  if (section === null) return null;
  const where = line.sectionCount > 1 ? `Section ${index + 1}; both` : 'Both';
  return (
    <SheetSection id="frequency" title="Over frequency" aside={`${where} axes logarithmic`}>
      <div className="sheet-body">
        <div className="mb-4">
          <SegmentChoice
            label="Sequence"
            value={sequence}
            onChange={setSequence}
            options={[
              { value: '1', label: 'Positive sequence' },
              { value: '0', label: 'Zero sequence' },
            ]}
          />
        </div>
        {error && <Notice grade="must-answer">The plot could not be computed: {error.message}</Notice>}
        {!data && !error && <SkeletonLines lines={6} label="Computing the plot" />}
        {data && !data.ok && <Notice grade="must-answer">{data.detail}</Notice>}
        {data?.ok && (
          <>
            <Plots line={line} circuit={circuit} table={data.table} sequence={sequence} />
            <p className="assumptions">{sweepAssumptions(data.table, section.earthResistivityOhmM)}</p>
          </>
        )}
      </div>
    </SheetSection>
  );
}

interface PlotsProps {
  line: RevisionLine;
  circuit: number;
  table: SweepTable;
  sequence: '1' | '0';
}

function Plots({ line, circuit, table, sequence }: PlotsProps) {
  const { frequencyHz: ratedHz } = line;
  const value = (parameter: string) =>
    line.values.find((v) => v.circuit === circuit && v.parameter === parameter);
  const [resistance, reactance] = [value(`r${sequence}`), value(`x${sequence}`)];
  const toL = (x: number) => inductanceMilliHenryPerKm(x, ratedHz);
  return (
    <div className="plots">
      <FrequencyPlot
        title={`R${sequence}`}
        unit="Ω/km"
        ratedHz={ratedHz}
        points={sweepPoints(table, circuit, `r${sequence}` as Quantity)}
        declared={mark('declared', resistance?.declared, (v) => v)}
        recomputed={mark('recomputed', resistance?.recomputed, (v) => v)}
        label={`R${sequence} of ${line.name} from 1 Hz to 1 MHz, in ohms per kilometre`}
      />
      <FrequencyPlot
        title={`L${sequence}`}
        unit="mH/km"
        ratedHz={ratedHz}
        points={sweepPoints(table, circuit, `l${sequence}` as Quantity)}
        declared={mark('declared', reactance?.declared, toL, ` (X${sequence} ÷ ω)`)}
        recomputed={mark('recomputed', reactance?.recomputed, toL)}
        label={`L${sequence} of ${line.name} from 1 Hz to 1 MHz, in millihenries per kilometre`}
      />
    </div>
  );
}

/** A value to be marked at the rated frequency; one that is not above zero has no place on the axis. */
function mark(word: string, raw: number | null | undefined, convert: (v: number) => number, after = '') {
  if (raw === null || raw === undefined || raw <= 0) return null;
  const value = convert(raw);
  return { value, text: `${word} ${figure(value)}${after}` };
}
