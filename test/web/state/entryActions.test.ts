import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Candidate, type EntryForm, type MeanElements, type OrbitEntry, wrapPi } from '../../../core/index';
import type { OrbitDocument } from '../../../web/state/document';
import {
  switchBody,
  switchForm,
  switchLengthUnit,
  switchNodeForm,
  takeElements,
  takePaste,
  typeTwoLine,
} from '../../../web/state/entryActions';
import { twoLineSets, withChecksum } from '../../external/twoLineSets';
import { candidateOf, documentOf, orbitOf, textsOf } from './support';

const line1 = withChecksum('1 70001U 27001A   27080.43750000  .00016717  00000-0  10270-3 0    9');
const line2 = withChecksum('2 70001  97.6790 208.9163 0011650  90.0000 270.0000 14.57107008   12');
const set = `${line1}\n${line2}`;

const epoch = '2028-01-01T00:00:00Z';
const slanted = {
  epoch,
  perigeeAltitude: '561',
  apogeeAltitude: '775',
  inclination: '97.68',
  node: '40',
  perigee: '90',
  meanAnomaly: '30',
};

/** What the texts of a form hold, by how entries are written: lengths to 0.1 m, angles to 1e-6°, the node to 7.5e-6°. */
const written = { semiMajorAxisKm: 1e-4, eccentricity: 2e-8, rad: 2e-8, nodeRad: 1.4e-7 };

/** Each of several rewritings may move the orbit by what its texts hold. */
function expectSameOrbit(document: OrbitDocument, before: MeanElements, rewritings = 1): void {
  expect(document.stale.value).toBe(false);
  const { mean } = orbitOf(document);
  const expectNear = (one: number, other: number, tolerance: number) =>
    expect(Math.abs(one - other)).toBeLessThanOrEqual(tolerance * rewritings);
  expectNear(mean.semiMajorAxisKm, before.semiMajorAxisKm, written.semiMajorAxisKm);
  expectNear(mean.eccentricity, before.eccentricity, written.eccentricity);
  expectNear(mean.inclinationRad, before.inclinationRad, written.rad);
  expectNear(wrapPi(mean.nodeRad - before.nodeRad), 0, written.nodeRad);
  // Ends of the line of apsides are told by the altitudes: 0.1 m of them over a e of 100 km or less.
  expectNear(wrapPi(mean.perigeeRad - before.perigeeRad), 0, 5e-6);
  expectNear(wrapPi(mean.meanAnomalyRad - before.meanAnomalyRad), 0, 5e-6);
}

const entryOf = (document: OrbitDocument): OrbitEntry => document.draft.value.entry;

describe('switching the form', () => {
  it('keeps the orbit through any row of forms that hold one', () => {
    const forms = fc.array(fc.constantFrom<EntryForm>('altitudes', 'elements', 'state'), {
      minLength: 1,
      maxLength: 6,
    });
    fc.assert(
      fc.property(forms, fc.constantFrom('mean' as const, 'osculating' as const), (row, elementsAre) => {
        const document = documentOf(candidateOf(slanted, { elementsAre }));
        const before = orbitOf(document).mean;
        const letters = document.fingerprint.value;
        for (const form of row) switchForm(document, form);
        expect(entryOf(document).form).toBe(row.at(-1));
        expectSameOrbit(document, before, row.length);
        expect(document.fingerprint.value).toBe(letters);
      }),
      { numRuns: 30 },
    );
  });

  it('keeps every text as typed where the entry is in error', () => {
    const document = documentOf(candidateOf({ ...slanted, inclination: 'about 97' }));
    const before = textsOf(document);
    switchForm(document, 'state');
    expect(textsOf(document)).toEqual(before);
    switchForm(document, 'altitudes');
    expect(textsOf(document)).toEqual(before);
    expect(entryOf(document).form).toBe('altitudes');
  });

  it('to the form in use changes nothing', () => {
    const document = documentOf(candidateOf(slanted));
    const before = document.draft.value;
    switchForm(document, 'altitudes');
    expect(document.draft.value).toBe(before);
  });

  it('writes an Earth-fixed vector in axes of date', () => {
    const document = documentOf(candidateOf(slanted));
    switchForm(document, 'state');
    const before = orbitOf(document).mean;
    document.setTags({ frame: 'earthFixed' });
    const turned = orbitOf(document).mean;
    expect(turned.nodeRad).not.toBeCloseTo(before.nodeRad, 3);
    switchForm(document, 'elements');
    expect(entryOf(document).frame).toBe('meanOfDate');
    expectSameOrbit(document, turned);
  });
});

