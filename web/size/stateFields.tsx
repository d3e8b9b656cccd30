/** A state vector: six fields, or one paste that fills them. */
import { Choice } from '../parts/choice';
import { useApp } from '../state/appContext';
import { EntryField } from './entryField';

const axes = ['x', 'y', 'z'] as const;
const speeds = ['vx', 'vy', 'vz'] as const;

export function StateFields() {
  const { document } = useApp();
  const { stateUnit } = document.draft.value.entry;
  return (
    <>
      <p class="field-hint">Paste all six numbers into any field, with the epoch if you have it.</p>
      {axes.map((field) => (
        <EntryField key={field} field={field} label={`Position ${field}`} unit={stateUnit} signed />
      ))}
      {speeds.map((field) => (
        <EntryField key={field} field={field} label={`Velocity ${field.slice(1)}`} unit={`${stateUnit}/s`} signed />
      ))}
    </>
  );
}

export function StateUnitChoice() {
  const { document } = useApp();
  return (
    <Choice
      label="Unit of the state vector"
      name="state-unit"
      options={[
        { value: 'km', label: 'km, km/s' },
        { value: 'm', label: 'm, m/s' },
      ]}
      value={document.draft.value.entry.stateUnit}
      onChoose={(stateUnit) => document.setTags({ stateUnit })}
    />
  );
}
