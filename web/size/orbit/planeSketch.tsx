/** The orbit in its plane, to scale, the line of nodes level, with where perigee goes. */
import {
  degPerRad,
  formatNumber,
  type MeanElements,
  type ResolvedOrbit,
  secondsPerDay,
  secularRates,
  unitOf,
} from '../../../core/index';
import { arcPath, arcSpanDays, arrowHead, diamondPath, type Point, squarePath } from '../../parts/drawing';
import { useApp } from '../../state/appContext';

const size = 240;
const middle = size / 2;
/** Half the drawn length of the long axis. */
const reach = 84;

export function PlaneSketch({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const { lengthUnit } = useApp().preferences.values.value;
  const { body, mean } = orbit;
  const { semiMajorAxisKm: a, eccentricity: e, perigeeRad } = mean;
  const { symbol, perCore } = unitOf('length', lengthUnit);
  const altitude = (km: number) => `${formatNumber((km - body.equatorialRadiusKm) * perCore, { digits: 0 })} ${symbol}`;
  const [low, high] = body.id === 'earth' ? ['Perigee', 'apogee'] : ['Periapsis', 'apoapsis'];
  const says = `${low} ${altitude(a * (1 - e))}, ${high} ${altitude(a * (1 + e))}`;
  const frame = frameOf(mean);
  return (
    <figure class="sketch">
      <figcaption>
        <span class="figure-title">In its plane, to scale</span>
        <span class="soft small">{says}</span>
      </figcaption>
      <svg viewBox={`0 0 ${size} ${size}`} role="img" aria-label={`The orbit in its plane. ${says}.`}>
        <circle class="sketch-body" cx={frame.focus[0]} cy={frame.focus[1]} r={body.equatorialRadiusKm / frame.perPx} />
        <path class="sketch-line" d={`M12 ${frame.focus[1]}H${size - 12}`} />
        <g transform={`rotate(${-perigeeRad * degPerRad} ${middle} ${middle})`}>
          <ellipse class="sketch-orbit" cx={middle} cy={middle} rx={reach} ry={reach * Math.sqrt(1 - e * e)} />
          <path class="sketch-apsides" d={`M${middle - reach} ${middle}H${middle + reach}`} />
        </g>
        <Apsis orbit={orbit} frame={frame} />
      </svg>
    </figure>
  );
}

interface Frame {
  readonly perPx: number;
  /** Where the body stands: the focus, when the middle of the ellipse is in the middle of the sheet. */
  readonly focus: Point;
}

function frameOf({ semiMajorAxisKm, eccentricity, perigeeRad }: MeanElements): Frame {
  const off = eccentricity * reach;
  return {
    perPx: semiMajorAxisKm / reach,
    focus: [middle + off * Math.cos(perigeeRad), middle - off * Math.sin(perigeeRad)],
  };
}

/** Clear of the orbit at perigee, and wide enough to be seen around a low one. */
function arcRadius({ semiMajorAxisKm: a, eccentricity: e }: MeanElements, perPx: number): number {
  return Math.max((a * (1 - e)) / perPx + 14, 30);
}

function Apsis({ orbit, frame }: { readonly orbit: ResolvedOrbit; readonly frame: Frame }) {
  const { body, mean } = orbit;
  const { semiMajorAxisKm: a, eccentricity: e, perigeeRad } = mean;
  const { perPx, focus } = frame;
  const perDay = secularRates(body, mean, 'second').perigeeRadPerS * secondsPerDay;
  const days = arcSpanDays(perDay);
  const at = (radiusKm: number, angle: number): Point => [
    focus[0] + (radiusKm / perPx) * Math.cos(angle),
    focus[1] - (radiusKm / perPx) * Math.sin(angle),
  ];
  const perigee = at(a * (1 - e), perigeeRad);
  const node = at((a * (1 - e * e)) / (1 + e * Math.cos(perigeeRad)), 0);
  const sweep = perDay * days;
  const radius = arcRadius(mean, perPx);
  const name = body.id === 'earth' ? 'perigee' : 'periapsis';
  return (
    <g>
      <path class="arc of-perigee" d={arcPath(focus, radius, perigeeRad, perigeeRad + sweep)} />
      {Math.abs(sweep) > 0.1 && (
        <path class="arc of-perigee" d={arrowHead(focus, radius, perigeeRad + sweep, sweep > 0)} />
      )}
      <path class="fill-node" d={squarePath(node[0], node[1], 5.5)} />
      <path class="fill-perigee" d={diamondPath(perigee[0], perigee[1], 8)} />
      <text class="sketch-note of-perigee" x={size - 2} y={size - 6} text-anchor="end">
        {Math.abs(sweep) > 0.01 ? `${name} in ${days === 1 ? 'a day' : `${days} days`}` : `${name} stands still`}
      </text>
    </g>
  );
}