describe('a visit to two-line elements', () => {
  it.each(['altitudes', 'elements', 'state'] as const)('from %s and back changes nothing', (form) => {
    const document = documentOf(candidateOf(slanted, { frame: 'j2000', lengthUnit: 'NM', stateUnit: 'm' }));
    switchForm(document, form);
    const before = document.draft.value;
    const orbit = document.orbit.value;
    switchForm(document, 'twoLine');
    expect(document.orbit.value).toEqual(orbit);
    expect(document.stale.value).toBe(true);
    switchForm(document, form);
    expect(document.draft.value).toEqual(before);
    expect(document.orbit.value).toEqual(orbit);
  });

  it('with a set that cannot be read changes nothing but its own text', () => {
    const document = documentOf(candidateOf(slanted));
    const before = document.draft.value;
    switchForm(document, 'twoLine');
    typeTwoLine(document, line1);
    switchForm(document, 'altitudes');
    const { texts, ...tags } = entryOf(document);
    expect({ ...tags, texts: { ...texts, twoLine: '' } }).toEqual(before.entry);
    expect(document.draft.value.gravitySet).toBe('EGM2008');
  });
});

describe('two-line elements', () => {
  it('bring the gravity set that they are made with', () => {
    const document = documentOf();
    switchForm(document, 'twoLine');
    typeTwoLine(document, set);
    expect(document.draft.value.gravitySet).toBe('WGS72');
    expect(orbitOf(document)).toMatchObject({ theory: 'SGP4', origin: 'twoLine' });
  });

  it('leave the gravity set of other bodies', () => {
    const document = documentOf(candidateOf({}, { form: 'twoLine' }, { body: 'mars' }));
    typeTwoLine(document, set);
    expect(document.draft.value.gravitySet).toBe('EGM2008');
    expect(document.resolution.value).toMatchObject({ ok: false, errors: { twoLine: expect.anything() } });
  });

  it('go over into other forms with the same orbit, in axes of date', () => {
    for (const { line1: first, line2: second } of twoLineSets(12)) {
      const document = documentOf(candidateOf({}, { form: 'twoLine', frame: 'j2000' }));
      typeTwoLine(document, `${first}\n${second}`);
      const before = orbitOf(document).mean;
      switchForm(document, 'elements');
      expect(entryOf(document).frame).toBe('meanOfDate');
      expectSameOrbit(document, before);
    }
  });
});

describe('switching how the node is given', () => {
  it('keeps the orbit, there and back', () => {
    const document = documentOf(candidateOf(slanted));
    const before = orbitOf(document).mean;
    switchNodeForm(document, 'ltdn');
    expect(textsOf(document).node).toMatch(/^\d\d:\d\d/);
    switchNodeForm(document, 'ltan');
    switchNodeForm(document, 'raan');
    expectSameOrbit(document, before, 3);
  });

  it('without an epoch keeps the text', () => {
    const document = documentOf(candidateOf({ node: '40' }));
    switchNodeForm(document, 'ltan');
    expect(textsOf(document).node).toBe('40');
    expect(entryOf(document).nodeForm).toBe('ltan');
    switchNodeForm(document, 'raan');
    expect(textsOf(document).node).toBe('40');
    expect(document.stale.value).toBe(false);
  });
});

