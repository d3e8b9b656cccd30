/** The land of the Earth, Natural Earth 1:110 m, from the app's own files; fetched once, when a map is first drawn. */
import { feature } from 'topojson-client';
import landUrl from 'world-atlas/land-110m.json?url';

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

type Topology = Parameters<typeof feature>[0];

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
  const response = await fetch(landUrl);
  if (!response.ok) throw new Error(`The map of the land was expected, got status ${response.status}`);
  return landOf((await response.json()) as Topology);
}

export function landOf(topology: Topology): Land {
  const { land } = topology.objects;
  if (!land) throw new Error('The object “land” was expected in the map, got none');
  const shape = feature(topology, land);
  const shapes = shape.type === 'FeatureCollection' ? shape.features : [shape];
  const rings = shapes.flatMap(({ geometry }) => {
    if (geometry.type === 'MultiPolygon') return geometry.coordinates.flat();
    return geometry.type === 'Polygon' ? geometry.coordinates : [];
  });
  return rings.map(shoreOf);
}

function shoreOf(ring: readonly (readonly number[])[]): Shore {
  const line: Degrees[] = [];
  for (const [longitude = 0, latitude = 0] of ring) {
    const before = line.at(-1)?.[0] ?? longitude;
    line.push([longitude + 360 * Math.round((before - longitude) / 360), latitude]);
  }
  const [first = 0, latitude = 0] = line[0] ?? [];
  const last = line.at(-1)?.[0] ?? first;
  if (Math.abs(last - first) < 180) return { line, area: line };
  const pole = latitude < 0 ? -90 : 90;
  return { line, area: [...line, [last, pole], [first, pole]] };
}
