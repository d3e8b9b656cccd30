/// <reference path="./outline.d.ts" />
/** The land of the Earth, Natural Earth 1:110 m, from the app's own files; fetched once, when a map is first drawn. */

type Degrees = readonly [eastLongitude: number, latitude: number];

/**
 * One coast or inner shore, from its first point back to it. Longitudes go on beyond ±180° where it crosses the
 * antimeridian, so that it is drawn whole, once to each side of the map too.
 */
export interface Shore {
  readonly line: readonly Degrees[];
  /** What it bounds: closed along the map's edge where it goes round a pole. */
  readonly area: readonly Degrees[];
}
export type Land = readonly Shore[];

/** Of each shore the first point and the steps to the next ones, longitude and latitude in tenths of a degree. */
export type Outline = readonly (readonly number[])[];

const degreesPerStep = 0.1;

let known: Promise<Land> | null = null;

/** Rejects where the file cannot be had; the next call tries again. */
export function loadLand(): Promise<Land> {
  known ??= fetchLand().catch((error: unknown) => {
    known = null;
    throw error;
  });
  return known;
}

async function fetchLand(): Promise<Land> {
  const { shores } = await import('world-atlas/land-110m.json?outline');
  return landOf(shores);
}

export function landOf(outline: Outline): Land {
  return outline.map(shoreOf);
}

function shoreOf(steps: Outline[number]): Shore {
  const line: Degrees[] = [];
  let [x, y] = [0, 0];
  for (let index = 0; index < steps.length; index += 2) {
    x += steps[index] ?? 0;
    y += steps[index + 1] ?? 0;
    line.push([x * degreesPerStep, y * degreesPerStep]);
  }
  const [first = 0, latitude = 0] = line[0] ?? [];
  const last = line.at(-1)?.[0] ?? first;
  if (Math.abs(last - first) < 180) return { line, area: line };
  const pole = latitude < 0 ? -90 : 90;
  return { line, area: [...line, [last, pole], [first, pole]] };
}
