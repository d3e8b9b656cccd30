/** Searches for repeat tracks: every Sun-synchronous one of low orbit. */
import { gravitySets, nearestRepeats, repeatTracks } from '../../core/index';
import type { Task } from './measure';

const band = {
  body: gravitySets.EGM2008,
  theory: 'second',
  eccentricity: 0.001,
  inclination: { kind: 'sunSynchronous' },
  minAltitudeKm: 300,
  maxAltitudeKm: 1500,
} as const;

const mean = {
  semiMajorAxisKm: 7166,
  eccentricity: 0.001,
  inclinationRad: 1.72,
  nodeRad: 0,
  perigeeRad: 0,
  meanAnomalyRad: 0,
};

export function repeatTasks(): readonly Task[] {
  const search = (maxDays: number): Task => ({
    name: `repeatTracks, ${maxDays} days`,
    calls: 1,
    run: () => repeatTracks({ ...band, maxDays }).length,
  });
  const nearest = () => {
    const result = nearestRepeats({ ...band, mean, keep: 'sunSynchronous', maxDays: 60 });
    return result.ok ? result.repeats.length : Number.NaN;
  };
  return [search(60), search(400), { name: 'nearestRepeats, 60 days', calls: 1, run: nearest }];
}

/** Most that one search may take, µs: a list of two months at once, one of 400 days in a worker with its progress shown. */
export const repeatLimits = [
  { name: 'repeatTracks, 60 days', microseconds: 40_000 },
  { name: 'repeatTracks, 400 days', microseconds: 3_000_000 },
] as const;
