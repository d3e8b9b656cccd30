/** The central body and its gravity set; a body of the user's own is typed in. */
import { type BodyId, bodies, bodyIds, type GravitySetId, gravitySetIds } from '../../core/index';
import { useApp } from '../state/appContext';
import { switchBody } from '../state/entryActions';
import { EntryField } from './entryField';

const bodyName = (id: BodyId): string => (id === 'custom' ? 'A body of your own' : bodies[id].name);

export function BodyFields() {
  const { document } = useApp();
  const { body, gravitySet } = document.draft.value;
  return (
    <>
      <Pick
        label="Central body"
        value={body}
        options={bodyIds.map((id) => ({ value: id, label: bodyName(id) }))}
        onPick={(id) => switchBody(document, id as BodyId)}
      />
      {body === 'earth' && (
        <Pick
          label="Gravity set"
          value={gravitySet}
          options={gravitySetIds.map((id) => ({ value: id, label: id.replace('WGS', 'WGS ') }))}
          onPick={(id) => document.setCandidate({ gravitySet: id as GravitySetId })}
        />
      )}
      {body === 'custom' && <CustomBodyFields />}
    </>
  );
}

/** What is said of the body where its fields are folded away. */
export function bodySummary(body: BodyId, gravitySet: GravitySetId): string {
  return body === 'earth' ? `Earth, ${gravitySet.replace('WGS', 'WGS ')}` : bodyName(body);
}

interface PickProps {
  readonly label: string;
  readonly value: string;
  readonly options: readonly { readonly value: string; readonly label: string }[];
  readonly onPick: (value: string) => void;
}

export function Pick({ label, value, options, onPick }: PickProps) {
  return (
    <label class="field field-row pick">
      <span class="field-label">{label}</span>
      <select value={value} onChange={(event) => onPick(event.currentTarget.value)}>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </label>
  );
}

function CustomBodyFields() {
  return (
    <>
      <EntryField field="bodyName" label="Name" keyboard="text" />
      <EntryField field="bodyMu" label="Gravity parameter μ" unit="km³/s²" />
      <EntryField field="bodyRadius" label="Equatorial radius" unit="km" />
      <EntryField field="bodyJ2" label="J2" signed />
      <EntryField field="bodyJ3" label="J3, if known" signed />
      <EntryField field="bodyJ4" label="J4, if known" signed />
      <EntryField field="bodyFlattening" label="Flattening, if known" />
      <EntryField field="bodyDay" label="Sidereal day, if known" unit="h" signed />
      <EntryField field="bodyYear" label="Year, if known" unit="d" />
    </>
  );
}
