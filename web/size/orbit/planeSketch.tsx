/** The orbit in its plane, to scale, the line of nodes level, with where perigee goes. */
import { degPerRad, formatQuantity, type ResolvedOrbit, secondsPerDay, secularRates } from '../../../core/index';
import { arcPath, arcSpanDays, arrowHead, diamondPath, type Point, squarePath } from '../../parts/drawing';
import { useApp } from '../../state/appContext';

const size = 240;
const centre: Point = [size / 2, size / 2];
const reach = 84;

export function PlaneSketch({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const { lengthUnit } = useApp().preferences.values.value;
  const { body, mean } = orbit;
  const { semiMajorAxisKm: a, eccentricity: e, perigeeRad } = mean;
  const perPx = (a * (1 + e)) / reach;
  const altitude = (km: number) =>
    `${formatQuantity('length', km - body.equatorialRadiusKm, lengthUnit).replace(/\.\d+$/, '')} ${lengthUnit}`;
  const says = `Perigee ${altitude(a * (1 - e))}, apogee ${altitude(a * (1 + e))}`;
  const toDeg = perigeeRad * degPerRad;
  return (
    <figure class="sketch">
      <figcaption>
        <span class="figure-title">In its plane, to scale</span>
        <span class="soft small">{says}</span>
      </figcaption>
      <svg viewBox={`0 0 ${size} ${size}`} role="img" aria-label={`The orbit in its plane. ${says}.`}>
        <circle class="sketch-body" cx={centre[0]} cy={centre[1]} r={body.equatorialRadiusKm / perPx} />
        <path class="sketch-line" d={`M${centre[0] - 108} ${centre[1]}H${centre[0] + 108}`} />
        <g transform={`rotate(${-toDeg} ${centre[0]} ${centre[1]})`}>
          <ellipse
            class="sketch-orbit"
            cx={centre[0] - (a * e) / perPx}
            cy={centre[1]}
            rx={a / perPx}
            ry={(a * Math.sqrt(1 - e * e)) / perPx}
          />
          <path
            class="sketch-apsides"
            d={`M${centre[0] - (a * (1 + e)) / perPx} ${centre[1]}H${centre[0] + (a * (1 - e)) / perPx}`}
          />
        </g>
        <Apsis orbit={orbit} perPx={perPx} />
      </svg>
    </figure>
  );
}

function Apsis({ orbit, perPx }: { readonly orbit: ResolvedOrbit; readonly perPx: number }) {
  const { body, mean } = orbit;
  const { semiMajorAxisKm: a, eccentricity: e, perigeeRad } = mean;
  const perDay = secularRates(body, mean, 'second').perigeeRadPerS * secondsPerDay;
  const days = arcSpanDays(perDay);
  const at = (radiusKm: number, angle: number): Point => [
    centre[0] + (radiusKm / perPx) * Math.cos(angle),
    centre[1] - (radiusKm / perPx) * Math.sin(angle),
  ];
  const perigee = at(a * (1 - e), perigeeRad);
  const node = at((a * (1 - e * e)) / (1 + e * Math.cos(perigeeRad)), 0);
  const sweep = perDay * days;
  const arcRadius = reach + 14;
  return (
    <g>
      <path class="arc of-perigee" d={arcPath(centre, arcRadius, perigeeRad, perigeeRad + sweep)} />
      {Math.abs(sweep) > 0.1 && (
        <path class="arc of-perigee" d={arrowHead(centre, arcRadius, perigeeRad + sweep, sweep > 0)} />
      )}
      <path class="fill-node" d={squarePath(node[0], node[1], 5.5)} />
      <path class="fill-perigee" d={diamondPath(perigee[0], perigee[1], 8)} />
      <text class="sketch-note of-perigee" x={size - 2} y={size - 6} text-anchor="end">
        perigee in {days === 1 ? 'a day' : `${days} days`}
      </text>
    </g>
  );
}
