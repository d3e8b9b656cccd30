/**
 * In which order the tracks of a repeat cycle fill the equator.
 *
 * N crossings lie evenly, one spacing of 360°/N apart. Each revolution steps D spacings: west, as a rule, since the ground
 * turns east under the orbit. After d nodal days some pass lies d·N mod D spacings east of the first; everything else
 * follows from that. Whole-number arithmetic throughout. Source: Vallado, Fundamentals of Astrodynamics and Applications,
 * 4th ed., section 11.4.2 (from memory).
 */
import type { Body } from '../bodies/body';
import { twoPi, wrapPi } from '../numerics/angles';
import { commonDivisor, inverseModulo, remainder } from '../numerics/integers';
import type { MeanElements, Theory } from '../orbit/elements';
import { secularRates } from '../orbit/secularRates';
import type { Cycle } from './closingOrbit';

/** Which way an ascending crossing lies from the one before: east where body or node turn the other way. */
export type TrackStep = 'west' | 'east';

/** Which way the tracks of an orbit (mean elements, km, rad) step; null for a body without a known rotation. */
export function trackStepOf(body: Body, mean: MeanElements, theory: Theory): TrackStep | null {
  if (body.rotationRadPerS === null) return null;
  return body.rotationRadPerS >= secularRates(body, mean, theory).nodeRadPerS ? 'west' : 'east';
}

export interface SubCycle {
  /** Nodal days. */
  readonly days: number;
  /** How far east of the first track the nearest one then lies, in spacings; negative west, 0 at the end of the cycle. */
  readonly eastSpacings: number;
}

export interface Neighbour {
  /** Pass of the cycle, counted from 0, and the nodal days from the first pass to it. */
  readonly pass: number;
  readonly afterDays: number;
  /** The same to the whole day: a revolution's share of a day off at most. */
  readonly wholeDays: number;
}

export interface TrackPattern {
  readonly revolutionsADay: number;
  /** Between neighbouring ascending crossings, rad of longitude. */
  readonly spacingRad: number;
  /** From one ascending crossing to the next, rad of longitude, east positive. */
  readonly stepRad: number;
  readonly eastNeighbour: Neighbour;
  readonly westNeighbour: Neighbour;
  /** Days after which a track passes nearer to the first than any did before; ends with the cycle itself. */
  readonly subCycles: readonly SubCycle[];
  /** The D slots of one step, eastward from its western end: the day (from 0) that flies each. */
  readonly dayOfSlot: readonly number[];
}

/**
 * Pattern of a cycle with coprime N and D.
 *
 * @throws Error where N or D is not a whole number ≥ 1, or they have a common divisor (see `readCycle`).
 */
export function trackPattern(cycle: Cycle, tracksStep: TrackStep = 'west'): TrackPattern {
  requireCoprime(cycle);
  const { revolutions, days } = cycle;
  const east = tracksStep === 'west' ? 1 : -1;
  // d·N ≡ 1 (mod D), d from 1 to D.
  const ahead = inverseModulo(revolutions, days) || days;
  const leading = neighbour(cycle, ahead, (ahead * revolutions - 1) / days);
  const trailing = neighbour(cycle, days - ahead, ((days - ahead) * revolutions + 1) / days);
  return {
    revolutionsADay: revolutions / days,
    spacingRad: twoPi / revolutions,
    stepRad: (-east * twoPi * days) / revolutions,
    eastNeighbour: east > 0 ? leading : trailing,
    westNeighbour: east > 0 ? trailing : leading,
    subCycles: subCycles(cycle, east),
    dayOfSlot: dayOfSlot(cycle, east),
  };
}

function requireCoprime({ revolutions, days }: Cycle): void {
  const whole = Number.isInteger(revolutions) && Number.isInteger(days) && revolutions >= 1 && days >= 1;
  if (!whole || commonDivisor(revolutions, days) !== 1) {
    throw new Error(`a cycle of coprime whole numbers was expected, got ${revolutions} revolutions in ${days} days`);
  }
}

function neighbour({ revolutions, days }: Cycle, wholeDays: number, pass: number): Neighbour {
  // A single track is its own neighbour, a whole cycle later.
  if (pass === 0) return { pass: revolutions, afterDays: days, wholeDays: days };
  return { pass, afterDays: (pass * days) / revolutions, wholeDays };
}

function subCycles({ revolutions, days }: Cycle, east: number): readonly SubCycle[] {
  const found: SubCycle[] = [];
  let nearest = Number.POSITIVE_INFINITY;
  for (let day = 1; day <= days; day += 1) {
    const ahead = remainder(day * revolutions, days);
    const shift = 2 * ahead > days ? ahead - days : ahead;
    // Orbits slower than a revolution a day: the first pass has no later one near this day.
    if (day * revolutions - shift < days) continue;
    if (Math.abs(shift) >= nearest) continue;
    nearest = Math.abs(shift);
    // Adding 0 turns −0 into 0.
    found.push({ days: day, eastSpacings: east * shift + 0 });
  }
  return found;
}

/** Slot 0 is the first pass; where tracks step west its step is the one that lies east of it, filled day by day. */
function dayOfSlot({ revolutions, days }: Cycle, east: number): readonly number[] {
  const order = new Array<number>(days).fill(0);
  for (let day = 0; day < days; day += 1) order[remainder(east * day * revolutions, days)] = day;
  return order;
}

export interface EquatorCrossing {
  /** Revolution of the cycle, counted from 0. */
  readonly pass: number;
  /** Nodal day of the cycle, counted from 1. */
  readonly day: number;
  readonly node: 'ascending' | 'descending';
  /** East longitude, body-fixed, rad in [−π, π). */
  readonly longitudeRad: number;
}

export interface CrossingOptions {
  readonly tracksStep?: TrackStep;
  /** East longitude of the first ascending crossing, rad. */
  readonly firstLongitudeRad?: number;
  /** Share of the nodal period from an ascending to the next descending crossing: ½ for a circular orbit. */
  readonly descendingShare?: number;
}

/** The 2N equator crossings of one cycle in the order in which they are flown. Errors as `trackPattern`. */
export function equatorCrossings(cycle: Cycle, options: CrossingOptions = {}): readonly EquatorCrossing[] {
  requireCoprime(cycle);
  const { tracksStep = 'west', firstLongitudeRad = 0, descendingShare = 0.5 } = options;
  const { revolutions, days } = cycle;
  const east = tracksStep === 'west' ? 1 : -1;
  const halfway = Math.PI - (east * descendingShare * twoPi * days) / revolutions;
  return Array.from({ length: revolutions }, (_, pass): EquatorCrossing[] => {
    const spacings = remainder(-east * pass * days, revolutions);
    const ascendingRad = firstLongitudeRad + (twoPi * spacings) / revolutions;
    const dayAt = (passed: number) => Math.floor((passed * days) / revolutions) + 1;
    return [
      { pass, day: dayAt(pass), node: 'ascending', longitudeRad: wrapPi(ascendingRad) },
      {
        pass,
        day: dayAt(pass + descendingShare),
        node: 'descending',
        longitudeRad: wrapPi(ascendingRad + halfway),
      },
    ];
  }).flat();
}
