import type { Body } from '../../bodies/body';
import type { MeanElements, StateVector } from '../../orbit/elements';
import { stateToMeanOfDate } from '../../orbit/frames';
import { tryMeanFromState } from '../../orbit/meanState';
import type { OrbitEntry } from '../candidate';
import type { FieldReader } from '../readFields';

export const stateFieldIds = ['x', 'y', 'z', 'vx', 'vy', 'vz'] as const;

/** Mean elements of the state typed; messages about the state as a whole stand at `x`. */
export function readState(
  entry: OrbitEntry,
  body: Body | null,
  epochJd: number | null | undefined,
  reader: FieldReader,
): MeanElements | null {
  const typed = readSixNumbers(entry, reader);
  if (typed === null || body === null || epochJd === undefined) return null;
  const state = inWorkingFrame(typed, entry, epochJd);
  if (state === null) return null;
  const result = tryMeanFromState(body, state);
  if (result.ok) return result.mean;
  return reader.fail('x', `${stateProblem(result.reason, result.message)}${unitHint(entry, typed)}`);
}

function readSixNumbers(entry: OrbitEntry, reader: FieldReader): StateVector | null {
  const perUnit = entry.stateUnit === 'm' ? 1e-3 : 1;
  const numbers = stateFieldIds.map((field, index) => {
    const unit = index < 3 ? entry.stateUnit : `${entry.stateUnit}/s`;
    const value = reader.number({
      field,
      label: index < 3 ? `Position ${field}` : `Velocity ${field.slice(1)}`,
      unit,
      expected: `a number in ${unit}`,
    });
    return value === null ? null : value * perUnit;
  });
  const [x, y, z, vx, vy, vz] = numbers;
  if (x == null || y == null || z == null || vx == null || vy == null || vz == null) return null;
  return { positionKm: [x, y, z], velocityKmPerS: [vx, vy, vz] };
}

/** Frames of date need no epoch; the others have a message at the epoch where it is absent. */
function inWorkingFrame(state: StateVector, { frame }: OrbitEntry, epochJd: number | null): StateVector | null {
  if (epochJd !== null) return stateToMeanOfDate(state, { frame, epochJd });
  return frame === 'meanOfDate' || frame === 'teme' ? state : null;
}

function stateProblem(reason: string, message: string): string {
  if (reason === 'zero')
    return 'Position or velocity is zero; expected six numbers of an orbit that goes around the body.';
  if (reason === 'rectilinear') {
    return 'Position and velocity point along one line; expected an orbit that goes around the body, so check for a component in the wrong field.';
  }
  if (reason === 'hyperbolic') {
    return `This state does not close into an orbit: ${message}. Expected a speed below that.`;
  }
  return `The state does not convert to mean elements: ${message}. Expected an orbit clear of the body, where J2 is a small correction.`;
}

/** A mix-up of metres and kilometres is the usual cause of a state that is no orbit. */
function unitHint(entry: OrbitEntry, { positionKm }: StateVector): string {
  const distance = Math.hypot(...positionKm);
  if (entry.stateUnit === 'km' && distance > 2e6) return ' The numbers look like metres: check the unit.';
  if (entry.stateUnit === 'm' && distance < 100) return ' The numbers look like kilometres: check the unit.';
  return '';
}
