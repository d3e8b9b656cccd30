import { twoPi } from '../../numerics/angles';
import { commonDivisor } from '../../numerics/integers';
import { formatNumber, quotedNumber } from '../../numerics/numberWords';
import { latitudeRateAt, nodeRateAt, type ShapeRates } from '../shapeRates';
import type { Condition, ConditionContext, Prepared } from './condition';
import { nodeCondition } from './rates';

/** The ground track closes: so many revolutions in so many nodal days. */
export interface RepeatInput {
  readonly kind: 'repeat';
  readonly revolutions: number;
  readonly days: number;
}

/** Beyond this a cycle is longer than a thousand years: a slip of the keyboard. */
const most = 1e6;

export function repeat({ revolutions, days }: RepeatInput, { body }: ConditionContext): Prepared {
  const bad = badCount('revolutions', revolutions) ?? badCount('days', days);
  if (bad !== null) return { ok: false, kind: 'badInput', text: bad };
  const spin = body.rotationRadPerS;
  if (spin === null || spin === 0) {
    const text = `A repeat ground track needs the rotation of ${body.name}, which ${spin === null ? 'is not known' : 'is zero'}.`;
    return { ok: false, kind: 'missing', text };
  }
  const common = commonDivisor(revolutions, days);
  return {
    ok: true,
    condition: closing({ revolutions: revolutions / common, days: days / common, common }, spin, body),
  };
}

function badCount(name: string, count: number): string | null {
  if (!(typeof count === 'number' && Number.isInteger(count) && count >= 1)) {
    return `A repeat ground track needs a whole number of ${name}, at least 1, but it is ${quotedNumber(count)}.`;
  }
  return count > most ? `A repeat ground track can have ${formatNumber(most, { digits: 0 })} ${name} at most.` : null;
}

interface Track {
  readonly revolutions: number;
  readonly days: number;
  readonly common: number;
}

function closing(track: Track, spin: number, body: ConditionContext['body']): Condition {
  const { revolutions, days, common } = track;
  const target = revolutions / days;
  const measure = (shape: ShapeRates, theta: number) =>
    latitudeRateAt(shape, theta) / Math.abs(spin - nodeRateAt(shape, theta));
  const reduced =
    `${revolutions * common} revolutions in ${days * common} days are the same track as ` +
    `${revolutions} in ${days}: solved as that.`;
  return {
    kind: 'repeat',
    label: `Repeat of ${revolutions} revolutions in ${days} ${days === 1 ? 'day' : 'days'}`,
    formula: 'N · 2π / (Ṁ + ω̇) = D · 2π / |ω body − Ω̇|',
    family: 'period',
    target,
    measure,
    scale: (shape, theta) => target + measure(shape, theta),
    write: (value, more = 0) => `${formatNumber(value, { digits: 6 + more })} a nodal day`,
    quantity: 'number of revolutions',
    notes: common > 1 ? [reduced] : [],
    axisGuessKm: Math.cbrt(body.muKm3PerS2 / (target * spin) ** 2),
  };
}

/** A repeat at a nodal period leaves one length for the nodal day, and with it one node rate. */
export function nodeRateOfRepeat(closure: Condition, periodS: number, spinRadPerS: number): Condition {
  const turnRadPerS = twoPi / (closure.target * periodS);
  return nodeCondition(spinRadPerS - Math.sign(spinRadPerS) * turnRadPerS, {
    kind: closure.kind,
    label: closure.label,
    formula: closure.formula,
  });
}
