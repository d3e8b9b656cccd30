/** Shapes and scales for the drawings made by hand. */

export type Point = readonly [number, number];

const round = (value: number): string => (Math.round(value * 10) / 10).toString();

export function squarePath(x: number, y: number, half: number): string {
  return `M${round(x - half)} ${round(y - half)}h${2 * half}v${2 * half}h${-2 * half}z`;
}

export function diamondPath(x: number, y: number, half: number): string {
  return `M${round(x)} ${round(y - half)}l${half} ${half}l${-half} ${half}l${-half} ${-half}z`;
}

/** Counter-clockwise arc between two angles (rad) around a centre, on a screen whose y points down. */
export function arcPath([x, y]: Point, radius: number, fromRad: number, toRad: number): string {
  const sweep = toRad - fromRad;
  const at = (angle: number) => `${round(x + radius * Math.cos(angle))} ${round(y - radius * Math.sin(angle))}`;
  const large = Math.abs(sweep) > Math.PI ? 1 : 0;
  return `M${at(fromRad)}A${round(radius)} ${round(radius)} 0 ${large} ${sweep > 0 ? 0 : 1} ${at(toRad)}`;
}

/** An arrow head at the end of an arc, pointing along it. */
export function arrowHead([x, y]: Point, radius: number, atRad: number, counterClockwise: boolean): string {
  const turn = counterClockwise ? 1 : -1;
  const [cx, cy] = [x + radius * Math.cos(atRad), y - radius * Math.sin(atRad)];
  const along: Point = [-turn * Math.sin(atRad), -turn * Math.cos(atRad)];
  const side: Point = [Math.cos(atRad), -Math.sin(atRad)];
  const corner = (back: number, out: number) =>
    `${round(cx - back * along[0] + out * side[0])} ${round(cy - back * along[1] + out * side[1])}`;
  return `M${corner(9, 4.5)}L${corner(0, 0)}L${corner(9, -4.5)}`;
}

/** Round numbers that cover a range, about as many as asked for, 0 among them where it is inside. */
export function niceTicks(low: number, high: number, count: number): number[] {
  const rough = (high - low) / count;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((each) => each * power >= rough) ?? 10) * power;
  // An end of the range that is a tick but for rounding counts as one.
  const first = Math.ceil(low / step - 1e-9);
  const last = Math.floor(high / step + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, k) => Number(((first + k) * step).toPrecision(12)));
}

const spansDays = [1, 3, 10, 30, 100, 365, 3650] as const;

/** The longest of a few round spans in which neither angle rate (rad/day) sweeps more than half a turn. */
export function arcSpanDays(...ratesRadPerDay: readonly number[]): number {
  const fastest = Math.max(...ratesRadPerDay.map(Math.abs));
  return [...spansDays].reverse().find((days) => days * fastest <= 2.6) ?? spansDays[0];
}
