/** The land of the Earth, Natural Earth 1:110 m, from the app's own files; fetched once, when a map is first drawn. */
import type { GeoPermissibleObjects } from 'd3-geo';
import { feature } from 'topojson-client';
import landUrl from 'world-atlas/land-110m.json?url';

type Topology = Parameters<typeof feature>[0];

let known: Promise<GeoPermissibleObjects> | null = null;

/** Rejects where the file cannot be had; the next call tries again. */
export function loadLand(): Promise<GeoPermissibleObjects> {
  known ??= fetchLand().catch((error: unknown) => {
    known = null;
    throw error;
  });
  return known;
}

async function fetchLand(): Promise<GeoPermissibleObjects> {
  const response = await fetch(landUrl);
  if (!response.ok) throw new Error(`The map of the land was expected, got status ${response.status}`);
  const topology = (await response.json()) as Topology;
  const { land } = topology.objects;
  if (!land) throw new Error('The object “land” was expected in the map, got none');
  return feature(topology, land);
}
