/**
 * Seven letters by which two people on a call know that they speak of the same orbit.
 *
 * Alphabet: A H L M Q R T W X Y. Of each family of letters whose spoken names a bad line confuses it
 * takes one at most (A of A J K; T of B C D E G P T V Z; M of M N; X of F S X; Y of I Y; Q of Q U), and
 * in print none passes for a digit or for another (no B 8, D O 0, G 6, I 1, S 5, Z 2, U V). Ten
 * letters also make each worth one decimal digit.
 *
 * What counts, one line, fields parted by `|`:
 *   1|mu|R|J2,J3,...|Req|f|rotation|year|epoch|a|e|i|node|perigee|M
 * - body constants to 12 significant digits in exponent form, `-` where unknown, zonals from J2 on
 *   with trailing zeros left out;
 * - the rest as whole numbers of steps: epoch 1 s of Julian date (`-` if none), a 1 m, e 1e-6, angles 0.0001°.
 * Rounding goes in two steps, first to 1e-4 of a step, then half up, so that noise of the last
 * digits cannot split a typed value that sits on a tie. Angles wrap after rounding. At e = 0 steps
 * the perigee folds into the anomaly, at i = 0 or 180° the node folds into the perigee, each
 * leaving 0 behind. The line is hashed by FNV-1a, 64 bits (Fowler, Noll, Vo; IETF draft
 * draft-eastlake-fnv, section 2), the remainder by 10^7 written in the alphabet, highest first.
 * Names, notes, plans, gravity-set labels, display and the form of entry do not count.
 */
import type { Body } from '../bodies/body';
import type { MeanElements } from '../orbit/elements';
import type { ResolvedOrbit } from './resolved';

export const fingerprintAlphabet = 'AHLMQRTWXY';

/** Seven letters as three and four, such as `RTA MWLX`. */
export function fingerprint(orbit: Pick<ResolvedOrbit, 'body' | 'mean' | 'epochJd'>): string {
  let rest = fnv1a64(fingerprintLine(orbit)) % 10_000_000n;
  let letters = '';
  for (let place = 0; place < 7; place++) {
    letters = fingerprintAlphabet.charAt(Number(rest % 10n)) + letters;
    rest /= 10n;
  }
  return `${letters.slice(0, 3)} ${letters.slice(3)}`;
}

/** The written-down line that is hashed; shown so that a difference between two letters can be found. */
export function fingerprintLine({ body, mean, epochJd }: Pick<ResolvedOrbit, 'body' | 'mean' | 'epochJd'>): string {
  const epoch = epochJd === null ? '-' : String(steps(epochJd * 86_400, 1));
  return ['1', ...bodyParts(body), epoch, ...elementSteps(mean)].join('|');
}

function bodyParts(body: Body): string[] {
  const zonals = Array.from(body.zonals.slice(2), (zonal: number | undefined) => twelveDigits(zonal ?? 0));
  while (zonals.at(-1) === twelveDigits(0)) zonals.pop();
  return [
    twelveDigits(body.muKm3PerS2),
    twelveDigits(body.radiusKm),
    zonals.join(','),
    twelveDigits(body.equatorialRadiusKm),
    twelveDigits(body.flattening),
    body.rotationRadPerS === null ? '-' : twelveDigits(body.rotationRadPerS),
    body.yearDays === null ? '-' : twelveDigits(body.yearDays),
  ];
}

function twelveDigits(value: number | undefined): string {
  return (value ?? 0).toExponential(11);
}

const angleStepRad = (1e-4 * Math.PI) / 180;
const turn = 3_600_000;

function elementSteps(mean: MeanElements): number[] {
  const eccentricity = steps(mean.eccentricity, 1e-6);
  const inclination = steps(mean.inclinationRad, angleStepRad);
  let { nodeRad, perigeeRad, meanAnomalyRad } = mean;
  if (inclination === 0 || inclination === turn / 2) {
    perigeeRad += inclination === 0 ? nodeRad : -nodeRad;
    nodeRad = 0;
  }
  if (eccentricity === 0) {
    meanAnomalyRad += perigeeRad;
    perigeeRad = 0;
  }
  const angles = [nodeRad, perigeeRad, meanAnomalyRad].map(angleSteps);
  return [steps(mean.semiMajorAxisKm, 1e-3), eccentricity, inclination, ...angles];
}

function angleSteps(rad: number): number {
  const count = steps(rad, angleStepRad) % turn;
  return count < 0 ? count + turn : count;
}

/** Whether two values fall on the same step, of 1 m, 1e-6 or 1e-4 of a degree. */
export function onSameStep(value: number, other: number, step: number): boolean {
  return steps(value, step) === steps(other, step);
}

function steps(value: number, step: number): number {
  const tenThousandths = Math.round((value / step) * 1e4);
  return Math.floor((tenThousandths + 5_000) / 10_000);
}

function fnv1a64(line: string): bigint {
  let hash = 0xcbf29ce484222325n;
  for (let index = 0; index < line.length; index++) {
    hash ^= BigInt(line.charCodeAt(index));
    hash = BigInt.asUintN(64, hash * 0x100000001b3n);
  }
  return hash;
}
