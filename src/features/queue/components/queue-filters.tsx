import { FilterInput } from '../../../components/ui/filter-input';
import { GRADE_WORDS } from '../../../components/ui/grades';
import { Select, type Option } from '../../../components/ui/inputs';
import { STATE_WORDS } from '../../../components/ui/stamp';
import type { ListControls } from '../../../hooks/use-list-view';
import type { QueueFilter } from '../model/queue-list';

export interface QueueChoices {
  voltages: readonly number[];
  reviewers: readonly { id: string; name: string }[];
}

const STATES: readonly Option[] = (['filed', 'in-review', 'returned'] as const).map((value) => ({
  value,
  label: STATE_WORDS[value],
}));
const GRADES: readonly Option[] = [
  ...(['must-answer', 'explain', 'note'] as const).map((value) => ({ value, label: GRADE_WORDS[value] })),
  { value: 'none', label: GRADE_WORDS['in-balance'] },
];
const DUES: readonly Option[] = [
  { value: 'overdue', label: 'Overdue' },
  { value: 'today', label: 'Today' },
  { value: 'week', label: 'This week' },
];

interface FilterProps {
  name: QueueFilter;
  controls: ListControls<QueueFilter>;
  choices: QueueChoices;
  /** The low form that stands in the table's heads. */
  small?: boolean;
  id?: string;
}

const LABELS: Readonly<Record<QueueFilter, string>> = {
  number: 'Number',
  search: 'Applicant or connection',
  voltage: 'Voltage',
  state: 'State',
  grade: 'Findings',
  due: 'Due',
  reviewer: 'Reviewer',
};

const NONE: Partial<Record<QueueFilter, string>> = { due: 'Any day', reviewer: 'Anyone' };

function optionsOf(name: QueueFilter, choices: QueueChoices): readonly Option[] {
  switch (name) {
    case 'voltage':
      return choices.voltages.map((kv) => ({ value: String(kv), label: String(kv) }));
    case 'state':
      return STATES;
    case 'grade':
      return GRADES;
    case 'due':
      return DUES;
    default:
      return [
        { value: 'me', label: 'Mine' },
        { value: 'nobody', label: 'Nobody yet' },
        ...choices.reviewers.map(({ id, name: label }) => ({ value: id, label })),
      ];
  }
}

/** One filter of the queue, for the head of its column or for the sheet of filters on a narrow screen. */
export function QueueFilterControl({ name, controls, choices, small, id }: FilterProps) {
  const value = controls.view.filters[name];
  const label = `Filter by ${LABELS[name].toLowerCase()}`;
  if (name === 'number' || name === 'search') {
    return (
      <FilterInput
        id={id}
        small={small}
        label={label}
        value={value}
        placeholder={name === 'search' ? 'Name contains' : undefined}
        maxLength={name === 'number' ? 7 : 120}
        onChange={(next) => controls.setFilter(name, next)}
      />
    );
  }
  return (
    <Select
      id={id}
      small={small}
      aria-label={label}
      value={value}
      none={NONE[name] ?? 'Any'}
      options={optionsOf(name, choices)}
      onChange={(event) => controls.setFilter(name, event.target.value)}
    />
  );
}

/** The word over a filter where it stands alone. */
export const filterLabel = (name: QueueFilter): string => LABELS[name];
