import { useState } from 'react';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { Field, FieldError } from '../../../components/ui/field';
import { Checkbox, TextArea, TextInput } from '../../../components/ui/inputs';
import { Sheet } from '../../../components/ui/sheet';
import { useLeaveGuard } from '../../../hooks/use-leave-guard';
import { useCalendar } from '../../../lib/queries/get-calendar';
import { useSaveCalendar } from '../api/save-calendar';
import { calendarForm, readCalendarForm, WEEKDAYS, type CalendarForm } from '../model/calendar-form';

/** The owner's working days, which every window is counted in. */
export function CalendarSheet() {
  const calendar = useCalendar();
  const [typed, setTyped] = useState<CalendarForm | null>(null);
  const [asking, setAsking] = useState(false);
  const save = useSaveCalendar();
  useLeaveGuard(typed !== null);
  const form = typed ?? calendarForm(calendar);
  const change = (part: Partial<CalendarForm>) => setTyped({ ...form, ...part });
  const read = readCalendarForm(form);
  const faultOf = (field: keyof CalendarForm) => read.faults.find((f) => f.field === field)?.message ?? null;
  return (
    <Sheet title="Working days" aside={`version ${calendar.version}`}>
      <div className="sheet-body grid gap-4">
        <Field label="Time zone" error={faultOf('timeZone')} className="field:w-72">
          {(ties) => (
            <TextInput
              {...ties}
              value={form.timeZone}
              maxLength={60}
              onChange={(e) => change({ timeZone: e.target.value })}
            />
          )}
        </Field>
        <WeekendDays days={form.weekendDays} fault={faultOf('weekendDays')} onChange={change} />
        <Field
          label="Holidays"
          hint="One a line: the day as YYYY-MM-DD, then its name, such as 2027-01-01 New Year."
          error={faultOf('holidays')}
        >
          {(ties) => (
            <TextArea
              {...ties}
              rows={8}
              value={form.holidays}
              onChange={(e) => change({ holidays: e.target.value })}
            />
          )}
        </Field>
        <div className="flex flex-wrap gap-3">
          <Button blockedBy={blockOf(typed, read.faults.length)} onClick={() => setAsking(true)}>
            Save the calendar
          </Button>
          {typed && <Button onClick={() => setTyped(null)}>Forget what is not saved</Button>}
        </div>
      </div>
      {asking && (
        <WordsDialog
          title="Save the calendar"
          description="It counts from now on; windows that are open keep the days that they were opened with."
          label="Reason"
          confirm="Save the calendar"
          busy={save.isPending}
          error={save.error}
          onConfirm={(reason) =>
            save.mutate(
              { ...read.calendar, version: calendar.version, reason },
              {
                onSuccess: () => {
                  setTyped(null);
                  setAsking(false);
                },
              },
            )
          }
          onClose={() => setAsking(false)}
        />
      )}
    </Sheet>
  );
}

function blockOf(typed: CalendarForm | null, faults: number): string | null {
  if (typed === null) return 'Saving opens once something is changed.';
  return faults > 0 ? 'Saving opens once what is marked is mended.' : null;
}

interface WeekendDaysProps {
  days: readonly number[];
  fault: string | null;
  onChange: (part: Pick<CalendarForm, 'weekendDays'>) => void;
}

function WeekendDays({ days, fault, onChange }: WeekendDaysProps) {
  const toggle = (day: number) =>
    onChange({ weekendDays: days.includes(day) ? days.filter((d) => d !== day) : [...days, day] });
  return (
    <fieldset>
      <legend className="field-label">Days of the week without work</legend>
      <div className="flex flex-wrap gap-x-5 gap-y-2">
        {WEEKDAYS.map((name, day) => (
          <Checkbox key={name} label={name} checked={days.includes(day)} onChange={() => toggle(day)} />
        ))}
      </div>
      {fault && <FieldError>{fault}</FieldError>}
    </fieldset>
  );
}
