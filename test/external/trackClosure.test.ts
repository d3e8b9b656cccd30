/**
 * Ground tracks that close: integrated in a field of J2 and J4 over their whole cycle, from the state that core gives.
 *
 * Conditions, for the cycle's N revolutions multiply every error of the period: the second order (first order misses by
 * kilometres, which is shown); a start on the ascending node, where what first-order short-period terms leave in a is
 * smallest; a circular mean orbit, because
 * perigee moves meanwhile and would shift the last crossing by 2e a, times how far its sine has come, as in the real orbit too.
 */
import { describe, expect, it } from 'vitest';
import { type MeanElements, type RepeatTrack, repeatTracks, stateFromMean, type Theory } from '../../core/index';
import { atNode } from './truth/averages';
import { cutField } from './truth/fields';
import { integrateTo, type Motion, noIntegrands, startOf } from './truth/integrate';

const { body, field } = cutField(4);
const rotationRadPerS = body.rotationRadPerS ?? Number.NaN;
const radPerDeg = Math.PI / 180;
const twoPi = 2 * Math.PI;

/**
 * The promise, and what was measured near polar orbits with room for a factor of about two. At 28° and 52° first-order
 * short-period terms leave more in a, 1.7 and 1.3 km of gap after 16 and 15 days. A quarter of a revolution after the node
 * they leave most: 3.1 km after ten days, no promise but a bound that holds the statement.
 */
const tolerances = { promisedKm: 2, nearPolarKm: 0.2, quarterOnKm: 4 } as const;

interface Wanted {
  readonly revolutions: number;
  readonly days: number;
  /** Sun-synchronous where there is none. */
  readonly inclinationDeg: number | null;
}

const wanted: readonly Wanted[] = [
  { revolutions: 15, days: 1, inclinationDeg: null },
  { revolutions: 43, days: 3, inclinationDeg: null },
  { revolutions: 106, days: 7, inclinationDeg: null },
  { revolutions: 143, days: 10, inclinationDeg: null },
  { revolutions: 167, days: 11, inclinationDeg: null },
  { revolutions: 201, days: 13, inclinationDeg: 97 },
  { revolutions: 233, days: 16, inclinationDeg: null },
  { revolutions: 127, days: 10, inclinationDeg: 66.039 },
  { revolutions: 209, days: 15, inclinationDeg: 51.6 },
  { revolutions: 223, days: 16, inclinationDeg: 28.5 },
];

function trackOf({ revolutions, days, inclinationDeg }: Wanted, theory: Theory, eccentricity: number): RepeatTrack {
  const track = repeatTracks({
    body,
    theory,
    eccentricity,
    inclination:
      inclinationDeg === null ? { kind: 'sunSynchronous' } : { kind: 'fixed', rad: inclinationDeg * radPerDeg },
    minAltitudeKm: 300,
    maxAltitudeKm: 1500,
    maxDays: days,
  }).find((each) => each.revolutions === revolutions && each.days === days);
  if (!track) throw new Error(`a track ${revolutions}/${days} was expected`);
  return track;
}

/** The nearest ascending crossing of the equator, by Newton's steps, each integrated. */
function crossing(motion: Motion): Motion {
  let here = motion;
  for (let step = 0; step < 20; step += 1) {
    const { value, rate } = atNode(field, here);
    if (rate < 0) throw new Error('an ascending crossing was expected');
    if (Math.abs(value / rate) < 1e-7) return here;
    here = integrateTo(field, here, here.timeS - value / rate, noIntegrands);
  }
  throw new Error('no crossing found within 20 steps');
}

const longitudeRad = ({ positionKm: [x, y], timeS }: Motion) => Math.atan2(y, x) - rotationRadPerS * timeS;

type Start = Pick<MeanElements, 'eccentricity' | 'perigeeRad' | 'meanAnomalyRad'>;

const onNode: Start = { eccentricity: 0, perigeeRad: 0, meanAnomalyRad: 0 };
const quarterOn: Start = { ...onNode, meanAnomalyRad: Math.PI / 2 };

/** Distance (km) along the equator from the first crossing to the one N revolutions later, east positive. */
function gapKm(track: RepeatTrack, from: Start): number {
  const { semiMajorAxisKm, inclinationRad, revolutions } = track;
  const mean = { semiMajorAxisKm, inclinationRad, nodeRad: 1, ...from };
  const state = startOf(stateFromMean(body, mean));
  const perRadS = Math.sqrt(semiMajorAxisKm ** 3 / field.muKm3PerS2);
  const start = crossing(integrateTo(field, state, -(from.perigeeRad + from.meanAnomalyRad) * perRadS, noIntegrands));
  let end = start;
  // One revolution at a time, so that exactly N crossings are counted.
  for (let count = 0; count < revolutions; count += 1) {
    end = crossing(integrateTo(field, end, end.timeS + twoPi * perRadS, noIntegrands));
  }
  const turned = longitudeRad(end) - longitudeRad(start);
  return (turned - twoPi * Math.round(turned / twoPi)) * body.equatorialRadiusKm;
}

describe('a repeat track integrated over its cycle in a field of J2 and J4', () => {
  it.each(wanted)('$revolutions in $days days at $inclinationDeg° ends where it began', (row) => {
    const gap = gapKm(trackOf(row, 'second', 0), onNode);
    const firstGap = gapKm(trackOf(row, 'first', 0), onNode);
    const name = `${row.revolutions}/${row.days} at ${row.inclinationDeg ?? 'Sun-synchronous'}`;
    console.log(`${name}: gap ${(1000 * gap).toFixed(0)} m in second order, ${firstGap.toFixed(2)} km in first`);
    expect(Math.abs(gap)).toBeLessThan(tolerances.promisedKm);
    const nearPolar = row.inclinationDeg === null || row.inclinationDeg > 90;
    if (nearPolar) expect(Math.abs(gap)).toBeLessThan(tolerances.nearPolarKm);
    expect(Math.abs(firstGap)).toBeGreaterThan(Math.abs(gap));
  });

  it('a state taken a quarter of a revolution after the node misses by more: the theory’s own limit', () => {
    const gap = gapKm(trackOf({ revolutions: 143, days: 10, inclinationDeg: null }, 'second', 0), quarterOn);
    console.log(`143/10 from a state a quarter of a revolution after the node: gap ${gap.toFixed(2)} km`);
    expect(Math.abs(gap)).toBeLessThan(tolerances.quarterOnKm);
  });

  it.each([
    // Frozen over the real Earth; over J2 and J4 alone perigee moves 48° meanwhile.
    { revolutions: 233, days: 16, eccentricity: 0.001165, perigeeDeg: 90 },
    { revolutions: 143, days: 10, eccentricity: 0.001, perigeeDeg: 0 },
  ])('$revolutions in $days days keeps the promise at e $eccentricity, perigee at $perigeeDeg°', (row) => {
    const perigeeRad = row.perigeeDeg * radPerDeg;
    const track = trackOf({ ...row, inclinationDeg: null }, 'second', row.eccentricity);
    const gap = gapKm(track, { eccentricity: row.eccentricity, perigeeRad, meanAnomalyRad: -perigeeRad });
    console.log(`${row.revolutions}/${row.days} at e ${row.eccentricity}: gap ${(1000 * gap).toFixed(0)} m`);
    expect(Math.abs(gap)).toBeLessThan(tolerances.promisedKm);
  });
});
