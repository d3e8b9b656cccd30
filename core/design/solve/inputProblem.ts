import { quotedNumber } from '../../numerics/numberWords';
import type { MeanElements, Theory } from '../../orbit/elements';
import { type NoOrbit, noOrbit } from './answer';
import { type FreeElement, freeElements } from './problem';

interface Asked {
  readonly theory: Theory;
  readonly start: MeanElements;
  readonly free: readonly FreeElement[];
  readonly conditions: readonly unknown[];
}

/** What is wrong with the question apart from its conditions; elements that are free may be anything. */
export function inputProblem({ theory, start, free, conditions }: Asked): NoOrbit | null {
  const unknown = free.find((element) => !freeElements.includes(element));
  const known = freeElements.join(', ');
  if (unknown !== undefined) return noOrbit('badInput', `${String(unknown)} cannot be freed; these can: ${known}.`);
  if (new Set(free).size < free.length) return noOrbit('badInput', 'An element is named as free twice.');
  if (free.length === 0)
    return noOrbit('badInput', `No element is free: free as many of ${known} as there are conditions.`);
  if (conditions.length === 0) return noOrbit('tooFew', 'No condition is stated: state one for each free element.');
  if (theory !== 'first' && theory !== 'second') {
    return noOrbit('badInput', `The theory has to be first or second, but it is ${String(theory)}.`);
  }
  if (start.kind !== undefined && start.kind !== 'mean') {
    return noOrbit('badInput', `Conditions are solved in mean elements, but the start is ${String(start.kind)}.`);
  }
  const bad = free.includes('semiMajorAxisKm') ? null : badAxis(start.semiMajorAxisKm);
  const text = bad ?? badHeld(start, free);
  return text === null ? null : noOrbit('badInput', text);
}

function badAxis(semiMajorAxisKm: number): string | null {
  if (semiMajorAxisKm > 0 && semiMajorAxisKm < Infinity) return null;
  return `The held semi-major axis has to be more than 0 km, but it is ${quotedNumber(semiMajorAxisKm)}.`;
}

function badHeld({ eccentricity: e, inclinationRad: i }: MeanElements, free: readonly FreeElement[]): string | null {
  if (!free.includes('eccentricity') && !(e >= 0 && e < 1)) {
    return `The held eccentricity has to be from 0 to below 1, but it is ${quotedNumber(e)}.`;
  }
  if (!free.includes('inclinationRad') && !(i >= 0 && i <= Math.PI)) {
    return `The held inclination has to be from 0 to π rad, but it is ${quotedNumber(i)}.`;
  }
  return null;
}
