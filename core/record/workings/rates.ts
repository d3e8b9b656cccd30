/**
 * The lines that lead to the secular rates, first and second order.
 *
 * First order: Kozai, Astron. J. 64, 367 (1959). Second order: Brouwer, Astron. J. 64, 378 (1959),
 * split into its J2, J2² and J4 terms; the same coefficients as in `secularRates`.
 */
import { add, type Expr, fn, frac, group, mul, neg, num, pow, sqrt } from '../formula';
import type { SymbolId } from './symbols';
import type { LineSpec } from './working';

export type RateId = 'nodeRate' | 'perigeeRate' | 'anomalyRate';

export const meanMotion: LineSpec = ['n', sqrt(frac('mu', pow('a', 3)))];
const semiLatusRectum: LineSpec = ['p', mul('a', group(1, neg(pow('e', 2))))];
const cosine: LineSpec = ['theta', fn('cos', 'i')];
const eta: LineSpec = ['eta', sqrt(add(1, neg(pow('e', 2))))];
const oblateRate: LineSpec = ['k', mul(frac(3, 2), 'n', 'J2', pow(group(frac('R', 'p')), 2))];

const firstRate: Readonly<Record<RateId, Expr>> = {
  nodeRate: neg(mul('k', 'theta')),
  perigeeRate: mul(frac('k', 2), group(mul(5, pow('theta', 2)), neg(1))),
  anomalyRate: add('n', mul(frac(mul('k', 'eta'), 2), group(mul(3, pow('theta', 2)), neg(1)))),
};

/** First order: n, p, cos i, k and the rates asked for. */
export function firstOrderLines(rates: readonly RateId[]): LineSpec[] {
  const needsEta = rates.includes('anomalyRate');
  const common = [meanMotion, semiLatusRectum, ...(needsEta ? [eta] : []), cosine, oblateRate];
  return [...common, ...rates.map((rate): LineSpec => [rate, firstRate[rate]])];
}

/** c0 + c1 η + c2 η², in brackets. */
function inEta(c0: number, c1: number, c2: number): Expr {
  const terms = [num(c0), ...(c1 === 0 ? [] : [term(c1, 'eta')]), term(c2, pow('eta', 2))];
  return group(...terms);
}

function term(coefficient: number, power: Expr | string): Expr {
  return coefficient < 0 ? neg(mul(-coefficient, power)) : mul(coefficient, power);
}

const theta2 = pow('theta', 2);
const theta4 = pow('theta', 4);
const squared = pow('gamma2', 2);

const parameters: readonly LineSpec[] = [
  ['gamma2', frac(mul('J2', pow(group(frac('R', 'a')), 2)), mul(2, pow('eta', 4)))],
  ['gamma4', neg(mul(frac(3, 8), frac(mul('J4', pow(group(frac('R', 'a')), 4)), pow('eta', 8))))],
];

const secondRate: Readonly<Record<RateId, readonly LineSpec[]>> = {
  nodeRate: [
    ['nodeJ2', neg(mul(3, 'gamma2', 'theta'))],
    [
      'nodeJ2Squared',
      mul(frac(3, 8), squared, group(mul(inEta(-5, 12, 9), 'theta'), mul(inEta(-35, -36, -5), pow('theta', 3)))),
    ],
    ['nodeJ4', mul(frac(5, 4), 'gamma4', inEta(5, 0, -3), 'theta', group(3, term(-7, theta2)))],
    ['nodeRate', mul('n', group('nodeJ2', 'nodeJ2Squared', 'nodeJ4'))],
  ],
  perigeeRate: [
    ['perigeeJ2', mul(frac(3, 2), 'gamma2', group(mul(5, theta2), neg(1)))],
    [
      'perigeeJ2Squared',
      mul(
        frac(3, 32),
        squared,
        group(inEta(-35, 24, 25), mul(inEta(90, -192, -126), theta2), mul(inEta(385, 360, 45), theta4)),
      ),
    ],
    [
      'perigeeJ4',
      mul(
        frac(5, 16),
        'gamma4',
        group(inEta(21, 0, -9), mul(inEta(-270, 0, 126), theta2), mul(inEta(385, 0, -189), theta4)),
      ),
    ],
    ['perigeeRate', mul('n', group('perigeeJ2', 'perigeeJ2Squared', 'perigeeJ4'))],
  ],
  anomalyRate: [
    ['anomalyJ2', mul(frac(3, 2), 'gamma2', group(mul(3, theta2), neg(1)))],
    [
      'anomalyJ2Squared',
      mul(
        frac(3, 32),
        squared,
        group(inEta(-15, 16, 25), mul(inEta(30, -96, -90), theta2), mul(inEta(105, 144, 25), theta4)),
      ),
    ],
    ['anomalyJ4', mul(frac(15, 16), 'gamma4', pow('e', 2), group(3, term(-30, theta2), mul(35, theta4)))],
    ['anomalyRate', mul('n', group(1, mul('eta', group('anomalyJ2', 'anomalyJ2Squared', 'anomalyJ4'))))],
  ],
};

/** Second order: n, η, cos i, γ2, γ4, then each rate as its J2, J2² and J4 terms. */
export function secondOrderLines(rates: readonly RateId[]): LineSpec[] {
  return [meanMotion, eta, cosine, ...parameters, ...rates.flatMap((rate) => secondRate[rate])];
}

/** The constants of the body that the rate lines use. */
export const rateConstants = ['mu', 'R', 'J2', 'J4'] as const satisfies readonly SymbolId[];
