/** The curves that a chart shows: the conditions of the trade, round node rates, the shortest repeat tracks, and what is held. */
import {
  type Body,
  type ChartCondition,
  type ChartCurve,
  type ChartLine,
  type ChartShape,
  chartCurve,
  chartFloor,
  chartLine,
  chartRepeats,
  eccentricityAt,
  secularRates,
  unitOf,
} from '../../../core/index';
import { niceTicks } from '../../parts/drawing';
import type { NameUnits } from './curveNames';
import { sameCondition } from './heldCurves';
import type { Mapping } from './plotBox';

export interface ShownCurve {
  readonly curve: ChartCurve;
  readonly line: ChartLine;
  readonly isHeld: boolean;
}

export interface CurveRequest extends NameUnits {
  readonly body: Body;
  readonly shape: ChartShape;
  readonly mapping: Mapping;
  readonly fontPx: number;
  readonly held: readonly ChartCondition[];
}

const fixed: readonly ChartCondition[] = [
  { kind: 'sunSynchronous' },
  { kind: 'polar' },
  { kind: 'critical', side: -1 },
  { kind: 'critical', side: 1 },
];

/** Most named first: where labels compete, the earlier one is written. */
export function shownCurves(request: CurveRequest): ShownCurve[] {
  const { body, shape, mapping, fontPx, held } = request;
  const { window, scale } = mapping;
  const repeats = chartRepeats(body, shape, window, { gapKm: (1.75 * fontPx) / scale.perKm, most: 9 });
  const wanted = [...held, ...fixed, ...roundRates(request), ...repeats.map(({ condition }) => condition)];
  const unique = wanted.filter((each, index) => wanted.findIndex((other) => sameCondition(each, other)) === index);
  return unique.flatMap((condition) => {
    const drawn = drawnCurve(request, condition);
    const isHeld = held.some((each) => sameCondition(each, condition));
    return drawn ? [{ ...drawn, isHeld }] : [];
  });
}

type DrawnCurve = Pick<ShownCurve, 'curve' | 'line'>;

/** What somebody typed may ask for an orbit beyond what the rates are defined for: the rest of the chart stands. */
function drawnCurve({ body, shape, mapping }: CurveRequest, condition: ChartCondition): DrawnCurve | null {
  try {
    const curve = chartCurve(body, shape, condition);
    return curve && { curve, line: chartLine(body, shape, curve, mapping.window) };
  } catch {
    return null;
  }
}

/** A handful on each side of polar over the inclinations shown; polar itself is drawn apart. */
function roundRates({ body, shape, mapping, rateUnit }: CurveRequest): ChartCondition[] {
  const { window } = mapping;
  const { perCore } = unitOf('angleRate', rateUnit === 'degPerYear' ? 'deg/yr' : 'deg/day');
  const lowKm = Math.max(window.fromKm, chartFloor(body, shape).altitudeKm);
  const rates = [window.fromRad, window.toRad].flatMap((inclinationRad) => {
    const rate = nodeRate(body, shape, { altitudeKm: lowKm, inclinationRad });
    return rate === null ? [] : [rate * perCore];
  });
  const [one, other] = rates;
  if (one === undefined || other === undefined || !(Math.abs(one - other) > 0)) return [];
  return niceTicks(Math.min(one, other), Math.max(one, other), 12)
    .filter((tick) => tick !== 0)
    .sort((first, second) => Math.abs(second) - Math.abs(first))
    .map((tick) => ({ kind: 'nodeRate', radPerS: tick / perCore }));
}

interface RatePoint {
  readonly altitudeKm: number;
  readonly inclinationRad: number;
}

function nodeRate(body: Body, shape: ChartShape, { altitudeKm, inclinationRad }: RatePoint): number | null {
  const eccentricity = eccentricityAt(body, shape, altitudeKm);
  if (eccentricity === null || !Number.isFinite(altitudeKm)) return null;
  const semiMajorAxisKm = body.equatorialRadiusKm + altitudeKm;
  const mean = { semiMajorAxisKm, eccentricity, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
  return secularRates(body, mean, 'second').nodeRadPerS;
}
