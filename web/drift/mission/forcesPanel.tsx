/** What the mission is computed with: forces, the air, the box of local time. Saved with the candidate. */
import { useEffect, useRef } from 'preact/hooks';
import {
  type DensityChoice,
  forcesText,
  type MissionEntry,
  type MissionField,
  type MissionSettings,
} from '../../../core/index';
import { Choice } from '../../parts/choice';
import { NumberField } from '../../parts/numberField';
import type { Mission } from '../../state/mission';

interface PanelProps {
  readonly mission: Mission;
}

export function ForcesPanel({ mission }: PanelProps) {
  const settings = mission.settings.value;
  const hasErrors = Object.keys(settings.errors).length > 0;
  const fold = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    if (hasErrors && fold.current) fold.current.open = true;
  }, [hasErrors]);
  const says = settings.forces ? forcesText(settings.forces, []) : 'something cannot be read';
  return (
    <details class="fold forces" ref={fold}>
      <summary>
        <span class="fold-title">Forces and box</span> <span class="fold-says">{says}</span>
      </summary>
      <div class="forces-fields">
        <Switches mission={mission} />
        <div class="field-group">
          <TextField {...{ mission, settings }} field="zonalDegree" label="Highest zonal" unit="" />
          <TextField {...{ mission, settings }} field="boxMinutes" label="Box of local time ±" unit="min" />
        </div>
        {settings.entry.drag && <DragFields mission={mission} settings={settings} />}
      </div>
    </details>
  );
}

const switches = [
  { id: 'sun', label: 'Sun' },
  { id: 'moon', label: 'Moon' },
  { id: 'drag', label: 'Drag' },
] as const satisfies readonly { readonly id: keyof MissionEntry; readonly label: string }[];

function Switches({ mission }: PanelProps) {
  const { entry } = mission.settings.value;
  return (
    <fieldset class="choice switches">
      <legend class="hidden-visually">Forces besides the zonals</legend>
      {switches.map(({ id, label }) => (
        <label key={id} class="choice-option">
          <input
            type="checkbox"
            checked={entry[id]}
            onChange={(event) => mission.change({ [id]: event.currentTarget.checked })}
          />
          <span>
            {entry[id] ? '✓ ' : ''}
            {label}
          </span>
        </label>
      ))}
    </fieldset>
  );
}

const densities: readonly { readonly value: DensityChoice; readonly label: string }[] = [
  { value: 'low', label: 'low ½' },
  { value: 'mean', label: 'mean' },
  { value: 'high', label: 'high 2' },
  { value: 'factor', label: 'factor' },
];

function DragFields({ mission, settings }: PanelProps & { readonly settings: MissionSettings }) {
  const { entry } = settings;
  return (
    <>
      <Choice<MissionEntry['dragForm']>
        label="How mass and drag area are given"
        name="drag-form"
        options={[
          { value: 'parts', label: 'mass, area, Cd' },
          { value: 'ballistic', label: 'm/(Cd·A)' },
        ]}
        value={entry.dragForm}
        onChoose={(dragForm) => mission.change({ dragForm })}
      />
      <div class="field-group">
        {entry.dragForm === 'parts' ? (
          <>
            <TextField {...{ mission, settings }} field="massKg" label="Mass" unit="kg" />
            <TextField {...{ mission, settings }} field="areaM2" label="Drag area" unit="m²" />
            <TextField {...{ mission, settings }} field="dragCoefficient" label="Drag coefficient" unit="" />
          </>
        ) : (
          <TextField {...{ mission, settings }} field="ballisticKgPerM2" label="m/(Cd·A)" unit="kg/m²" />
        )}
      </div>
      <Choice<DensityChoice>
        label="Density of the air"
        name="density"
        options={densities}
        value={entry.density}
        onChoose={(density) => mission.change({ density })}
      />
      {entry.density === 'factor' && (
        <div class="field-group">
          <TextField {...{ mission, settings }} field="densityFactor" label="Factor on the table" unit="" />
        </div>
      )}
    </>
  );
}

interface TextFieldProps extends PanelProps {
  readonly settings: MissionSettings;
  readonly field: MissionField;
  readonly label: string;
  readonly unit: string;
}

function TextField({ mission, settings, field, label, unit }: TextFieldProps) {
  const caution = settings.cautions[field];
  return (
    <NumberField
      label={label}
      unit={unit}
      text={settings.entry.texts[field]}
      error={settings.errors[field]}
      note={caution}
      noteIsCaution={caution !== undefined}
      onText={(text) => mission.change({ texts: { [field]: text } })}
    />
  );
}