describe('switching the unit of lengths', () => {
  it('rewrites each length, to a millimetre and back', () => {
    const km = fc.integer({ min: 0, max: 1e8 }).map((count) => count / 1000);
    fc.assert(
      fc.property(km, km, (perigee, apogee) => {
        const typed = { perigeeAltitude: String(perigee), apogeeAltitude: String(apogee), semiMajorAxis: '7000' };
        const document = documentOf(candidateOf(typed));
        switchLengthUnit(document, 'NM');
        expect(Number(textsOf(document).perigeeAltitude) * 1.852).toBeCloseTo(perigee, 5);
        switchLengthUnit(document, 'km');
        expect(Number(textsOf(document).perigeeAltitude)).toBeCloseTo(perigee, 5);
        expect(Number(textsOf(document).apogeeAltitude)).toBeCloseTo(apogee, 5);
        expect(Number(textsOf(document).semiMajorAxis)).toBeCloseTo(7000, 5);
      }),
      { numRuns: 60 },
    );
  });

  it('rewrites the lengths that can be read though the entry is in error', () => {
    const document = documentOf(
      candidateOf({ perigeeAltitude: '1 852', apogeeAltitude: 'high', semiMajorAxis: '', inclination: '-5' }),
    );
    switchLengthUnit(document, 'NM');
    expect(textsOf(document)).toMatchObject({
      perigeeAltitude: '1000',
      apogeeAltitude: 'high',
      semiMajorAxis: '',
      inclination: '-5',
    });
    expect(entryOf(document).lengthUnit).toBe('NM');
  });

  it('keeps the lengths of conditions', async () => {
    const document = documentOf();
    document.conditions.add({ kind: 'perigeeAltitude', settles: 'semiMajorAxisKm', texts: { altitude: '926' } });
    await expect.poll(() => document.conditions.settlement.value?.ok).toBe(true);
    const before = orbitOf(document).mean;
    switchLengthUnit(document, 'NM');
    expect(document.draft.value.conditions[0]).toMatchObject({ texts: { altitude: '500' } });
    expect(orbitOf(document).mean.semiMajorAxisKm).toBeCloseTo(before.semiMajorAxisKm, 4);
  });

  it('to the one in use keeps the digits', () => {
    const document = documentOf(candidateOf({ perigeeAltitude: '561.0' }));
    switchLengthUnit(document, 'km');
    expect(textsOf(document).perigeeAltitude).toBe('561.0');
  });
});

describe('switching the body', () => {
  it('turns a local time into an angle of date, and leaves frames of the Earth', () => {
    const document = documentOf(candidateOf({ ...slanted, node: '10:30' }, { nodeForm: 'ltdn' }));
    const { nodeRad } = orbitOf(document).mean;
    switchBody(document, 'mars');
    expect(document.draft.value.body).toBe('mars');
    expect(entryOf(document)).toMatchObject({ nodeForm: 'raan', frame: 'meanOfDate' });
    expect(document.stale.value).toBe(false);
    expect(orbitOf(document).mean.nodeRad).toBeCloseTo(nodeRad, 6);
    expect(orbitOf(document).body.id).toBe('mars');
  });

  it('keeps the altitudes above the new body, there and back', () => {
    const document = documentOf(candidateOf({ perigeeAltitude: '400', apogeeAltitude: '400' }));
    switchBody(document, 'moon');
    expect(textsOf(document)).toMatchObject({ perigeeAltitude: '400', apogeeAltitude: '400' });
    switchBody(document, 'earth');
    expect(orbitOf(document).mean.semiMajorAxisKm).toBeCloseTo(6778.137, 3);
  });
});

describe('a paste of a state vector', () => {
  it('is read in metres or kilometres by its size', () => {
    const document = documentOf(candidateOf({ epoch }));
    const said = takePaste(document, '6878137 0 0\n0 7612.6 10');
    expect(said).toMatchObject({ said: expect.stringContaining('m and m/s') });
    expect(entryOf(document)).toMatchObject({ form: 'state', stateUnit: 'm', texts: { x: '6878137', vy: '7612.6' } });
    const inMetres = orbitOf(document).mean.semiMajorAxisKm;
    expect(takePaste(document, '6878.137 0 0 0 7.6126 0.010')).toMatchObject({
      said: expect.stringContaining('km and km/s'),
    });
    expect(entryOf(document).stateUnit).toBe('km');
    expect(orbitOf(document).mean.semiMajorAxisKm).toBeCloseTo(inMetres, 6);
    expect(textsOf(document).epoch).toBe(epoch);
  });

  it('keeps what is typed in the other forms', () => {
    const document = documentOf(candidateOf(slanted));
    takePaste(document, '6878.137 0 0 0 7.6126 0.010');
    expect(textsOf(document)).toMatchObject(slanted);
  });
});

