import { useState } from 'react';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';
import type { ListControls } from '../../../hooks/use-list-view';
import { QUEUE_FILTERS, type QueueFilter } from '../model/queue-list';
import { filterLabel, QueueFilterControl, type QueueChoices } from './queue-filters';

const ORDERS = [
  { value: 'due', label: 'Due first' },
  { value: '-grade', label: 'Worst findings first' },
  { value: '-age', label: 'Oldest first' },
  { value: 'number', label: 'By number' },
  { value: 'applicant', label: 'By applicant' },
  { value: 'reviewer', label: 'By reviewer' },
];

interface QueueToolsProps {
  controls: ListControls<QueueFilter>;
  choices: QueueChoices;
}

/** On narrow screens the heads of the table are gone: its filters and its order stand on a sheet of their own. */
export function QueueTools({ controls, choices }: QueueToolsProps) {
  const [open, setOpen] = useState(false);
  const set = QUEUE_FILTERS.filter((name) => controls.view.filters[name] !== '').length;
  const orders = ORDERS.some((order) => order.value === controls.view.sort)
    ? ORDERS
    : [...ORDERS, { value: controls.view.sort, label: 'As the address says' }];
  return (
    <div className="table-tools">
      <Button onClick={() => setOpen(true)}>{set > 0 ? `Filter, ${set} set` : 'Filter'}</Button>
      <span className="min-w-0 flex-1">
        <Select
          aria-label="Sort"
          value={controls.view.sort}
          options={orders}
          onChange={(event) => controls.sortBy(event.target.value)}
        />
      </span>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title="Filter the queue"
        foot={
          <>
            <Button kind="primary" onClick={() => setOpen(false)}>
              Show
            </Button>
            <Button onClick={controls.clear}>Clear the filters</Button>
          </>
        }
      >
        <div className="grid gap-4 field:grid-cols-2">
          {QUEUE_FILTERS.map((name) => (
            <Field key={name} label={filterLabel(name)}>
              {(ties) => (
                <QueueFilterControl id={ties.id} name={name} controls={controls} choices={choices} />
              )}
            </Field>
          ))}
        </div>
      </Dialog>
    </div>
  );
}
