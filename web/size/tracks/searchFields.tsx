/** The fields of the search: band, longest cycle, swath and where it has to close the gaps; the rarer ones folded away. */
import { useEffect, useRef } from 'preact/hooks';
import { degPerRad, formatNumber, type ResolvedOrbit } from '../../../core/index';
import { Choice } from '../../parts/choice';
import { NumberField } from '../../parts/numberField';
import { stepped } from '../../parts/stepping';
import { useApp } from '../../state/appContext';
import type { TracksModel } from './tracksModel';
import type { TrackField } from './wishes';

interface PartProps {
  readonly model: TracksModel;
}

export function SearchFields({ model, orbit }: PartProps & { readonly orbit: ResolvedOrbit }) {
  const unit = useApp().preferences.values.value.lengthUnit;
  return (
    <div class="tracks-fields">
      <InclinationChoice model={model} orbit={orbit} />
      <div class="tracks-grid">
        <Field model={model} field="lowest" label="From altitude" unit={unit} step={10} />
        <Field model={model} field="highest" label="To altitude" unit={unit} step={10} />
        <Field model={model} field="longest" label="Longest cycle" unit="d" step={1} />
        <Field model={model} field="swath" label="Swath" unit={unit} step={10} placeholder="any" />
        <Field model={model} field="latitude" label="Closed at latitude" unit="°" step={5} signed />
        <GapChoice model={model} />
      </div>
      <MoreFields model={model} unit={unit} />
    </div>
  );
}

function InclinationChoice({ model, orbit }: PartProps & { readonly orbit: ResolvedOrbit }) {
  const degrees = formatNumber(orbit.mean.inclinationRad * degPerRad, { digits: 2 });
  return (
    <Choice
      label="Inclination of the tracks"
      name="track-inclination"
      options={[
        { value: 'sunSynchronous', label: 'Sun-synchronous' },
        { value: 'fixed', label: `At ${degrees}°` },
      ]}
      value={model.inclination.value}
      onChoose={(kind) => {
        model.inclination.value = kind;
      }}
    />
  );
}

/** Of no use without a swath, yet in its place, so that nothing jumps when one is typed. */
function GapChoice({ model }: PartProps) {
  return (
    <Choice
      label="Which tracks are listed"
      name="track-gaps"
      options={[
        { value: 'withoutGap', label: 'No gap' },
        { value: 'all', label: 'All' },
      ]}
      value={model.show.value}
      onChoose={(show) => {
        model.show.value = show;
      }}
    />
  );
}

const rareFields: readonly TrackField[] = ['shortest', 'narrowest', 'widest', 'cycle'];

function MoreFields({ model, unit }: PartProps & { readonly unit: string }) {
  const { errors, texts, wishes } = model;
  const inUse = rareFields.filter((field) => texts.value[field].trim() !== '').length;
  const isInError = rareFields.some((field) => errors.value[field]);
  const fold = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    // Opened for a message, but never closed: the user may be typing in it.
    if (isInError && fold.current) fold.current.open = true;
  }, [isInError]);
  return (
    <details class="tracks-more" ref={fold}>
      <summary>More filters{inUse > 0 ? ` (${inUse} in use)` : ''}</summary>
      <div class="tracks-grid">
        <Field model={model} field="shortest" label="Shortest cycle" unit="d" step={1} placeholder="any" />
        <Field model={model} field="narrowest" label="Spacing from" unit={unit} step={10} placeholder="any" />
        <Field model={model} field="widest" label="Spacing to" unit={unit} step={10} placeholder="any" />
        <Field
          model={model}
          field="cycle"
          label="Only N/D"
          keyboard="text"
          placeholder="181/12"
          note={wishes.value.note ?? undefined}
        />
      </div>
    </details>
  );
}

interface FieldProps extends PartProps {
  readonly field: TrackField;
  readonly label: string;
  readonly unit?: string;
  readonly step?: number;
  readonly signed?: boolean;
  readonly keyboard?: 'decimal' | 'text';
  readonly placeholder?: string;
  readonly note?: string | undefined;
}

function Field({ model, field, step, ...rest }: FieldProps) {
  const { texts, errors } = model;
  return (
    <div class="field-group">
      <NumberField
        {...rest}
        text={texts.value[field]}
        error={errors.value[field]}
        step={step === undefined ? undefined : (text, count) => stepped(text, step, count)}
        onText={(text) => {
          texts.value = { ...texts.value, [field]: text };
        }}
      />
    </div>
  );
}
