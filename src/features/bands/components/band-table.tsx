import type { Band } from '#shared/contracts/api.generated';
import { BandStrip } from '../../../components/charts/band-strip';
import { Disclosure } from '../../../components/ui/disclosure';
import { Field } from '../../../components/ui/field';
import { FigureInput, TextInput } from '../../../components/ui/inputs';
import {
  applyEdit,
  bandKey,
  bandWords,
  LIMIT_WORDS,
  limitOf,
  limitText,
  sameLimits,
  type BandEdit,
  type BandEdits,
  type Limit,
  type ReadBand,
} from '../model/band-form';

interface BandTableProps {
  /** Bands of the draft, of one class and frequency. */
  bands: readonly Band[];
  inForce: ReadonlyMap<string, Band>;
  edits: BandEdits;
  onEdit: (key: string, edit: BandEdit) => void;
}

/** The four limits of each parameter as fields, in the order in which they lie on its scale around the strip. */
export function BandTable({ bands, inForce, edits, onEdit }: BandTableProps) {
  const head = { role: 'columnheader', scope: 'col' } as const;
  return (
    <table role="table" className="band-table" aria-label="Limits of each parameter">
      <thead role="rowgroup">
        <tr role="row">
          <th {...head} className="band-name">
            Parameter
          </th>
          <th {...head} className="band-limit">
            Outer
          </th>
          <th {...head} className="band-limit">
            Lower
          </th>
          <th {...head} className="band-strip">
            <StripKey />
          </th>
          <th {...head} className="band-limit">
            Upper
          </th>
          <th {...head} className="band-limit">
            Outer
          </th>
        </tr>
      </thead>
      {bands.map((band) => (
        <BandRow
          key={bandKey(band)}
          band={band}
          inForce={inForce.get(bandKey(band)) ?? null}
          edit={edits[bandKey(band)]}
          onEdit={(edit) => onEdit(bandKey(band), edit)}
        />
      ))}
    </table>
  );
}

function StripKey() {
  return (
    <span className="key">
      <span>
        <svg width={14} height={12} viewBox="0 0 14 12" aria-hidden="true">
          <rect width={14} height={12} className="fill-band" />
          <path d="M.5 0V12M13.5 0V12" className="stroke-ink" />
        </svg>
        typical, draft
      </span>
      <span>
        <svg width={4} height={12} viewBox="0 0 4 12" aria-hidden="true">
          <path d="M2 0V12" strokeDasharray="2 2" className="stroke-rule-strong" />
        </svg>
        in force
      </span>
    </span>
  );
}

interface BandRowProps {
  band: Band;
  inForce: Band | null;
  edit: BandEdit | undefined;
  onEdit: (edit: BandEdit) => void;
}

function BandRow({ band, inForce, edit, onEdit }: BandRowProps) {
  const { name, unit } = bandWords(band.parameter);
  const read = applyEdit(band, edit);
  const changed = inForce !== null && !sameLimits(read.band, inForce);
  const limit = (which: Limit) => (
    <LimitCell {...{ band, inForce, edit, read, name, unit }} limit={which} onEdit={onEdit} />
  );
  return (
    <tbody role="rowgroup">
      <tr role="row" className={changed || read.fault ? 'band-changed' : undefined}>
        <th role="rowheader" scope="row" className="band-name">
          {name}
          <span>{unit || 'ratio'}</span>
        </th>
        {limit('outerLow')}
        {limit('typicalLow')}
        <td role="cell" className="band-strip">
          <BandStrip
            outer={read.band.outer}
            typical={read.band.typical}
            inForce={inForce?.typical}
            values={[]}
            label={`${name}: typical from ${limitText(read.band.typical[0], band.parameter)} to ${limitText(read.band.typical[1], band.parameter)} ${unit}`}
          />
          <Source band={band} edit={edit} changed={changed} onEdit={onEdit} />
        </td>
        {limit('typicalHigh')}
        {limit('outerHigh')}
      </tr>
      {read.fault && (
        <tr role="row" className="band-fault">
          <td role="cell" colSpan={6} id={`${bandKey(band)}-fault`}>
            {name}: {read.fault.message}
          </td>
        </tr>
      )}
    </tbody>
  );
}

interface LimitCellProps extends BandRowProps {
  read: ReadBand;
  limit: Limit;
  name: string;
  unit: string;
}

const COLUMN_WORDS: Readonly<Record<Limit, string>> = {
  outerLow: 'Outer lower',
  typicalLow: 'Lower',
  typicalHigh: 'Upper',
  outerHigh: 'Outer upper',
};

function LimitCell({ band, inForce, edit, read, limit, name, unit, onEdit }: LimitCellProps) {
  const { parameter } = band;
  const text = edit?.[limit] ?? limitText(limitOf(band, limit), parameter);
  const now = inForce === null ? null : limitText(limitOf(inForce, limit), parameter);
  const faulty = read.fault?.limits.includes(limit) ?? false;
  const changed = now !== null && text.trim() !== now;
  const outer = limit === 'outerLow' || limit === 'outerHigh';
  return (
    <td
      role="cell"
      className={outer ? 'band-limit band-outer' : 'band-limit'}
      data-label={COLUMN_WORDS[limit]}
    >
      <FigureInput
        aria-label={`${name}, ${LIMIT_WORDS[limit]}${unit ? `, ${unit}` : ''}`}
        aria-invalid={faulty || undefined}
        aria-describedby={faulty ? `${bandKey(band)}-fault` : undefined}
        changed={changed}
        value={text}
        onChange={(event) => onEdit({ ...edit, [limit]: event.target.value })}
      />
      {changed && <span className="band-now">now {now}</span>}
    </td>
  );
}

interface SourceProps {
  band: Band;
  edit: BandEdit | undefined;
  changed: boolean;
  onEdit: (edit: BandEdit) => void;
}

/** Where the bounds come from; who changes them says what they rest on now. */
function Source({ band, edit, changed, onEdit }: SourceProps) {
  const { bounds } = band;
  return (
    <Disclosure summary="Source" className="mt-1">
      {changed ? (
        <Field label="What the bounds rest on" className="py-1">
          {(ties) => (
            <TextInput
              {...ties}
              maxLength={400}
              value={edit?.source ?? band.source}
              onChange={(event) => onEdit({ ...edit, source: event.target.value })}
            />
          )}
        </Field>
      ) : (
        <p className="py-1 text-label text-ink-soft">{band.source}</p>
      )}
      {bounds && (
        <ul className="text-label text-ink-soft">
          <li>Lower: {bounds.typicalLow}</li>
          <li>Upper: {bounds.typicalHigh}</li>
          <li>Outer: {bounds.outer}</li>
        </ul>
      )}
    </Disclosure>
  );
}
