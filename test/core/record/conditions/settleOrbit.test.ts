import { describe, expect, it } from 'vitest';
import type { Candidate, FieldId } from '../../../../core/record/candidate';
import { type ConditionEntry, conditionWords } from '../../../../core/record/conditions/kinds';
import { settleOrbit } from '../../../../core/record/conditions/settleOrbit';
import { fingerprint } from '../../../../core/record/fingerprint';
import { headlineOf } from '../../../../core/record/headline';
import { readingsOf } from '../../../../core/record/readings/readings';
import { resolveOrbit } from '../../../../core/record/resolveOrbit';
import { candidateWith } from '../candidates';

const wish = (
  kind: ConditionEntry['kind'],
  texts: ConditionEntry['texts'] = {},
  settles = conditionWords[kind].settles,
): ConditionEntry => ({ kind, settles, texts });

const circle = { perigeeAltitude: '800', apogeeAltitude: '800', inclination: '98.6' };

function settlement(
  conditions: readonly ConditionEntry[],
  texts: Partial<Record<FieldId, string>> = circle,
  change: Partial<Pick<Candidate, 'body'>> = {},
) {
  const candidate = { ...candidateWith(texts, change), conditions: conditions.map((each) => ({ ...each })) };
  const start = resolveOrbit(candidate);
  if (!start.ok) throw new Error(`expected an orbit, got ${JSON.stringify(start.errors)}`);
  return settleOrbit(candidate, start.orbit);
}

function refusal(...input: Parameters<typeof settlement>): string {
  const answer = settlement(...input);
  if (answer.ok) throw new Error(`expected a reason, got ${JSON.stringify(answer.orbit.mean)}`);
  return answer.message;
}

describe('a frozen orbit', () => {
  const held = () => {
    const answer = settlement([wish('frozen')]);
    if (!answer.ok) throw new Error(`expected an orbit, got ${answer.message}`);
    return answer;
  };

  it('says its e, where perigee rests, and what J3 alone would give', () => {
    expect(held().notes[0]).toMatch(
      /^Frozen: e 0\.001\d{3}, perigee rests at 90° \(zonals to degree 14\); J3 alone gives e 0\.00\d{4}\.$/,
    );
  });

  it('hands on what makes it less sure', () => {
    const answer = settlement([wish('frozen')], circle, { body: 'mars' });
    expect(answer.ok && answer.notes.join(' ')).toMatch(/has zonals to degree 4 only\./);
  });

  it('is called frozen above everything, in place of a drift that means little', () => {
    const { orbit } = held();
    const sentence = headlineOf(orbit, readingsOf(orbit))
      .map(({ text }) => text)
      .join('');
    expect(sentence).toMatch(/Frozen: perigee rests at 90°\.$/);
    expect(sentence).not.toContain('means little');
  });
});

describe('frozen at an own body', () => {
  const own = { ...circle, bodyMu: '42828.4', bodyRadius: '3396', bodyJ2: '0.00196' };

  it('is refused where J3 is left blank, whether J4 is known or not', () => {
    const missing = /the odd zonals of Own body are missing/;
    expect(refusal([wish('frozen')], own, { body: 'custom' })).toMatch(missing);
    expect(refusal([wish('frozen')], { ...own, bodyJ4: '-1.5e-5' }, { body: 'custom' })).toMatch(missing);
  });

  it('is answered where J3 is typed, be it zero', () => {
    expect(settlement([wish('frozen')], { ...own, bodyJ3: '3.1e-5' }, { body: 'custom' }).ok).toBe(true);
    expect(settlement([wish('frozen')], { ...own, bodyJ3: '0' }, { body: 'custom' }).ok).toBe(true);
  });

  it('leaves the fingerprint as it is: the closed form turns on J2 and J4 alone', () => {
    const letters = (texts: Partial<Record<FieldId, string>>) => {
      const result = resolveOrbit(candidateWith({ ...own, ...texts }, { body: 'custom' }));
      return result.ok ? fingerprint(result.orbit) : '';
    };
    expect(letters({})).toBe(letters({ bodyJ3: '0', bodyJ4: '0' }));
    expect(letters({ bodyJ4: '-1.5e-5' })).toBe(letters({ bodyJ3: '0', bodyJ4: '-1.5e-5' }));
  });
});

describe('conditions that settle one element', () => {
  it('are named, with what else could be settled', () => {
    expect(refusal([wish('sunSynchronous'), wish('perigeeStationary')])).toBe(
      'Two conditions settle the inclination, Sun-synchronous and perigee stationary: let one of them settle ' +
        'the semi-major axis or the eccentricity, or drop one.',
    );
    const shape = [wish('perigeeAltitude', { altitude: '700' }), wish('apogeeAltitude', { altitude: '800' })];
    expect(refusal([...shape, wish('frozen')])).toMatch(
      /^Two conditions settle the eccentricity, Apogee altitude 800\.000 km and Frozen: let one/,
    );
  });

  it('are told that there are more of them than elements', () => {
    const track = wish('repeat', { revolutions: '143', days: '10' });
    expect(refusal([wish('sunSynchronous'), track, wish('frozen'), wish('perigeeStationary')])).toMatch(
      /4 conditions cannot be met by 3 elements; drop one\.$/,
    );
  });

  it('are told to clash where they do', () => {
    expect(refusal([wish('sunSynchronous'), wish('nodeRate', { rate: '0.985647' })])).toMatch(/redundant\.$/);
    expect(refusal([wish('sunSynchronous'), wish('nodeRate', { rate: '-5' })])).toMatch(/conflict: /);
  });
});

describe('a repeat with a nodal period that it does not have', () => {
  it('is answered with the period that it takes', () => {
    const wishes = [
      wish('repeat', { revolutions: '15', days: '1' }),
      wish('nodalPeriod', { period: '95.7' }, 'eccentricity'),
    ];
    expect(refusal(wishes)).toMatch(
      / At i 98\.600° and e 0(\.0000)? a repeat of 15 revolutions in 1 day takes a nodal period of 9[56]\.\d{3} min\.$/,
    );
  });
});
