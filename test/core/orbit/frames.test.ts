import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { wrapPi } from '../../../core/numerics/angles';
import { cross, norm } from '../../../core/numerics/vectors';
import type { MeanElements, StateVector } from '../../../core/orbit/elements';
import {
  elementsFromMeanOfDate,
  elementsToMeanOfDate,
  type StateFrame,
  stateFromMeanOfDate,
  stateToMeanOfDate,
} from '../../../core/orbit/frames';
import { stateFromElements } from '../../../core/orbit/state';

const component = (limit: number) => fc.double({ min: -limit, max: limit, noNaN: true });
const anyState: fc.Arbitrary<StateVector> = fc.record({
  positionKm: fc.tuple(component(42000), component(42000), component(42000)),
  velocityKmPerS: fc.tuple(component(10), component(10), component(10)),
});
const anyJd = fc.double({ min: 2433282.5, max: 2488434.5, noNaN: true });
const anyFrame = fc.constantFrom<StateFrame>('meanOfDate', 'j2000', 'teme', 'earthFixed');
const angle = fc.double({ min: 0, max: 6.28, noNaN: true });

const mu = 398600.4415;

function gap(a: readonly number[], b: readonly number[]): number {
  return Math.max(...a.map((value, index) => Math.abs(value - (b[index] ?? Number.NaN))));
}

describe('states', () => {
  it('return from every frame within a micrometre and a nanometre a second', () => {
    fc.assert(
      fc.property(anyState, anyFrame, anyJd, (state, frame, epochJd) => {
        const back = stateFromMeanOfDate(stateToMeanOfDate(state, { frame, epochJd }), { frame, epochJd });
        expect(gap(back.positionKm, state.positionKm)).toBeLessThan(1e-9);
        expect(gap(back.velocityKmPerS, state.velocityKmPerS)).toBeLessThan(1e-12);
      }),
    );
  });

  it('at rest on the turning Earth move eastwards at 0.465 km/s at the equator', () => {
    const resting: StateVector = { positionKm: [6378.137, 0, 0], velocityKmPerS: [0, 0, 0] };
    const { positionKm, velocityKmPerS } = stateToMeanOfDate(resting, { frame: 'earthFixed', epochJd: 2461000.25 });
    expect(norm(velocityKmPerS)).toBeCloseTo(0.4651011, 6);
    expect(cross(positionKm, velocityKmPerS)[2]).toBeGreaterThan(0);
  });

  it('given as TEME are taken as mean of date', () => {
    const state: StateVector = { positionKm: [7000, 1, 2], velocityKmPerS: [0, 7, 1] };
    expect(stateToMeanOfDate(state, { frame: 'teme', epochJd: 2461000 })).toEqual(state);
  });
});

describe('elements', () => {
  const anyElements: fc.Arbitrary<MeanElements> = fc.record({
    semiMajorAxisKm: fc.double({ min: 6600, max: 42000, noNaN: true }),
    eccentricity: fc.double({ min: 1e-3, max: 0.7, noNaN: true }),
    inclinationRad: fc.double({ min: 0.02, max: 3.12, noNaN: true }),
    nodeRad: angle,
    perigeeRad: angle,
    meanAnomalyRad: angle,
  });

  it('precess as the state made from them does', () => {
    fc.assert(
      fc.property(anyElements, anyJd, (elements, epochJd) => {
        const viaElements = stateFromElements(mu, elementsToMeanOfDate(elements, 'j2000', epochJd));
        const viaState = stateToMeanOfDate(stateFromElements(mu, elements), { frame: 'j2000', epochJd });
        expect(gap(viaElements.positionKm, viaState.positionKm)).toBeLessThan(1e-6);
        expect(gap(viaElements.velocityKmPerS, viaState.velocityKmPerS)).toBeLessThan(1e-9);
      }),
    );
  });

  it('return from J2000 as they were', () => {
    fc.assert(
      fc.property(anyElements, anyJd, (elements, epochJd) => {
        const back = elementsFromMeanOfDate(elementsToMeanOfDate(elements, 'j2000', epochJd), 'j2000', epochJd);
        expect(back.inclinationRad).toBeCloseTo(elements.inclinationRad, 10);
        expect(wrapPi(back.nodeRad - elements.nodeRad)).toBeCloseTo(0, 10);
        expect(wrapPi(back.perigeeRad - elements.perigeeRad)).toBeCloseTo(0, 10);
      }),
    );
  });

  it.each([0, Math.PI])('precess as the state does in the plane of the equator, i = %d rad', (inclinationRad) => {
    const flat: MeanElements = {
      semiMajorAxisKm: 42164,
      eccentricity: 0,
      inclinationRad,
      nodeRad: 0,
      perigeeRad: 0,
      meanAnomalyRad: 2,
    };
    const turned = elementsToMeanOfDate(flat, 'j2000', 2461000.5);
    const viaState = stateToMeanOfDate(stateFromElements(mu, flat), { frame: 'j2000', epochJd: 2461000.5 });
    expect(turned.perigeeRad).toBe(0);
    expect(gap(stateFromElements(mu, turned).positionKm, viaState.positionKm)).toBeLessThan(1e-6);
  });

  it('keep their kind, and stay as they are when given in the mean equator of date or TEME', () => {
    const elements = {
      kind: 'osculating' as const,
      semiMajorAxisKm: 7000,
      eccentricity: 0.01,
      inclinationRad: 1.7,
      nodeRad: 1,
      perigeeRad: 2,
      meanAnomalyRad: 3,
    };
    expect(elementsToMeanOfDate(elements, 'j2000', 2461000).kind).toBe('osculating');
    expect(elementsToMeanOfDate(elements, 'teme', 2461000)).toEqual(elements);
    expect(elementsFromMeanOfDate(elements, 'meanOfDate', 2461000)).toEqual(elements);
  });
});
