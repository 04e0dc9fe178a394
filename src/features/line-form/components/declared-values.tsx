import { Disclosure } from '../../../components/ui/disclosure';
import { Checkbox } from '../../../components/ui/inputs';
import { useLineFormView } from '../hooks/form-context';
import { useTakeBack } from '../hooks/take-back-context';
import { getAt, setDeclares } from '../model/edit';
import type { FormPath, MutualKey, SequenceKey } from '../model/form-types';
import { MUTUAL_KEYS } from '../model/form-types';
import { backDeclared } from '../model/take-back';
import { declaredUnits, needsBase } from '../model/unit-choices';
import { FieldGrid, FormPart } from './form-part';
import { RatingsAndBasis } from './ratings-and-basis';
import { TakeBackNotice } from './take-back-notice';
import { PlainNumber } from './text-fields';
import { TypedField } from './typed-field';

/** Pairs stand side by side: positive sequence left, zero sequence right. */
const PAIRS: readonly SequenceKey[] = ['r1', 'r0', 'x1', 'x0', 'b1', 'b0'];

const symbol = (key: SequenceKey | MutualKey): string => key.toUpperCase().replace('M', 'm');

/** The bases of a per-unit value, asked for only where the unit stands on them. */
function Bases({ path, name }: { path: FormPath; name: string }) {
  const { form, ownersBaseMva } = useLineFormView();
  const unit = getAt(form, [...path, 'unit']);
  if (typeof unit !== 'string' || !needsBase(unit)) return null;
  return (
    <div className="grid grid-cols-2 gap-3 pt-2">
      <PlainNumber
        path={[...path, 'baseMva']}
        label={`${name} on MVA`}
        hint={`${ownersBaseMva} if left empty`}
      />
      <PlainNumber path={[...path, 'baseKv']} label={`${name} on kV`} hint="nominal if left empty" />
    </div>
  );
}

function ValueField({ path, name }: { path: FormPath; name: SequenceKey | MutualKey }) {
  return (
    <div>
      <TypedField path={path} label={symbol(name)} units={declaredUnits(name)} />
      <Bases path={path} name={symbol(name)} />
    </div>
  );
}

/** The six values of one circuit. */
export function SequenceFields({ path }: { path: FormPath }) {
  return (
    <FieldGrid>
      {PAIRS.map((key) => (
        <ValueField key={key} path={[...path, key]} name={key} />
      ))}
    </FieldGrid>
  );
}

function CircuitValues({ circuit }: { circuit: number }) {
  const { form, change } = useLineFormView();
  const index = form.declared.findIndex((d) => d.circuit === circuit);
  const others = form.declared.some((d) => d.circuit !== circuit);
  const { offer, end } = useTakeBack();
  const place = `line-declared-${circuit}`;
  const declare = (declares: boolean) => {
    end();
    if (!declares)
      offer({
        at: place,
        words: `The values of circuit ${circuit} are removed.`,
        back: backDeclared(form, circuit),
        focusId: place,
      });
    change((f) => setDeclares(f, circuit, declares));
  };
  return (
    <div className={circuit === 2 ? 'mt-6 border-t border-rule pt-4' : undefined}>
      {form.circuits === 2 && (
        <div id={place} className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4">
          <h2 className="text-h3">{`Circuit ${circuit}`}</h2>
          <Checkbox
            label="Somebody else’s, no values"
            checked={index < 0}
            disabled={index >= 0 && !others}
            onChange={(event) => declare(!event.target.checked)}
          />
        </div>
      )}
      <TakeBackNotice at={place} />
      {index >= 0 && (
        <>
          <SequenceFields path={['declared', index]} />
          <RatingsAndBasis index={index} />
        </>
      )}
    </div>
  );
}

function MutualValues() {
  const { put } = useLineFormView();
  const hasPut = put?.values[0]?.pointer.startsWith('/declaredMutual/') === true;
  return (
    <Disclosure summary="Coupling of the two circuits" className="mt-5" open={hasPut || undefined}>
      <p className="mt-2 mb-3 text-table text-ink-soft">
        Zero-sequence values between the circuits; B0m is the off-diagonal element and negative.
      </p>
      <FieldGrid>
        {MUTUAL_KEYS.map((key) => (
          <ValueField key={key} path={['declaredMutual', key]} name={key} />
        ))}
      </FieldGrid>
    </Disclosure>
  );
}

/** What the applicant declares, circuit by circuit, in the units of the applicant's own table. */
export function DeclaredValues() {
  const { form } = useLineFormView();
  return (
    <FormPart
      title={`Declared, at ${form.frequencyHz} Hz`}
      note="Choose the unit your table uses; we convert and keep both."
    >
      {(form.circuits === 2 ? [1, 2] : [1]).map((circuit) => (
        <CircuitValues key={circuit} circuit={circuit} />
      ))}
      {form.circuits === 2 && <MutualValues />}
    </FormPart>
  );
}
