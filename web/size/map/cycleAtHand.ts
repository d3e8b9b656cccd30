/** The cycle that the pictures are of: the one the candidate holds, else the one its track nearly closes. */
import {
  type Candidate,
  type Cycle,
  conditionEntry,
  type NearestRepeat,
  type RepeatProblem,
  type ResolvedOrbit,
  readCycle,
  readNumber,
} from '../../../core/index';
import { nearestCycles } from '../tracks/nearestCycles';

export interface CycleAtHand {
  readonly ok: true;
  readonly cycle: Cycle;
  /** What of a is missing for the track to close: null where a condition closes it. */
  readonly nearest: NearestRepeat | null;
}

/** A change of a that track keeping would hardly notice. */
const smallChangeKm = 1;

export function cycleAtHand(
  orbit: ResolvedOrbit,
  { conditions }: Pick<Candidate, 'conditions'>,
  isStale: boolean,
): CycleAtHand | RepeatProblem {
  const entries = conditions.map(conditionEntry);
  const held = isStale ? null : heldCycle(entries);
  if (held) return { ok: true, cycle: held, nearest: null };
  const result = nearestCycles(
    orbit,
    entries.some((entry) => entry?.kind === 'sunSynchronous'),
  );
  if (!result.ok) return result;
  // By rising days and falling change: the shortest that is near enough, else the nearest.
  const near = result.repeats.find(({ axisChangeKm }) => Math.abs(axisChangeKm) < smallChangeKm);
  const nearest = near ?? result.repeats.at(-1);
  if (!nearest) {
    return { ok: false, reason: 'belowSurface', field: 'body', message: 'No repeat track of 60 days or less is near.' };
  }
  return { ok: true, cycle: { revolutions: nearest.revolutions, days: nearest.days }, nearest };
}

function heldCycle(entries: readonly ReturnType<typeof conditionEntry>[]): Cycle | null {
  const texts = entries.find((entry) => entry?.kind === 'repeat')?.texts;
  if (!texts) return null;
  const number = (text = '') => {
    const read = readNumber(text);
    return read.ok ? read.value : Number.NaN;
  };
  const read = readCycle({ revolutions: number(texts.revolutions), days: number(texts.days) });
  return read.ok ? read.cycle : null;
}
