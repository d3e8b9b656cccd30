import { formatNumber } from '../numerics/numberWords';

export { formatNumber, formatSignificant } from '../numerics/numberWords';

/**
 * Quantities, the units people read them in, and how their numbers are written.
 *
 * The screen, the sheet and the exports all write numbers through this file, so they cannot
 * disagree. A value times `perCore` is the number in that unit.
 */
export interface DisplayUnit {
  readonly id: string;
  /** Written after the number; empty for a bare number. */
  readonly symbol: string;
  readonly perCore: number;
  readonly digits: number;
}

const degPerRad = 180 / Math.PI;
const dayS = 86_400;
/** Rates are written for years of 365.25 days, the Julian year of the trade. */
const yearDays = 365.25;
/** The international nautical mile. */
export const kmPerNauticalMile = 1.852;

const unit = (symbol: string, perCore: number, digits: number, id = symbol): DisplayUnit => ({
  id,
  symbol,
  perCore,
  digits,
});

/** Each quantity's units; the first is the one shown unless the user switches. Core units in brackets. */
export const displayUnits = {
  /** (km) */
  length: [unit('km', 1, 3), unit('NM', 1 / kmPerNauticalMile, 3)],
  /** (rad) */
  angle: [unit('deg', degPerRad, 4)],
  /** (rad) a small angle, such as the node's drift in one revolution */
  smallAngle: [unit('deg', degPerRad, 6)],
  /** (rad/s) */
  angleRate: [unit('deg/day', degPerRad * dayS, 6), unit('deg/yr', degPerRad * dayS * yearDays, 3)],
  /** (s) */
  duration: [unit('min', 1 / 60, 4), unit('s', 1, 3), unit('h', 1 / 3600, 6)],
  /** (s) */
  longDuration: [unit('d', 1 / dayS, 2), unit('yr', 1 / (dayS * yearDays), 4)],
  /** (s/s) the drift of local time */
  localTimeDrift: [unit('min/yr', (dayS * yearDays) / 60, 3), unit('s/day', dayS, 4)],
  /** (km/s) */
  speed: [unit('km/s', 1, 5), unit('m/s', 1000, 2)],
  /** (rev per day of either kind) */
  revolutions: [unit('rev/day', 1, 6)],
  /** (1) */
  ratio: [unit('', 1, 6, 'ratio')],
  /** (h) 0 to 24; written as a clock */
  localTime: [unit('', 1, 0, 'clock')],
} as const satisfies Readonly<Record<string, readonly [DisplayUnit, ...DisplayUnit[]]>>;

export type Quantity = keyof typeof displayUnits;

/** Quantities whose sign means a direction, so that a plus is written too. */
export const signedQuantities: ReadonlySet<Quantity> = new Set(['smallAngle', 'angleRate', 'localTimeDrift']);

/** The unit with that id where the quantity has it, else the first. */
export function unitOf(quantity: Quantity, unitId?: string): DisplayUnit {
  const units: readonly DisplayUnit[] = displayUnits[quantity];
  return units.find(({ id }) => id === unitId) ?? displayUnits[quantity][0];
}

/** Hours as hh:mm:ss, rounded to the second, 24 h wrapping to 0. */
export function formatClock(hours: number): string {
  if (!Number.isFinite(hours)) return '–';
  const total = ((Math.round(hours * 3600) % dayS) + dayS) % dayS;
  const parts = [Math.floor(total / 3600), Math.floor(total / 60) % 60, total % 60];
  return parts.map((part) => String(part).padStart(2, '0')).join(':');
}

/** 1000 years: a longer time for perigee to go round has no digits worth writing. */
const longestS = 1000 * yearDays * dayS;

/** The number of a quantity in a unit, without the unit's symbol. */
export function formatQuantity(quantity: Quantity, value: number, unitId?: string): string {
  if (quantity === 'localTime') return formatClock(value);
  const { perCore, digits } = unitOf(quantity, unitId);
  if (quantity === 'longDuration' && value > longestS) {
    return `over ${formatNumber(longestS * perCore, { digits: 0 })}`;
  }
  return formatNumber(value * perCore, { digits, plus: signedQuantities.has(quantity) });
}
