import { describe, expect, it } from 'vitest';
import { bodies, type Candidate, degPerRad, secondsPerDay } from '../../../core/index';
import { otherOrbits } from '../../../web/size/otherOrbits';
import { candidateWith } from './candidates';

const named = (name: string, candidate: Candidate): Candidate => ({ ...candidate, id: name, name });
const low = named('Low', candidateWith({ inclination: '51.6' }));
const synchronous = named('Sun', {
  ...candidateWith({ inclination: '60' }),
  conditions: [{ kind: 'sunSynchronous', settles: 'inclinationRad', texts: {} }],
});
const broken = named('Broken', candidateWith({ inclination: 'x' }));
const mars = named('Mars', { ...candidateWith({}), body: 'mars' });

describe('other saved orbits', () => {
  it('have their node rate with their conditions settled, around the same body only', () => {
    const found = otherOrbits([low, synchronous, mars], bodies.earth);
    expect(found.map(({ name }) => name)).toEqual(['Low', 'Sun']);
    const sun = found[1];
    const rate = sun?.kind === 'orbit' ? sun.nodeRadPerS * degPerRad * secondsPerDay : Number.NaN;
    expect(rate).toBeCloseTo(0.985647, 6);
  });

  it('that come to no orbit are listed as such', () => {
    expect(otherOrbits([broken], bodies.earth)).toEqual([{ kind: 'noOrbit', id: 'Broken', name: 'Broken' }]);
    expect(otherOrbits([broken], bodies.mars)).toEqual([]);
  });
});
