import { Button } from '../../../components/ui/button';
import { SegmentChoice } from '../../../components/ui/segment';
import { useLineFormView } from '../hooks/form-context';
import { useTakeBack } from '../hooks/take-back-context';
import { addSection, removeSection } from '../model/edit';
import type { SectionForm } from '../model/form-types';
import { fieldId } from '../model/pointers';
import { backSection } from '../model/take-back';
import { SPAN_UNITS } from '../model/unit-choices';
import { SequenceFields } from './declared-values';
import { FieldGrid, FormPart } from './form-part';
import { SectionConductors } from './section-conductors';
import { SectionGeometry } from './section-geometry';
import { TakeBackNotice } from './take-back-notice';
import { ChoiceField } from './text-fields';
import { TypedField } from './typed-field';

const KINDS = [
  { value: 'overhead', label: 'Overhead line' },
  { value: 'cable', label: 'Cable' },
];

/** As many as the filing format takes. */
const MOST_SECTIONS = 100;

interface SectionsProps {
  /** The section on the table, and in the drawing. */
  shown: number;
  onShow: (index: number) => void;
}

/** Goes from section to section. */
function SectionChooser({ shown, onShow }: SectionsProps) {
  const { form } = useLineFormView();
  if (form.sections.length === 1) return null;
  return (
    <div className="mb-4">
      <SegmentChoice
        label="Section"
        value={String(shown)}
        onChange={(value) => onShow(Number(value))}
        options={form.sections.map((_, i) => ({ value: String(i), label: `Section ${i + 1}` }))}
      />
    </div>
  );
}

/** Adds a section, which begins as the last one is, or takes the shown one away. */
function SectionCount({ shown, onShow }: SectionsProps) {
  const { form, change } = useLineFormView();
  const { offer } = useTakeBack();
  const count = form.sections.length;
  const add = () => {
    change(addSection);
    onShow(count);
  };
  const remove = () => {
    const next = Math.max(0, shown - 1);
    offer({
      at: 'sections',
      words: `Section ${shown + 1} is removed.`,
      back: backSection(form, shown),
      focusId: fieldId(`/sections/${next}/lengthKm`),
      backFocusId: fieldId(`/sections/${shown}/lengthKm`),
      onBack: () => onShow(shown),
    });
    change((f) => removeSection(f, shown));
    onShow(next);
  };
  return (
    <div className="mt-4 flex flex-wrap gap-3">
      {count < MOST_SECTIONS && (
        <Button small onClick={add}>
          Add a section
        </Button>
      )}
      {count > 1 && <Button small onClick={remove}>{`Remove section ${shown + 1}`}</Button>}
    </div>
  );
}

function CableValues({ index, section }: { index: number; section: SectionForm }) {
  return (
    <FormPart
      title="Cable, from its maker’s sheet"
      note="Taken as you declare it; a whole-line unit is for this section."
    >
      {section.perLength.map((_, circuit) => (
        <div key={circuit} className={circuit > 0 ? 'mt-5' : undefined}>
          {section.perLength.length > 1 && <h2 className="mb-3 text-h3">{`Circuit ${circuit + 1}`}</h2>}
          <SequenceFields path={['sections', index, 'perLength', circuit]} />
        </div>
      ))}
    </FormPart>
  );
}

/** The stretch of line on the table: its length, its structure, its conductors. */
export function SectionFields({ shown, onShow }: SectionsProps) {
  const { form } = useLineFormView();
  const section = form.sections[shown];
  if (!section) return null;
  const path = ['sections', shown] as const;
  const several = form.sections.length > 1;
  return (
    <>
      <FormPart
        title={several ? `Section ${shown + 1} of ${form.sections.length}` : 'Section'}
        note="A stretch with one structure and one set of conductors."
      >
        <SectionChooser shown={shown} onShow={onShow} />
        <FieldGrid>
          <TypedField path={[...path, 'lengthKm']} label="Length" units={SPAN_UNITS} />
          <ChoiceField path={[...path, 'kind']} label="Kind" options={KINDS} />
        </FieldGrid>
        <SectionCount shown={shown} onShow={onShow} />
        <TakeBackNotice at="sections" />
      </FormPart>
      {section.kind === 'cable' ? (
        <CableValues index={shown} section={section} />
      ) : (
        <>
          <SectionGeometry index={shown} section={section} />
          <SectionConductors index={shown} section={section} />
        </>
      )}
    </>
  );
}
