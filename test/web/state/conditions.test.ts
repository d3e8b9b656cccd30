import { computed, signal } from '@preact/signals';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { type Candidate, resolveOrbit, secularRates, settleOrbit } from '../../../core/index';
import { createConditions, settledMean } from '../../../web/state/conditions';
import { candidateOf, documentOf, orbitOf, textsOf } from './support';

const sunSynchronous = { kind: 'sunSynchronous', settles: 'inclinationRad', texts: {} } as const;
const frozen = { kind: 'frozen', settles: 'eccentricity', texts: {} } as const;
const repeat = (revolutions: string, days: string) =>
  ({ kind: 'repeat', settles: 'semiMajorAxisKm', texts: { revolutions, days } }) as const;

afterEach(() => {
  vi.restoreAllMocks();
});

function conditionsOf(candidate: Candidate, load = vi.fn(async () => settleOrbit)) {
  const draft = signal(candidate);
  const entered = computed(() => resolveOrbit(draft.value));
  return { draft, load, conditions: createConditions(draft, entered, load) };
}

describe('solving', () => {
  it('is fetched with the first condition, once', async () => {
    const { load, conditions } = conditionsOf(candidateOf());
    expect(load).not.toHaveBeenCalled();
    conditions.add(sunSynchronous);
    expect(load).toHaveBeenCalledTimes(1);
    await expect.poll(() => conditions.settlement.value?.ok).toBe(true);
    conditions.remove(0);
    conditions.add(frozen);
    expect(load).toHaveBeenCalledTimes(1);
    expect(conditions.settlement.value?.ok).toBe(true);
  });

  it('is fetched at once where the candidate has a condition', () => {
    expect(conditionsOf(candidateOf({}, {}, { conditions: [{ ...sunSynchronous }] })).load).toHaveBeenCalledTimes(1);
  });

  it('that could not be fetched is fetched with the next edit, and nothing typed is lost', async () => {
    const load = vi.fn(async () => settleOrbit).mockRejectedValueOnce(new Error('no network'));
    const { draft, conditions } = conditionsOf(candidateOf(), load);
    conditions.add(sunSynchronous);
    await expect.poll(() => load.mock.settledResults[0]?.type).toBe('rejected');
    expect(conditions.settlement.value).toBeNull();
    expect(draft.value.conditions).toEqual([sunSynchronous]);
    draft.value = { ...draft.value, name: 'Shore' };
    await expect.poll(() => conditions.settlement.value?.ok).toBe(true);
    draft.value = { ...draft.value, name: 'Coast' };
    expect(load).toHaveBeenCalledTimes(2);
  });

  it('comes to no orbit before it is there, and to no message either', () => {
    const { conditions } = conditionsOf(candidateOf({}, {}, { conditions: [{ ...sunSynchronous }] }));
    expect(conditions.settlement.value).toBeNull();
    expect(conditions.resolution.value).toEqual({ ok: false, errors: {}, notices: [] });
    expect(settledMean(conditions.settlement.value)).toBeNull();
  });
});

describe('the list of conditions', () => {
  it('takes, changes and drops by place, and keeps those that this version does not know', () => {
    const unknown = { kind: 'fromTheFuture', more: [1, 2] };
    const { draft, conditions } = conditionsOf(candidateOf({}, {}, { conditions: [unknown] }));
    conditions.add(repeat('14', '1'));
    conditions.change(1, repeat('15', '1'));
    expect(draft.value.conditions).toEqual([unknown, repeat('15', '1')]);
    conditions.remove(1);
    expect(draft.value.conditions).toEqual([unknown]);
    expect(conditions.resolution.value.ok).toBe(false);
  });
});

describe('a condition of the document', () => {
  const withSunSynchronous = async () => {
    const document = documentOf();
    document.conditions.add(sunSynchronous);
    await expect.poll(() => document.conditions.settlement.value?.ok).toBe(true);
    return document;
  };

  it('settles its element and leaves what was typed', async () => {
    const document = await withSunSynchronous();
    const { body, mean } = orbitOf(document);
    const radPerDay = secularRates(body, mean, 'second').nodeRadPerS * 86_400;
    expect((radPerDay * 180) / Math.PI).toBeCloseTo(360 / 365.2422, 4);
    expect(textsOf(document).inclination).toBe('97.6');
    expect(Number(document.settled.value.inclination)).toBeCloseTo((mean.inclinationRad * 180) / Math.PI, 5);
    expect(Object.keys(document.settled.value)).toEqual(['inclination']);
    expect(document.entered.value).toMatchObject({ ok: true });
  });

  it('lets go of the field when it is dropped', async () => {
    const document = await withSunSynchronous();
    document.conditions.remove(0);
    expect(document.settled.value).toEqual({});
    expect(orbitOf(document).mean.inclinationRad).toBeCloseTo((97.6 * Math.PI) / 180, 12);
  });

  it('settles nothing in the fields of a state vector', async () => {
    const document = await withSunSynchronous();
    document.setTags({ form: 'state' });
    expect(document.settled.value).toEqual({});
  });

  it('settles both altitudes and the perigee where it freezes', async () => {
    const document = documentOf();
    document.conditions.add(frozen);
    await expect.poll(() => document.conditions.settlement.value?.ok).toBe(true);
    expect(Object.keys(document.settled.value).sort()).toEqual(['apogeeAltitude', 'perigee', 'perigeeAltitude']);
    document.setTags({ form: 'elements' }, { semiMajorAxis: '6928.1363', eccentricity: '0' });
    expect(Object.keys(document.settled.value).sort()).toEqual(['eccentricity', 'perigee']);
  });

  it('that cannot be met keeps the last good orbit, marks it stale and says why', async () => {
    const document = await withSunSynchronous();
    const before = orbitOf(document);
    document.setTexts({ perigeeAltitude: '20000', apogeeAltitude: '20000' });
    const settlement = document.conditions.settlement.value;
    expect(settlement).toMatchObject({ ok: false, message: expect.stringMatching(/\d/) });
    expect(document.stale.value).toBe(true);
    expect(document.orbit.value).toBe(before);
    expect(document.settled.value).toEqual({});
    document.setTexts({ perigeeAltitude: '600', apogeeAltitude: '600' });
    expect(document.stale.value).toBe(false);
    expect(orbitOf(document).mean.semiMajorAxisKm).toBeCloseTo(6978.137, 2);
  });

  it('with an unreadable number keeps the last good orbit and leaves a message at the number', async () => {
    const document = await withSunSynchronous();
    const before = orbitOf(document);
    document.conditions.add(repeat('many', '1'));
    expect(document.orbit.value).toBe(before);
    expect(document.conditions.settlement.value?.conditions[1]).toMatchObject({
      ok: false,
      errors: { revolutions: { message: expect.any(String) } },
    });
  });

  it('is not asked of an entry that is in error', async () => {
    const document = await withSunSynchronous();
    const before = orbitOf(document);
    document.setText('node', 'x');
    expect(document.conditions.settlement.value).toBeNull();
    expect(document.orbit.value).toBe(before);
    expect(document.resolution.value).toMatchObject({ ok: false, errors: { node: expect.anything() } });
  });

  it('twice on one element is refused with both named', async () => {
    const document = await withSunSynchronous();
    document.conditions.add({ kind: 'perigeeStationary', settles: 'inclinationRad', texts: {} });
    expect(document.conditions.settlement.value).toMatchObject({
      ok: false,
      message: expect.stringContaining('the inclination'),
    });
  });
});