describe('a paste of two lines', () => {
  it('is taken as a set, whatever the form was', () => {
    const document = documentOf(candidateOf(slanted));
    expect(takePaste(document, `SKERRY\r\n${line1}\r\n${line2}\r\n`)).toMatchObject({ said: expect.any(String) });
    expect(document.draft.value).toMatchObject({ gravitySet: 'WGS72', entry: { form: 'twoLine' } });
    expect(document.stale.value).toBe(false);
    expect(textsOf(document)).toMatchObject(slanted);
  });
});

describe('any other paste', () => {
  it('of 10 MB changes nothing and is told its size', () => {
    const document = documentOf(candidateOf(slanted));
    const before = document.draft.value;
    const outcome = takePaste(document, '1 '.repeat(5_000_000));
    expect(outcome).toMatchObject({ said: expect.stringContaining('10.0 MB') });
    expect(document.draft.value).toBe(before);
  });

  it('changes nothing unless it says what it was read as', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 200 }), (text) => {
        const document = documentOf();
        const before = document.draft.value;
        const outcome = takePaste(document, text);
        if (outcome !== 'notOurs' && outcome.said.startsWith('Read as')) return;
        expect(document.draft.value).toBe(before);
      }),
    );
  });
});

describe('taking elements', () => {
  const taken = { semiMajorAxisKm: 7100, inclinationRad: 1.7 };

  it.each([
    ['altitudes', 'altitudes'],
    ['elements', 'elements'],
    ['state', 'altitudes'],
  ] as const)('in the form %s writes them as %s, the others staying', (form, written) => {
    const document = documentOf(candidateOf(slanted));
    switchForm(document, form);
    const before = orbitOf(document).mean;
    expect(takeElements(document, taken)).toBe(true);
    expect(entryOf(document).form).toBe(written);
    expectSameOrbit(document, { ...before, ...taken });
  });

  it('in two-line elements goes over to altitudes and leaves the set', () => {
    const document = documentOf(candidateOf({ twoLine: set }, { form: 'twoLine' }));
    const before = orbitOf(document).mean;
    expect(takeElements(document, { eccentricity: 0.01 })).toBe(true);
    expect(entryOf(document).form).toBe('altitudes');
    expect(textsOf(document).twoLine).toBe(set);
    expectSameOrbit(document, { ...before, eccentricity: 0.01 });
  });

  it('keeps the unit, the frame and the kind of elements', () => {
    const tags: Partial<Candidate['entry']> = { elementsAre: 'osculating', lengthUnit: 'NM', frame: 'j2000' };
    const document = documentOf(candidateOf({ ...slanted, perigeeAltitude: '303', apogeeAltitude: '418' }, tags));
    const before = orbitOf(document).mean;
    expect(takeElements(document, taken)).toBe(true);
    expect(entryOf(document)).toMatchObject(tags);
    expectSameOrbit(document, { ...before, ...taken });
  });

  it('of what a condition has settled starts from the settled orbit', async () => {
    const document = documentOf(candidateOf(slanted));
    document.conditions.add({ kind: 'sunSynchronous', settles: 'inclinationRad', texts: {} });
    await expect.poll(() => document.conditions.settlement.value?.ok).toBe(true);
    const { inclinationRad } = orbitOf(document).mean;
    expect(takeElements(document, { nodeRad: 1 })).toBe(true);
    expect((Number(textsOf(document).inclination) * Math.PI) / 180).toBeCloseTo(inclinationRad, 7);
  });

  it('is refused where there is no orbit, and changes nothing', () => {
    const document = documentOf(candidateOf({ inclination: 'x' }));
    const before = document.draft.value;
    expect(takeElements(document, taken)).toBe(false);
    expect(document.draft.value).toBe(before);
  });
});
