import { Button } from '../../../components/ui/button';
import { Disclosure } from '../../../components/ui/disclosure';
import { useLineFormView } from '../hooks/form-context';
import { blankRating } from '../model/blank';
import { FieldGrid } from './form-part';
import { ChoiceField, TextField } from './text-fields';
import { TypedField } from './typed-field';

const KINDS = [
  { value: 'calculated', label: 'Calculated' },
  { value: 'measured', label: 'Measured' },
  { value: 'manufacturer', label: 'From the maker' },
  { value: 'estimated', label: 'Estimated' },
];

const STATUSES = [
  { value: 'preliminary', label: 'Preliminary' },
  { value: 'design', label: 'Design' },
  { value: 'as-built', label: 'As built' },
  { value: 'in-service', label: 'In service' },
];

function SeasonRatings({ index }: { index: number }) {
  const { form, set } = useLineFormView();
  const path = ['declared', index, 'ratings'] as const;
  const ratings = form.declared[index]?.ratings ?? [];
  return (
    <div className="grid gap-4">
      {ratings.map((_, i) => (
        <div key={i} className="grid gap-x-6 gap-y-3 border-l-2 border-rule pl-4 field:grid-cols-2">
          <TextField path={[...path, i, 'season']} label={`Season ${i + 1}`} />
          <div className="self-end">
            <Button
              small
              aria-label={`Remove season ${i + 1}`}
              onClick={() =>
                set(
                  path,
                  ratings.filter((__, other) => other !== i),
                )
              }
            >
              Remove
            </Button>
          </div>
          <TypedField path={[...path, i, 'continuousA']} label="Continuous" units="A" />
          <TypedField path={[...path, i, 'emergencyA']} label="Short-time" units="A" optional />
        </div>
      ))}
      {ratings.length < 12 && (
        <div>
          <Button small onClick={() => set(path, [...ratings, blankRating()])}>
            Add a season
          </Button>
        </div>
      )}
    </div>
  );
}

/** Ratings of a circuit, and where its values come from. All of it may stay empty. */
export function RatingsAndBasis({ index }: { index: number }) {
  const path = ['declared', index] as const;
  return (
    <Disclosure summary="Ratings and source of the values" className="mt-5">
      <div className="mt-3 grid gap-5">
        <FieldGrid>
          <TextField path={[...path, 'circuitId']} label="Own name of the circuit" optional />
          <span className="hidden field:block" />
          <TypedField path={[...path, 'ratingA']} label="Rating" units="A" optional />
          <TypedField
            path={[...path, 'maxTemperatureC']}
            label="At a conductor temperature of"
            units="°C"
            optional
          />
        </FieldGrid>
        <SeasonRatings index={index} />
        <FieldGrid>
          <ChoiceField
            path={[...path, 'basis', 'kind']}
            label="The values are"
            options={KINDS}
            none="not said"
          />
          <ChoiceField
            path={[...path, 'basis', 'status']}
            label="State of the line"
            options={STATUSES}
            none="not said"
          />
          <TextField path={[...path, 'basis', 'engineer']} label="Who answers for them" optional />
          <TextField path={[...path, 'basis', 'date']} label="Date" type="date" optional />
        </FieldGrid>
      </div>
    </Disclosure>
  );
}
