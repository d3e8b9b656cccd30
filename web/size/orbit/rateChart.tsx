/** Node and perigee rate against inclination, at the a and e of this orbit, with the orbit as two marks. */
import {
  degPerRad,
  formatNumber,
  type MeanElements,
  type RateCurves,
  type ResolvedOrbit,
  ratesOverInclination,
  type Theory,
  unitOf,
} from '../../../core/index';
import { diamondPath, linePath, niceTicks, squarePath } from '../../parts/drawing';
import { useWidth } from '../../parts/useWidth';
import { useApp } from '../../state/appContext';

const height = 240;
const inset = { left: 58, right: 12, top: 10, bottom: 44 };
const samples = 181;

export function RateChart({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const { ref, width } = useWidth<HTMLElement>();
  const { rateUnit } = useApp().preferences.values.value;
  const unit = unitOf('angleRate', rateUnit === 'degPerYear' ? 'deg/yr' : 'deg/day');
  return (
    <figure class="rate-chart" ref={ref}>
      <figcaption>
        <span class="figure-title">Drift against inclination</span>
        <span class="soft small">this a and e, {unit.symbol.replace('deg', '°')}</span>
      </figcaption>
      {width > 0 && <Drawing orbit={orbit} width={width} perCore={unit.perCore} />}
    </figure>
  );
}

interface DrawingProps {
  readonly orbit: ResolvedOrbit;
  readonly width: number;
  readonly perCore: number;
}

function Drawing({ orbit, width, perCore }: DrawingProps) {
  const second = ratesOverInclination(orbit.body, orbit.mean, 'second', samples);
  const first = ratesOverInclination(orbit.body, orbit.mean, 'first', samples);
  const frame = chartFrame(second, width, perCore);
  return (
    <svg viewBox={`0 0 ${width} ${height}`} width={width} height={height} role="img" aria-label={spoken(orbit)}>
      <Axes frame={frame} width={width} />
      <SunRate orbit={orbit} frame={frame} width={width} />
      <Curves curves={first} frame={frame} theory="first" />
      <Curves curves={second} frame={frame} theory="second" />
      <CurveNames curves={second} frame={frame} />
      <Marks mean={orbit.mean} curves={second} frame={frame} />
    </svg>
  );
}

interface Frame {
  readonly x: (inclinationRad: number) => number;
  readonly y: (radPerS: number) => number;
  readonly ticks: readonly number[];
  /** Decimals that tell the ticks apart. */
  readonly digits: number;
  readonly perCore: number;
}

function chartFrame({ nodeRadPerS, perigeeRadPerS }: RateCurves, width: number, perCore: number): Frame {
  const largest = Math.max(...nodeRadPerS.map(Math.abs), ...perigeeRadPerS.map(Math.abs)) * perCore * 1.06 || 1;
  const plotWidth = width - inset.left - inset.right;
  const middle = inset.top + (height - inset.top - inset.bottom) / 2;
  const ticks = niceTicks(-largest, largest, 5);
  return {
    x: (inclinationRad) => inset.left + (plotWidth * inclinationRad) / Math.PI,
    y: (radPerS) => middle - ((middle - inset.top) * radPerS * perCore) / largest,
    ticks,
    digits: Math.max(0, Math.min(8, -Math.floor(Math.log10((ticks[1] ?? 1) - (ticks[0] ?? 0))))),
    perCore,
  };
}

function Axes({ frame, width }: { readonly frame: Frame; readonly width: number }) {
  const bottom = height - inset.bottom;
  return (
    <g class="chart-axes">
      <rect
        class="chart-ground"
        x={inset.left}
        y={inset.top}
        width={width - inset.left - inset.right}
        height={bottom - inset.top}
      />
      {frame.ticks.map((tick) => {
        const y = frame.y(tick / frame.perCore);
        return (
          <g key={tick}>
            <path class={tick === 0 ? 'chart-zero' : 'chart-grid'} d={`M${inset.left} ${y}H${width - inset.right}`} />
            <text x={inset.left - 8} y={y} dy="0.35em" text-anchor="end">
              {formatNumber(tick, { digits: frame.digits, plus: true })}
            </text>
          </g>
        );
      })}
      {(width < 440 ? [0, 60, 120, 180] : [0, 30, 60, 90, 120, 150, 180]).map((deg) => (
        <g key={deg}>
          <path class="chart-tick" d={`M${frame.x(deg / degPerRad)} ${bottom}v6`} />
          <text x={frame.x(deg / degPerRad)} y={bottom + 21} text-anchor={deg === 180 ? 'end' : 'middle'}>
            {deg}°
          </text>
        </g>
      ))}
      <text class="chart-name" x={width - inset.right} y={height - 4} text-anchor="end">
        inclination
      </text>
    </g>
  );
}

interface SunProps {
  readonly orbit: ResolvedOrbit;
  readonly frame: Frame;
  readonly width: number;
}

/** The rate of the mean Sun: where the node's curve meets it, the orbit is Sun-synchronous. */
function SunRate({ orbit, frame, width }: SunProps) {
  const { yearDays } = orbit.body;
  if (yearDays === null) return null;
  const y = frame.y((2 * Math.PI) / (yearDays * 86_400));
  // Off the chart where rates are slower than the Sun's.
  if (y < inset.top + 16) return null;
  return (
    <g class="chart-sun">
      <path d={`M${inset.left} ${y}H${width - inset.right}`} />
      <text x={inset.left + 8} y={y - 6}>
        Sun
      </text>
    </g>
  );
}

interface CurvesProps {
  readonly curves: RateCurves;
  readonly frame: Frame;
  readonly theory: Theory;
}

function Curves({ curves, frame, theory }: CurvesProps) {
  const path = (rates: Float64Array) =>
    linePath(Array.from(rates, (rate, k) => [frame.x(curves.inclinationRad[k] ?? 0), frame.y(rate)] as const));
  return (
    <g class={`curve order-${theory}`}>
      <path class="of-node" d={path(curves.nodeRadPerS)} />
      <path class="of-perigee" d={path(curves.perigeeRadPerS)} />
    </g>
  );
}

/** Names stand clear of the curves: under the node's left end, beside the perigee's. */
function CurveNames({ curves, frame }: Omit<CurvesProps, 'theory'>) {
  const at = Math.round(samples * 0.035);
  const x = frame.x(curves.inclinationRad[at] ?? 0);
  return (
    <g class="curve-names">
      <text class="of-node" x={x} y={frame.y(curves.nodeRadPerS[at] ?? 0) + 22}>
        ■ node
      </text>
      <text class="of-perigee" x={frame.x(0.42)} y={frame.y(curves.perigeeRadPerS[0] ?? 0) + 12}>
        ◆ perigee
      </text>
    </g>
  );
}

function Marks({ mean, curves, frame }: { readonly mean: MeanElements } & Omit<CurvesProps, 'theory'>) {
  const x = frame.x(mean.inclinationRad);
  const at = (rates: Float64Array) => {
    const exact = (mean.inclinationRad / Math.PI) * (samples - 1);
    const low = Math.min(Math.floor(exact), samples - 2);
    const share = exact - low;
    return frame.y((rates[low] ?? 0) * (1 - share) + (rates[low + 1] ?? 0) * share);
  };
  return (
    <g class="chart-marks">
      <path class="chart-candidate" d={`M${x} ${inset.top}V${height - inset.bottom}`} />
      <path class="fill-node" d={squarePath(x, at(curves.nodeRadPerS), 6.5)} />
      <path class="fill-perigee" d={diamondPath(x, at(curves.perigeeRadPerS), 9)} />
    </g>
  );
}

function spoken({ mean, body }: ResolvedOrbit): string {
  const deg = (mean.inclinationRad * degPerRad).toFixed(2);
  return `Node and perigee rate against inclination at ${body.name}; this orbit stands at ${deg}°. The node stands still at 90°, the perigee near 63.4° and 116.6°.`;
}
