/** The node seen from above the north pole, with the Sun where the epoch is known, and where both go. */
import { meanSunRightAscensionRad, type ResolvedOrbit, secondsPerDay, secularRates } from '../../../core/index';
import { arcPath, arcSpanDays, arrowHead, type Point, squarePath } from '../../parts/drawing';

const size = 240;
const centre: Point = [size / 2, size / 2];
const nodeReach = 70;
const sunReach = 96;

export function PoleSketch({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const { body, mean, epochJd } = orbit;
  const hasSun = epochJd !== null && body.id === 'earth';
  const nodePerDay = secularRates(body, mean, 'second').nodeRadPerS * secondsPerDay;
  const sunPerDay = hasSun && body.yearDays ? (2 * Math.PI) / body.yearDays : 0;
  const days = arcSpanDays(nodePerDay, sunPerDay);
  // With a Sun the face is a clock, noon at the top; without one the equinox points right.
  const sunRad = hasSun ? meanSunRightAscensionRad(epochJd) : 0;
  const turn = hasSun ? Math.PI / 2 - sunRad : 0;
  const says = hasSun ? 'clock face, Sun at 12 h' : 'equinox to the right';
  return (
    <figure class="sketch">
      <figcaption>
        <span class="figure-title">From above the north pole</span>
        <span class="soft small">{says}</span>
      </figcaption>
      <svg viewBox={`0 0 ${size} ${size}`} role="img" aria-label={`The ascending node from above the pole, ${says}.`}>
        <Face hasSun={hasSun} />
        {hasSun && <Sweep className="of-sun" radius={sunReach} from={Math.PI / 2} by={sunPerDay * days} />}
        {hasSun && <circle class="sketch-sun" cx={centre[0]} cy={centre[1] - sunReach} r={6.5} />}
        <NodeLine angle={mean.nodeRad + turn} by={nodePerDay * days} />
        <text class="sketch-note of-node" x={size - 2} y={size - 6} text-anchor="end">
          {Math.abs(nodePerDay * days) > 0.01
            ? `node in ${days === 1 ? 'a day' : `${days} days`}`
            : 'node stands still'}
        </text>
      </svg>
    </figure>
  );
}

function Face({ hasSun }: { readonly hasSun: boolean }) {
  const hours = hasSun ? [0, 6, 12, 18] : [];
  return (
    <g>
      <circle class="sketch-body" cx={centre[0]} cy={centre[1]} r={34} />
      <circle class="sketch-line" cx={centre[0]} cy={centre[1]} r={nodeReach} />
      {!hasSun && <path class="sketch-line" d={`M${centre[0]} ${centre[1]}H${centre[0] + 100}`} />}
      {hours.map((hour) => {
        const angle = ((hour - 12) / 24) * 2 * Math.PI + Math.PI / 2;
        return (
          <text
            key={hour}
            class="sketch-hour"
            x={centre[0] + 50 * Math.cos(angle)}
            y={centre[1] - 50 * Math.sin(angle)}
            dy="0.35em"
            text-anchor="middle"
          >
            {hour}
          </text>
        );
      })}
    </g>
  );
}

function NodeLine({ angle, by }: { readonly angle: number; readonly by: number }) {
  const [x, y]: Point = [centre[0] + nodeReach * Math.cos(angle), centre[1] - nodeReach * Math.sin(angle)];
  return (
    <g>
      <path class="sketch-plane" d={`M${2 * centre[0] - x} ${2 * centre[1] - y}L${x} ${y}`} />
      <Sweep className="of-node" radius={nodeReach + 12} from={angle} by={by} />
      <path class="fill-node" d={squarePath(x, y, 6)} />
    </g>
  );
}

interface SweepProps {
  readonly className: string;
  readonly radius: number;
  readonly from: number;
  readonly by: number;
}

function Sweep({ className, radius, from, by }: SweepProps) {
  return (
    <g>
      <path class={`arc ${className}`} d={arcPath(centre, radius, from, from + by)} />
      {Math.abs(by) > 0.1 && <path class={`arc ${className}`} d={arrowHead(centre, radius, from + by, by > 0)} />}
    </g>
  );
}
