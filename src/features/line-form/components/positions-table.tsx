import { FieldError } from '../../../components/ui/field';
import { FigureInput } from '../../../components/ui/inputs';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { useLineFormView } from '../hooks/form-context';
import { useTypedField } from '../hooks/use-field';
import type { FormPath, PositionForm } from '../model/form-types';
import { midspan } from '../model/midspan';
import { fieldId, pointerOf, positionName } from '../model/pointers';
import { PositionMark } from './position-mark';
import { PutHere } from './put-notice';

const COORDINATES = [
  { key: 'horizontalM', head: 'Across' },
  { key: 'attachmentHeightM', head: 'Height' },
  { key: 'sagM', head: 'Sag' },
] as const;

const UNIT_WORDS: Record<string, string> = { m: 'metres', ft: 'feet' };

function CoordinateInput({ path, name, unit }: { path: FormPath; name: string; unit: string }) {
  const { ties, text, onText } = useTypedField(path);
  const { id, error, onFocus, onBlur } = ties;
  return (
    <FigureInput
      id={id}
      value={text}
      onChange={onText}
      onFocus={onFocus}
      onBlur={onBlur}
      aria-label={`${name}, ${UNIT_WORDS[unit] ?? unit}`}
      aria-invalid={error ? true : undefined}
      aria-describedby={error ? `${id}-error` : undefined}
      className="px-2"
    />
  );
}

/** What is wrong with a position, under its row, each sentence once. */
function PositionErrors({ path }: { path: FormPath }) {
  const { noteAt } = useLineFormView();
  const notes = COORDINATES.flatMap(({ key, head }) => {
    const pointer = pointerOf([...path, key]);
    const note = noteAt(pointer);
    return note ? [{ id: `${fieldId(pointer)}-error`, head, ...note }] : [];
  });
  const lacking = notes.filter((n) => n.missing).map((n) => n.head.toLowerCase());
  const [firstLacking] = notes.filter((n) => n.missing);
  const distinct = [
    ...notes.filter((n, i) => !n.missing && notes.findIndex((m) => m.message === n.message) === i),
    ...(firstLacking ? [{ id: firstLacking.id, message: `Still needed: ${lacking.join(' and ')}.` }] : []),
  ];
  if (distinct.length === 0) return null;
  return (
    <Row>
      <Cell colSpan={5} fold="row" className="!h-auto !border-b-0 !pt-0">
        {distinct.map((n) => (
          <FieldError key={n.id} id={n.id}>
            {n.message}
          </FieldError>
        ))}
      </Cell>
    </Row>
  );
}

/** A place that the check put in, under its row. */
function PositionPut({ path }: { path: FormPath }) {
  const { put } = useLineFormView();
  const first = put?.values[0]?.pointer;
  const here = COORDINATES.map(({ key }) => pointerOf([...path, key])).find((p) => p === first);
  if (here === undefined) return null;
  return (
    <Row>
      <Cell colSpan={5} fold="row" className="!h-auto !border-b-0 !pt-0">
        <PutHere pointer={here} />
      </Cell>
    </Row>
  );
}

function PositionRow({
  section,
  index,
  position,
}: {
  section: number;
  index: number;
  position: PositionForm;
}) {
  const { form } = useLineFormView();
  const path = ['sections', section, 'positions', index] as const;
  const name = positionName(form, section, index);
  const words =
    position.kind === 'phase' ? `Phase ${name}` : name.replace(/^the ground/, 'Ground').replace(/^g/, 'G');
  const left = midspan(position);
  return (
    <Row className="[&>*]:!border-b-0 [&>*]:!py-1">
      <RowHead className="!pr-1 font-semibold">
        <span className="inline-flex items-center gap-2">
          <PositionMark position={position} circuits={form.circuits} />
          <span className="sr-only field:not-sr-only">{words}</span>
          <span aria-hidden="true" className="text-label field:hidden">
            {position.kind === 'phase' ? '' : name.replace(/\D/g, '')}
          </span>
        </span>
      </RowHead>
      {COORDINATES.map(({ key, head }) => (
        <Cell key={key} className="w-[84px] !pr-2">
          <CoordinateInput
            path={[...path, key]}
            name={`${words}, ${head.toLowerCase()}`}
            unit={position.attachmentHeightM.unit}
          />
        </Cell>
      ))}
      <Cell number className={left !== null && left.metres <= 0 ? '!pr-0 text-vermilion' : '!pr-0'}>
        {left?.text ?? ''}
      </Cell>
    </Row>
  );
}

/** The positions of a section, one a row; what is left at mid-span stands beside them. */
export function PositionsTable({ section }: { section: number }) {
  const { form } = useLineFormView();
  const positions = form.sections[section]?.positions ?? [];
  return (
    <Table label="Positions at the structure" flush className="mt-4">
      <TableHead>
        <Row>
          <HeadCell>
            <span className="sr-only field:not-sr-only">Position</span>
          </HeadCell>
          {COORDINATES.map(({ key, head }) => (
            <HeadCell key={key} number>
              {head}
            </HeadCell>
          ))}
          <HeadCell number className="!pr-0">
            Mid-span
          </HeadCell>
        </Row>
      </TableHead>
      {positions.map((position, index) => (
        <TableBody key={index}>
          <PositionRow section={section} index={index} position={position} />
          <PositionErrors path={['sections', section, 'positions', index]} />
          <PositionPut path={['sections', section, 'positions', index]} />
        </TableBody>
      ))}
    </Table>
  );
}
