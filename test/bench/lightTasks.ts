/** The second look, and the light and the events of ten years. */
import {
  bodies,
  integrateOrbit,
  lightHistory,
  type MeanElements,
  missionEvents,
  secularRates,
  stateFromMean,
} from '../../core/index';
import type { Task } from './measure';

const { earth } = bodies;
const epochJd = 2_461_193;

const low: MeanElements = {
  semiMajorAxisKm: 7000,
  eccentricity: 0.001,
  inclinationRad: 1.7079,
  nodeRad: 1,
  perigeeRad: 1.5,
  meanAnomalyRad: 0,
};

/** Ten years at the closed form's rates, every five days, as a history has them. */
function tenYears() {
  const rates = secularRates(earth, low, 'second');
  return Array.from({ length: 731 }, (_, index) => {
    const days = 5 * index;
    const timeS = 86_400 * days;
    const nodeRad = low.nodeRad + rates.nodeRadPerS * timeS;
    return { days, mean: { ...low, nodeRad, perigeeRad: low.perigeeRad + rates.perigeeRadPerS * timeS } };
  });
}

function secondLook(): number {
  const { samples } = integrateOrbit({
    body: earth,
    state: stateFromMean(earth, low),
    epochJd,
    spanDays: 30,
    forces: { zonalDegree: 14, sun: true, moon: true },
    sampleDays: 0.5,
  });
  return samples.at(-1)?.state.positionKm[0] ?? Number.NaN;
}

export function lightTasks(): readonly Task[] {
  const samples = tenYears();
  const light = lightHistory({ body: earth, epochJd, samples });
  const eclipses = () => {
    const found = lightHistory({ body: earth, epochJd, samples });
    return found.ok ? found.rows.reduce((sum, { umbraS }) => sum + umbraS, 0) : Number.NaN;
  };
  const box = { node: 'ascending', allowedMinutes: 15 } as const;
  const events = () => missionEvents({ body: earth, epochJd, samples, light, box }).events.length;
  return [
    { name: 'integrateOrbit, 30 days', calls: 1, run: secondLook },
    { name: 'lightHistory, 10 years', calls: 1, run: eclipses },
    { name: 'missionEvents, 10 years', calls: 1, run: events },
  ];
}

/** Most that one call may take, µs. */
export const lightLimits = [
  { name: 'integrateOrbit, 30 days', microseconds: 1_500_000 },
  { name: 'lightHistory, 10 years', microseconds: 300_000 },
  { name: 'missionEvents, 10 years', microseconds: 300_000 },
] as const;
