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
  /** Without a map only the swath is of use, in the strip. */
  readonly hasMap: boolean;
}

const swathStep = 10;

export function MapControls(props: ControlsProps) {
  return (
    <div class="map-controls">
      {props.hasMap && <SpanChoice {...props} />}
      <SwathField {...props} />
      {props.hasMap && <LegsChoice {...props} />}
      {props.hasMap && <ShadingChoice {...props} />}
    </div>
  );
}

function SpanChoice({ span, cycle }: ControlsProps) {
  return (
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
  );
}

/** The swath of the list of tracks. */
function SwathField({ model: { texts, errors } }: ControlsProps) {
  const { lengthUnit } = useApp().preferences.values.value;
  return (
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
  );
}

function LegsChoice({ legs }: ControlsProps) {
  return (
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
  );
}

function ShadingChoice({ shading }: ControlsProps) {
  return (
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
  );
}
