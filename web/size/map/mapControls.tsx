/** How much of the track is drawn, and the swath along it. */
import type { Signal } from '@preact/signals';
import type { Cycle } from '../../../core/index';
import { Choice } from '../../parts/choice';
import { NumberField } from '../../parts/numberField';
import { stepped } from '../../parts/stepping';
import { useApp } from '../../state/appContext';
import type { TracksModel } from '../tracks/tracksModel';
import type { DrawnSpan } from './trackDrawn';

export type Legs = 'both' | 'ascending' | 'descending';

interface ControlsProps {
  readonly span: Signal<DrawnSpan>;
  readonly legs: Signal<Legs>;
  readonly shading: Signal<'none' | 'swath'>;
  readonly model: TracksModel;
  readonly cycle: Cycle;
}

const swathStep = 10;

export function MapControls({ span, legs, shading, model, cycle }: ControlsProps) {
  const { lengthUnit } = useApp().preferences.values.value;
  const { texts, errors } = model;
  return (
    <div class="map-controls">
      <Choice
        label="How much of the track is drawn"
        name="map-span"
        options={[
          { value: 'cycle', label: cycle.days === 1 ? 'Cycle, 1 day' : `Cycle, ${cycle.days} days` },
          { value: 'day', label: 'First day' },
        ]}
        value={span.value}
        onChoose={(next) => {
          span.value = next;
        }}
      />
      <div class="field-group">
        <NumberField
          label="Swath"
          text={texts.value.swath}
          unit={lengthUnit}
          placeholder="none"
          error={errors.value.swath}
          step={(text, count) => stepped(text || '0', swathStep, count)}
          onText={(swath) => {
            texts.value = { ...texts.value, swath };
          }}
        />
      </div>
      <Choice
        label="Which legs are drawn"
        name="map-legs"
        options={[
          { value: 'both', label: 'Both' },
          { value: 'ascending', label: 'Northward' },
          { value: 'descending', label: 'Southward' },
        ]}
        value={legs.value}
        onChoose={(next) => {
          legs.value = next;
        }}
      />
      <Choice
        label="Shading of the swath"
        name="map-swath"
        options={[
          { value: 'none', label: 'Lines' },
          { value: 'swath', label: 'With swath' },
        ]}
        value={shading.value}
        onChoose={(next) => {
          shading.value = next;
        }}
      />
    </div>
  );
}
