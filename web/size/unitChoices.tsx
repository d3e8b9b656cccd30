/** Units of lengths and rates, for what is shown and what is typed. */
import { Choice } from '../parts/choice';
import { useApp } from '../state/appContext';
import { switchLengthUnit } from '../state/entryActions';

export function UnitChoices() {
  const { preferences, document } = useApp();
  const { lengthUnit, rateUnit } = preferences.values.value;
  return (
    <div class="unit-choices">
      <Choice
        label="Unit of lengths"
        name="length-unit"
        options={[
          { value: 'km', label: 'km' },
          { value: 'NM', label: 'NM' },
        ]}
        value={lengthUnit}
        onChoose={(unit) => {
          void preferences.set('lengthUnit', unit);
          switchLengthUnit(document, unit);
        }}
      />
      <Choice
        label="Unit of rates"
        name="rate-unit"
        options={[
          { value: 'degPerDay', label: '°/day' },
          { value: 'degPerYear', label: '°/yr' },
        ]}
        value={rateUnit}
        onChoose={(unit) => void preferences.set('rateUnit', unit)}
      />
    </div>
  );
}
