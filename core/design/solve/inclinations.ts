/**
 * cos i from a rate of node or perigee at a known shape, branch by branch.
 *
 * Each branch is one monotone stretch of the rate's polynomial in θ, and gives the end of its stretch where the rate
 * asked for lies beyond: continuous along any line of shapes, so that a search can run through the edge of what exists.
 * Whoever uses θ checks the condition afterwards.
 */
import type { Condition } from '../conditions/condition';
import { nodeRateAt, type ShapeRates } from '../shapeRates';

/** θ at a shape; NaN where the branch does not exist. */
export type ThetaRule = (shape: ShapeRates) => number;

export function thetaBranches({ family, target }: Condition): readonly ThetaRule[] {
  if (family === 'node') {
    return [
      (shape) => thetaOfNode(shape, target),
      (shape) => thetaOfNodeBeyondTurn(shape, target, 1),
      (shape) => thetaOfNodeBeyondTurn(shape, target, -1),
    ];
  }
  if (family !== 'perigee') throw new Error(`branches in θ exist for node and perigee, got ${family}`);
  return [
    (shape) => Math.sqrt(nearSquare(shape, target)),
    (shape) => -Math.sqrt(nearSquare(shape, target)),
    (shape) => Math.sqrt(farSquare(shape, target)),
    (shape) => -Math.sqrt(farSquare(shape, target)),
  ];
}

/**
 * How far a branch runs on beyond |θ| = 1 before it stops: a kink at the very edge of what exists could hide a root beside
 * it between two samples.
 */
const farthest = 2;

/** θ > 0 at which the node rate turns, or where the branch stops. */
function turnOfNode({ node1, node3 }: ShapeRates): number {
  const square = -node1 / (3 * node3);
  return square >= 0 && square < farthest * farthest ? Math.sqrt(square) : farthest;
}

function thetaOfNode(shape: ShapeRates, target: number): number {
  const turn = turnOfNode(shape);
  return invertedNode(shape, target, { low: -turn, high: turn });
}

function thetaOfNodeBeyondTurn(shape: ShapeRates, target: number, side: 1 | -1): number {
  const turn = turnOfNode(shape);
  if (turn >= 1) return Number.NaN;
  return invertedNode(shape, target, side > 0 ? { low: turn, high: farthest } : { low: -farthest, high: -turn });
}

/** Newton's method kept inside the monotone stretch by halving. */
function invertedNode(shape: ShapeRates, target: number, stretch: { low: number; high: number }): number {
  let { low, high } = stretch;
  const sense = nodeRateAt(shape, high) >= nodeRateAt(shape, low) ? 1 : -1;
  const excess = (theta: number) => sense * (nodeRateAt(shape, theta) - target);
  if (excess(high) <= 0) return high;
  if (excess(low) >= 0) return low;
  let theta = target / shape.node1;
  for (let step = 0; step < 60; step += 1) {
    if (!(theta > low && theta < high)) theta = 0.5 * (low + high);
    const value = excess(theta);
    if (value > 0) high = theta;
    else low = theta;
    const change = value / (sense * (shape.node1 + 3 * shape.node3 * theta * theta));
    if (!(Math.abs(change) > 1.2e-16 * Math.abs(theta))) return theta;
    theta -= change;
  }
  return theta;
}

const clampedSquare = (square: number) => Math.min(farthest * farthest, Math.max(0, square));

/** θ² of the root that first order has too; the vertex where the rate asked for lies beyond it. */
function nearSquare({ perigee0, perigee2, perigee4 }: ShapeRates, target: number): number {
  const rest = perigee0 - target;
  const discriminant = perigee2 * perigee2 - 4 * perigee4 * rest;
  if (discriminant <= 0) return clampedSquare(-perigee2 / (2 * perigee4));
  const q = -0.5 * (perigee2 + Math.sign(perigee2) * Math.sqrt(discriminant));
  return clampedSquare(rest / q);
}

/** θ² of the other root, where the polynomial turns near enough for it to matter. */
function farSquare({ perigee0, perigee2, perigee4 }: ShapeRates, target: number): number {
  const vertex = -perigee2 / (2 * perigee4);
  if (!(vertex > -0.5 && vertex < 1.5)) return Number.NaN;
  const discriminant = perigee2 * perigee2 - 4 * perigee4 * (perigee0 - target);
  if (discriminant <= 0) return clampedSquare(vertex);
  return clampedSquare((-0.5 * (perigee2 + Math.sign(perigee2) * Math.sqrt(discriminant))) / perigee4);
}
