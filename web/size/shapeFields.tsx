/** The fields of the forms that type elements: shape, inclination, node. */
import { apsidesAt, readNumber } from '../../core/index';
import { steppedClock } from '../parts/stepping';
import { useApp } from '../state/appContext';
import { switchNodeForm } from '../state/entryActions';
import { EntryField } from './entryField';

export function ShapeFields() {
  const { document } = useApp();
  const { entry, body } = document.draft.value;
  const { form, lengthUnit, texts } = entry;
  return form === 'altitudes' ? (
    <>
      <EntryField
        field="perigeeAltitude"
        label={apsidesAt('Perigee altitude', { id: body })}
        unit={lengthUnit}
        stepSize={1}
        signed
        alongside={(text) => (isBelow(texts.apogeeAltitude, text) ? { apogeeAltitude: text } : {})}
      />
      <EntryField
        field="apogeeAltitude"
        label={apsidesAt('Apogee altitude', { id: body })}
        unit={lengthUnit}
        stepSize={1}
        signed
        alongside={(text) => (isBelow(text, texts.perigeeAltitude) ? { perigeeAltitude: text } : {})}
      />
    </>
  ) : (
    <>
      <EntryField field="semiMajorAxis" label="Semi-major axis" unit={lengthUnit} stepSize={1} />
      <EntryField field="eccentricity" label="Eccentricity" stepSize={0.0001} within={[0, 0.9999]} />
    </>
  );
}

/** A step that would pass the other apsis takes it along, so that a circle is raised by one finger. */
function isBelow(low: string, high: string): boolean {
  const [one, other] = [readNumber(low), readNumber(high)];
  return one.ok && other.ok && one.value < other.value;
}

export function InclinationField() {
  return <EntryField field="inclination" label="Inclination" unit="°" stepSize={0.01} within={[0, 180]} />;
}

/** Trade terms, short enough to stand as a label. */
const nodeLabels = {
  raan: 'RAAN',
  ltan: 'LTAN',
  ltdn: 'LTDN',
} as const;

export function NodeField() {
  const { document } = useApp();
  const { nodeForm } = document.draft.value.entry;
  const isAngle = nodeForm === 'raan';
  return (
    <EntryField
      field="node"
      label={nodeLabels[nodeForm]}
      labelControl={<NodeFormChoice />}
      unit={isAngle ? '°' : 'h'}
      signed={isAngle}
      keyboard={isAngle ? 'decimal' : 'text'}
      placeholder={isAngle ? '' : '10:30'}
      {...(isAngle ? { stepSize: 1 } : { step: steppedClock })}
    />
  );
}

function NodeFormChoice() {
  const { document } = useApp();
  const { draft } = document;
  const isEarth = draft.value.body === 'earth';
  return (
    <select
      class="label-select"
      aria-label="How the node is given"
      value={draft.value.entry.nodeForm}
      onChange={(event) => switchNodeForm(document, event.currentTarget.value as keyof typeof nodeLabels)}
    >
      {(Object.keys(nodeLabels) as (keyof typeof nodeLabels)[])
        .filter((form) => isEarth || form === 'raan')
        .map((form) => (
          <option key={form} value={form}>
            {nodeLabels[form]}
          </option>
        ))}
    </select>
  );
}

/** Perigee, anomaly: where in the plane. */
export function PlaceFields() {
  const { body } = useApp().document.draft.value;
  return (
    <>
      <EntryField field="perigee" label={apsidesAt('Argument of perigee', { id: body })} unit="°" stepSize={1} signed />
      <EntryField field="meanAnomaly" label="Mean anomaly" unit="°" stepSize={1} signed />
    </>
  );
}

export function EpochField() {
  return <EntryField field="epoch" label="Epoch, UTC" keyboard="text" placeholder="2028-01-01T12:00Z" />;
}
