/** Which reading, against which element, over which range. */
import type { ReadingId, SweptElement } from '../../../core/index';
import { sweptElements, sweptWords } from '../../../core/index';
import { NumberField } from '../../parts/numberField';
import { stepped } from '../../parts/stepping';
import { useApp } from '../../state/appContext';
import type { SweepState } from './useSweep';

export function SweepChoices({ state }: { readonly state: SweepState }) {
  return (
    <div class="sweep-choices">
      <ReadingChoice />
      <ElementChoice element={state.element} />
      <RangeFields state={state} />
    </div>
  );
}

function ReadingChoice() {
  const { document, sweep } = useApp();
  const { reading } = sweep.value;
  const absent = document.absentReadings.value;
  return (
    <label class="sweep-choice">
      <span>Reading</span>
      <select
        value={reading}
        onChange={(event) => {
          sweep.value = { ...sweep.value, reading: event.currentTarget.value as ReadingId };
        }}
      >
        {[...document.readings.value, ...absent].map(({ id, label }) => (
          <option key={id} value={id}>
            {label}
          </option>
        ))}
      </select>
    </label>
  );
}

function ElementChoice({ element }: { readonly element: SweptElement }) {
  const { sweep } = useApp();
  return (
    <label class="sweep-choice">
      <span>against</span>
      <select
        value={element}
        onChange={(event) => {
          sweep.value = { ...sweep.value, element: event.currentTarget.value as SweptElement, range: null };
        }}
      >
        {sweptElements.map((each) => (
          <option key={each} value={each}>
            {sweptWords[each].label}
          </option>
        ))}
      </select>
    </label>
  );
}

const stepSizes = { length: 10, angle: 1, ratio: 0.001 } as const;

function RangeFields({ state: { element, elementUnit, range, read } }: { readonly state: SweepState }) {
  const { sweep } = useApp();
  const unit = elementUnit.symbol === 'deg' ? '°' : elementUnit.symbol;
  const stepSize = stepSizes[sweptWords[element].quantity];
  return (
    <div class="sweep-range field-group">
      {(['from', 'to'] as const).map((field) => (
        <NumberField
          key={field}
          label={field === 'from' ? 'From' : 'To'}
          text={range[field]}
          unit={unit}
          error={read.ok ? undefined : read.errors[field]}
          step={(text, count) => stepped(text, stepSize, count)}
          onText={(text) => {
            sweep.value = { ...sweep.value, element, range: { ...range, [field]: text } };
          }}
        />
      ))}
    </div>
  );
}
