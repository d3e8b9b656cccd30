/** How the rates of one orbit shape depend on its inclination: the curves behind "what if it were steeper?". */
import type { Body } from '../bodies/body';
import type { MeanElements, Theory } from './elements';
import { secularRates } from './secularRates';

export interface RateCurves {
  readonly inclinationRad: Float64Array;
  readonly nodeRadPerS: Float64Array;
  readonly perigeeRadPerS: Float64Array;
}

/** Rates (rad/s) at `samples` inclinations from 0 to 180°, a and e held. Errors as `secularRates`. */
export function ratesOverInclination(body: Body, mean: MeanElements, theory: Theory, samples: number): RateCurves {
  const inclinationRad = Float64Array.from({ length: samples }, (_, k) => (Math.PI * k) / (samples - 1));
  const nodeRadPerS = new Float64Array(samples);
  const perigeeRadPerS = new Float64Array(samples);
  inclinationRad.forEach((inclination, k) => {
    const rates = secularRates(body, { ...mean, inclinationRad: inclination }, theory);
    nodeRadPerS[k] = rates.nodeRadPerS;
    perigeeRadPerS[k] = rates.perigeeRadPerS;
  });
  return { inclinationRad, nodeRadPerS, perigeeRadPerS };
}
