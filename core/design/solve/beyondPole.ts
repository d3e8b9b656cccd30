/** The shape is there, but no inclination turns the node so fast: cos i would have to lie beyond ±1. */
import type { Condition } from '../conditions/condition';
import { nodeRateAt, type ShapeRates } from '../shapeRates';
import { shapeAtAxis } from './axis';
import type { Failure } from './explain';
import { floorKm, type Point, type Problem, parameterKm, ratesOf } from './problem';
import { cosineText, eccentricityText, kmText } from './words';

export interface BeyondPole {
  readonly text: string;
  /** The same shape in the equator, where the node is fastest. */
  readonly points: readonly Point[];
}

interface Wanted {
  readonly shape: ShapeRates;
  /** What cos i would have to be: the node rate is nearly proportional to it. */
  readonly cosine: number;
}

/** Null where the node rate is not what fails. */
export function beyondPole(failure: Failure): BeyondPole | null {
  const { problem, division } = failure;
  const node = division.thetaFrom?.family === 'node' ? division.thetaFrom : null;
  if (!node) return null;
  const rejected = failure.settlement.rejected.flatMap((point) => wantedAt(problem, node, ratesOf(problem, point)));
  const [first] = rejected.length > 0 ? rejected : leastOnLine(failure, node);
  if (!first) return null;
  const { shape, cosine } = first;
  const { semiMajorAxisKm, eccentricity } = shape;
  const most = rejected.length > 0 ? '' : 'even at best ';
  const place = placeText(problem, shape);
  const theta = Math.sign(cosine);
  const reached = `${node.write(nodeRateAt(shape, theta))} at i ${theta > 0 ? '0°' : '180°'}`;
  const text =
    `cos i would ${most}have to be ${cosineText(cosine)} ${place}: the node rate there reaches at most ${reached}; ` +
    limitText(problem, node, first);
  return { text, points: [{ semiMajorAxisKm, eccentricity, theta }] };
}

function wantedAt({ body }: Problem, node: Condition, shape: ShapeRates | null): readonly Wanted[] {
  if (!shape || parameterKm(shape) < floorKm(body) * 0.999) return [];
  const cosine = node.target / nodeRateAt(shape, 1);
  return Math.abs(cosine) > 1 ? [{ shape, cosine }] : [];
}

/** The shape of a line that comes closest, if none gets there. */
function leastOnLine({ problem, division }: Failure, node: Condition): readonly Wanted[] {
  const { shapes } = division;
  if (shapes.kind === 'single') return [];
  const everywhere = [...shapes.line.grid].flatMap((s) => {
    const shape = division.rules[0] ? shapes.line.shapeAt(s, division.rules[0]) : null;
    return shape && parameterKm(shape) >= floorKm(problem.body) ? [shape] : [];
  });
  const wanted = everywhere.flatMap((shape) => wantedAt(problem, node, shape));
  if (wanted.length === 0 || wanted.length < everywhere.length) return [];
  return [wanted.reduce((best, one) => (Math.abs(one.cosine) < Math.abs(best.cosine) ? one : best))];
}

function placeText({ body }: Problem, { semiMajorAxisKm, eccentricity }: ShapeRates): string {
  const altitude = `at a mean altitude of ${kmText(semiMajorAxisKm - body.equatorialRadiusKm)}`;
  return isCircular(eccentricity) ? altitude : `${altitude} and e ${eccentricityText(eccentricity)}`;
}

/** How far out, at this eccentricity, the node still turns so fast at i = 0 or 180°. */
function limitText(problem: Problem, node: Condition, { shape, cosine }: Wanted): string {
  const { eccentricity, semiMajorAxisKm } = shape;
  const side = Math.sign(cosine);
  const question = { condition: node, eccentricity, theta: () => side, guessKm: semiMajorAxisKm };
  const last = shapeAtAxis(problem, question);
  const named = orbitsText(node, eccentricity);
  if (!last || parameterKm(last) < floorKm(problem.body)) return `there are no ${named} above the surface.`;
  return `${named} end at a mean altitude of ${kmText(last.semiMajorAxisKm - problem.body.equatorialRadiusKm)}.`;
}

function orbitsText({ kind, target, write }: Condition, eccentricity: number): string {
  const shape = isCircular(eccentricity) ? 'circular ' : '';
  const at = isCircular(eccentricity) ? '' : ` of e ${eccentricityText(eccentricity)}`;
  if (kind === 'sunSynchronous') return `${shape}Sun-synchronous orbits${at}`;
  return `${shape}orbits${at} with a node rate of ${write(target)}`;
}

function isCircular(eccentricity: number): boolean {
  return eccentricity < 0.0005;
}
