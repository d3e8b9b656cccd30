import { describe, expect, it } from 'vitest';
import type { Candidate, FieldId } from '../../../../core/record/candidate';
import { type ConditionEntry, conditionWords } from '../../../../core/record/conditions/kinds';
import { settleOrbit } from '../../../../core/record/conditions/settleOrbit';
import { fingerprint } from '../../../../core/record/fingerprint';
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
