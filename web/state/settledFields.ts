/** Which fields of the form a condition settles, and the text each shows in place of what was typed. */
import { entryFromOrbit, type FieldId, type OrbitEntry, type SettledElement, type Settlement } from '../../core/index';

const fieldsOf: Readonly<Record<SettledElement, readonly FieldId[]>> = {
  semiMajorAxisKm: ['semiMajorAxis', 'perigeeAltitude', 'apogeeAltitude'],
  eccentricity: ['eccentricity', 'perigeeAltitude', 'apogeeAltitude'],
  inclinationRad: ['inclination'],
};

export type SettledFields = Partial<Record<FieldId, string>>;

/** Empty where nothing is settled, or where the form has no fields for elements. */
export function settledFields(settlement: Settlement | null, { form, texts: _, ...tags }: OrbitEntry): SettledFields {
  if (!settlement?.ok || (form !== 'altitudes' && form !== 'elements')) return {};
  const written = entryFromOrbit(settlement.orbit, form, tags);
  if (!written.ok) return {};
  const freezesPerigee = settlement.conditions.some(({ entry }) => entry?.kind === 'frozen');
  const fields = [
    ...settlement.settled.flatMap((element) => fieldsOf[element]),
    ...(freezesPerigee ? ['perigee' as const] : []),
  ];
  return Object.fromEntries(
    fields.flatMap((field) => (written.texts[field] === undefined ? [] : [[field, written.texts[field]]])),
  );
}
