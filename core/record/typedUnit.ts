/** A unit typed behind a number: taken where it can mean one thing only in this field. */

/** Units of one kind in terms of each other; "nm" may be nautical miles or nanometres and is not taken. */
const kinds: readonly Readonly<Record<string, number>>[] = [
  { km: 1, m: 1e-3, NM: 1.852, nmi: 1.852 },
  { 'km/s': 1, 'm/s': 1e-3 },
  { '°': 1, deg: 1, degree: 1, degrees: 1 },
  { h: 1 },
  { d: 1, days: 1 },
  { 'km³/s²': 1, 'km^3/s^2': 1, 'km3/s2': 1 },
];

export interface UnitTyped {
  /** The number without its unit. */
  readonly number: string;
  /** As typed; null where there is none. */
  readonly unit: string | null;
  /** Times the number as typed gives the number in the unit of the field. */
  readonly factor: number;
}

/** Texts with a unit that does not belong to the field are left as they are. */
export function typedUnit(text: string, fieldUnit: string | undefined): UnitTyped {
  const plain: UnitTyped = { number: text, unit: null, factor: 1 };
  const kind = fieldUnit === undefined ? undefined : kinds.find((units) => Object.hasOwn(units, fieldUnit));
  if (kind === undefined || fieldUnit === undefined) return plain;
  const units = Object.keys(kind).sort((one, other) => other.length - one.length);
  const unit = units.find((each) => text.endsWith(each) && /[\d.,]\s*$/.test(text.slice(0, -each.length)));
  if (unit === undefined) return plain;
  const factor = (kind[unit] ?? 1) / (kind[fieldUnit] ?? 1);
  return { number: text.slice(0, -unit.length).trim(), unit, factor };
}
