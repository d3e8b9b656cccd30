/** Orbits in drag, integrated with odex: how far a falls in a span, and when the orbit ends. */
import { atmosphereLayers, gravitySets, type MeanElements, stateFromMean } from '../../../core/index';
import { equationsOfMotion, type TruthDrag, truthHeightKm } from './fullField';
import { carried, osculating, type TruthSetting, windowed } from './windowedElements';

const earth = gravitySets.EGM2008;
const secondsPerDay = 86_400;

/** Constants are shared with `core`; the formula is written out again. */
function density(heightKm: number): number {
  const layer = atmosphereLayers.findLast(([base]) => base <= heightKm) ?? atmosphereLayers[0];
  if (!layer) throw new Error('an atmosphere has layers');
  return layer[1] * Math.exp((layer[0] - heightKm) / layer[2]);
}

export interface DragTruth {
  /** Averages of the osculating a (km) over the first and the last twelve revolutions, and when (days, mid-window). */
  readonly first: { readonly days: number; readonly semiMajorAxisKm: number };
  readonly last: { readonly days: number; readonly semiMajorAxisKm: number } | null;
  /** When the height fell below the floor; null if it did not within the span. */
  readonly decayDays: number | null;
}

export interface DragCase {
  readonly mean: MeanElements;
  readonly ballisticKgPerM2: number;
  readonly zonalDegree: number;
}

function settingOf({ ballisticKgPerM2, zonalDegree }: DragCase): TruthSetting & { readonly drag: TruthDrag } {
  const drag: TruthDrag = {
    density,
    dragPerMass: 1 / ballisticKgPerM2,
    rotationRadPerS: 7.292115e-5,
    equatorialRadiusKm: earth.equatorialRadiusKm,
    flattening: earth.flattening,
  };
  const motion = equationsOfMotion({ zonals: earth, degree: zonalDegree, sky: null, drag });
  return { motion, muKm3PerS2: earth.muKm3PerS2, relativeTolerance: 1e-10, drag };
}

export function dragStart({ mean }: DragCase): readonly number[] {
  const { positionKm, velocityKmPerS } = stateFromMean(earth, mean);
  return [...positionKm, ...velocityKmPerS];
}

/** Twelve revolutions at both ends of `spanDays`, or to the moment when the height falls below `floorKm`. */
export function dragTruth(test: DragCase, spanDays: number, floorKm: number): DragTruth {
  const setting = settingOf(test);
  const windowS = 12 * 2 * Math.PI * Math.sqrt(test.mean.semiMajorAxisKm ** 3 / earth.muKm3PerS2);
  const first = windowed(setting, dragStart(test), 0, windowS);
  let state = first.state;
  let timeS = windowS;
  const lastFromS = spanDays * secondsPerDay - windowS;
  while (timeS < lastFromS) {
    // Long strides high up; where the end may come, a fraction of a revolution.
    const o = osculating(earth.muKm3PerS2, state);
    const perigeeKm = o.semiMajorAxisKm * (1 - Math.hypot(o.eCosine, o.eSine)) - earth.equatorialRadiusKm;
    const nextS = Math.min(lastFromS, timeS + (perigeeKm > 190 ? 0.5 * secondsPerDay : 120));
    state = carried(setting, state, timeS, nextS);
    timeS = nextS;
    const [x = 0, y = 0, z = 0] = state;
    if (truthHeightKm(earth, x, y, z) < floorKm) {
      return { first: first.elements, last: null, decayDays: timeS / secondsPerDay };
    }
  }
  return { first: first.elements, last: windowed(setting, state, timeS, timeS + windowS).elements, decayDays: null };
}
