/** A 24-hour face, noon above: a hand, where it stood at first, the way between them, and a sector it should stay in. */
import './dial.css';

export interface DialProps {
  readonly startH: number;
  readonly nowH: number;
  /** To either side of the start, hours. */
  readonly boxH: number;
  /** What the face shows, in words. */
  readonly words: string;
}

const size = 160;
const centre = size / 2;
const radius = 62;

/** Noon above, hours running clockwise: 18 at the right. */
function placeOf(hours: number, at: number): readonly [number, number] {
  const angle = ((hours - 12) / 24) * 2 * Math.PI;
  return [centre + at * Math.sin(angle), centre - at * Math.cos(angle)];
}

const text = ([x, y]: readonly [number, number]): string => `${x.toFixed(2)} ${y.toFixed(2)}`;

function arc(fromH: number, toH: number, at: number): string {
  const isLong = Math.abs(toH - fromH) > 12 ? 1 : 0;
  const sweep = toH > fromH ? 1 : 0;
  return `${text(placeOf(fromH, at))} A ${at} ${at} 0 ${isLong} ${sweep} ${text(placeOf(toH, at))}`;
}

export function Dial({ startH, nowH, boxH, words }: DialProps) {
  const sector = `M ${centre} ${centre} L ${arc(startH - boxH, startH + boxH, radius)} Z`;
  const moved = Math.max(-23.99, Math.min(23.99, nowH - startH));
  const start = placeOf(startH, radius);
  const hand = placeOf(nowH, radius - 7);
  const sun = placeOf(12, radius);
  return (
    <svg class="dial" viewBox={`0 0 ${size} ${size}`} role="img" aria-label={words}>
      <circle class="dial-face" cx={centre} cy={centre} r={radius} />
      <path class="dial-box" d={sector} />
      {Array.from({ length: 24 }, (_, hour) => (
        <Tick key={placeOf(hour, 1).join()} hour={hour} />
      ))}
      <line class="dial-start" x1={centre} y1={centre} x2={start[0]} y2={start[1]} />
      {Math.abs(moved) > 0.02 && <path class="dial-way" d={`M ${arc(startH, startH + moved, radius + 6)}`} />}
      <line class="dial-hand" x1={centre} y1={centre} x2={hand[0]} y2={hand[1]} />
      <circle class="dial-hub" cx={centre} cy={centre} r={4} />
      <circle class="dial-sun" cx={sun[0]} cy={sun[1]} r={6} />
    </svg>
  );
}

function Tick({ hour }: { readonly hour: number }) {
  const isMain = hour % 6 === 0;
  const [outer, inner] = [placeOf(hour, radius), placeOf(hour, radius - (isMain ? 8 : 4))];
  const label = placeOf(hour, radius - 19);
  return (
    <>
      <line class="dial-tick" x1={outer[0]} y1={outer[1]} x2={inner[0]} y2={inner[1]} />
      {isMain && (
        <text class="dial-hour" x={label[0]} y={label[1]}>
          {hour}
        </text>
      )}
    </>
  );
}
