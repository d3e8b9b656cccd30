import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blankCandidate, fieldIds, secularRates } from '../../../core/index';
import { createDocument } from '../../../web/state/document';
import { openedNew } from '../../../web/state/saving';
import { candidateOf, documentOf, orbitOf, textsOf } from './support';

describe('what is typed', () => {
  it('survives to the letter in any field, whether or not it makes sense', () => {
    fc.assert(
      fc.property(fc.constantFrom(...fieldIds), fc.string({ unit: 'grapheme', maxLength: 40 }), (field, text) => {
        const document = documentOf();
        document.setText(field, text);
        expect(document.draft.value.entry.texts[field]).toBe(text);
        expect(() => document.notices.value).not.toThrow();
      }),
    );
  });

  it('keeps its own digits while the orbit is worked out from them', () => {
    const document = documentOf(candidateOf({ inclination: ' 97,6000 ' }));
    expect(orbitOf(document).mean.inclinationRad).toBeCloseTo((97.6 * Math.PI) / 180, 12);
    expect(textsOf(document).inclination).toBe(' 97,6000 ');
  });

  it('leaves the other fields and the tags alone', () => {
    const document = documentOf();
    const before = document.draft.value;
    document.setText('node', '12');
    document.setTexts({ perigee: '3', meanAnomaly: '4' });
    document.setTags({ sun: 'apparent' }, { epoch: '2028-01-01' });
    expect(document.draft.value).toEqual({
      ...before,
      entry: {
        ...before.entry,
        sun: 'apparent',
        texts: { ...before.entry.texts, node: '12', perigee: '3', meanAnomaly: '4', epoch: '2028-01-01' },
      },
    });
  });
});

describe('the last good orbit', () => {
  it('stays with its readings and letters while the entry is in error, marked stale', () => {
    const document = documentOf();
    const [orbit, readings, letters] = [orbitOf(document), document.readings.value, document.fingerprint.value];
    expect(document.stale.value).toBe(false);
    document.setText('inclination', '97.');
    document.setText('inclination', 'ninety');
    expect(document.stale.value).toBe(true);
    expect(document.orbit.value).toBe(orbit);
    expect(document.readings.value).toEqual(readings);
    expect(document.fingerprint.value).toBe(letters);
    expect(document.resolution.value).toMatchObject({
      ok: false,
      errors: { inclination: { message: expect.any(String) } },
    });
  });

  it('gives way as soon as the entry is good again', () => {
    const document = documentOf();
    const before = orbitOf(document);
    document.setText('inclination', '');
    expect(document.orbit.value).toBe(before);
    document.setText('inclination', '98');
    expect(document.stale.value).toBe(false);
    expect(orbitOf(document).mean.inclinationRad).toBeCloseTo((98 * Math.PI) / 180, 12);
  });

  it('is never that of another candidate', () => {
    const document = documentOf();
    expect(document.orbit.value).not.toBeNull();
    document.open({
      candidate: candidateOf({ inclination: '' }, {}, { id: 'two' }),
      baseRevision: null,
      savedText: null,
    });
    expect(document.orbit.value).toBeNull();
    expect(document.readings.value).toEqual([]);
    expect(document.absentReadings.value).toEqual([]);
    expect(document.fingerprint.value).toBeNull();
    expect(document.stale.value).toBe(true);
  });

  it('agrees with the rates that the readings show', () => {
    const document = documentOf();
    const { body, mean } = orbitOf(document);
    const node = document.readings.value.find(({ id }) => id === 'nodeRate');
    expect(node?.value).toBeCloseTo(secularRates(body, mean, 'second').nodeRadPerS, 14);
  });
});

describe('notices', () => {
  it('say each thing once', () => {
    const document = documentOf(candidateOf({ perigeeAltitude: '-50', apogeeAltitude: '60' }));
    const ids = document.notices.value.map(({ id }) => id);
    expect(ids).toContain('perigeeBelowSurface');
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('say each thing once for any orbit', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -6000, max: 60_000 }),
        fc.integer({ min: 0, max: 60_000 }),
        fc.integer({ min: 0, max: 180 }),
        (perigee, more, inclination) => {
          const document = documentOf(
            candidateOf({
              perigeeAltitude: `${perigee}`,
              apogeeAltitude: `${perigee + more}`,
              inclination: `${inclination}`,
            }),
          );
          const ids = document.notices.value.map(({ id }) => id);
          expect(new Set(ids).size).toBe(ids.length);
        },
      ),
      { numRuns: 40 },
    );
  });
});

describe('the changed flag', () => {
  it('is up from the first letter, and down again when it is taken back', () => {
    const document = documentOf();
    expect(document.changed.value).toBe(false);
    document.setText('inclination', '97.61');
    expect(document.changed.value).toBe(true);
    document.setText('inclination', '97.6');
    expect(document.changed.value).toBe(false);
  });

  it('sees the name, the notes, the body, conditions and limits', () => {
    const changes: ((document: ReturnType<typeof documentOf>) => void)[] = [
      (document) => document.setCandidate({ name: 'Shore' }),
      (document) => document.setCandidate({ notes: 'why' }),
      (document) => document.setCandidate({ body: 'mars' }),
      (document) => document.setCandidate({ gravitySet: 'WGS84' }),
      (document) => document.setTags({ frame: 'teme' }),
      (document) => document.conditions.add({ kind: 'frozen', settles: 'eccentricity', texts: {} }),
      (document) => document.limits.add({ reading: 'nodeRate', bound: 'atMost', text: '1', unit: 'deg/day' }),
    ];
    for (const change of changes) {
      const document = documentOf();
      change(document);
      expect(document.changed.value).toBe(true);
    }
  });

  it('is down for a blank one until something is typed', () => {
    const document = createDocument(openedNew('new'));
    expect(document.changed.value).toBe(false);
    document.setText('epoch', '2028');
    expect(document.changed.value).toBe(true);
  });

  it('is up where all of it is new', () => {
    const document = createDocument({ candidate: blankCandidate({ id: 'a' }), baseRevision: null, savedText: null });
    expect(document.changed.value).toBe(true);
  });
});

describe('marking as saved', () => {
  it('sets the revision, and what was typed during the save still counts as changed', () => {
    const document = documentOf();
    document.setText('inclination', '98');
    const sent = document.draft.value;
    document.setText('inclination', '98.5');
    document.markSaved(sent, 2);
    expect(document.baseRevision.value).toBe(2);
    expect(document.changed.value).toBe(true);
    expect(textsOf(document).inclination).toBe('98.5');
    document.markSaved(document.draft.value, 3);
    expect(document.changed.value).toBe(false);
  });
});

describe('putting a draft back', () => {
  it('brings every text back and leaves the revision', () => {
    const document = documentOf();
    const before = document.draft.value;
    document.setTexts({ inclination: '1', node: '2' });
    document.restoreDraft(before);
    expect(document.draft.value).toBe(before);
    expect(document.baseRevision.value).toBe(1);
    expect(document.changed.value).toBe(false);
  });
});
