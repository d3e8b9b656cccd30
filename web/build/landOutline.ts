/**
 * The land as the app keeps it: of the shared borders of a topology only the shores, as steps of a tenth of a degree,
 * which is a third of a pixel on a map as wide as a page. That is less than half of the file it is made from.
 */
import { readFileSync } from 'node:fs';
import { feature } from 'topojson-client';
import type { Plugin } from 'vite';

type Topology = Parameters<typeof feature>[0];

/** One shore: east longitude and latitude of its first point, then the steps to the next ones, all in tenths of a degree. */
type OutlinedShore = readonly number[];

const stepsPerDegree = 10;

/** Answers imports of `….json?outline`, in the build and in the development server. */
export function landOutline(): Plugin {
  return {
    name: 'driftbook-land-outline',
    enforce: 'pre',
    load: {
      filter: { id: /\.json\?outline$/ },
      handler(id) {
        const topology = JSON.parse(readFileSync(id.replace(/\?outline$/, ''), 'utf8')) as Topology;
        return { code: `export const shores = ${JSON.stringify(outlineOf(topology))};`, moduleType: 'js' };
      },
    },
  };
}

/** Throws if the topology has no object “land”. */
export function outlineOf(topology: Topology): OutlinedShore[] {
  const { land } = topology.objects;
  if (!land) throw new Error(`Expected an object “land”, got ${Object.keys(topology.objects).join(', ') || 'none'}`);
  const shape = feature(topology, land);
  const shapes = shape.type === 'FeatureCollection' ? shape.features : [shape];
  const rings = shapes.flatMap(({ geometry }) => {
    if (geometry.type === 'MultiPolygon') return geometry.coordinates.flat();
    return geometry.type === 'Polygon' ? geometry.coordinates : [];
  });
  return rings.map(outlinedShore);
}

/** Longitudes go on beyond ±180° where the shore crosses the antimeridian. */
function outlinedShore(ring: readonly (readonly number[])[]): OutlinedShore {
  const numbers: number[] = [];
  const turn = 360 * stepsPerDegree;
  let [x, y] = [0, 0];
  for (const [longitude = 0, latitude = 0] of ring) {
    const isFirst = numbers.length === 0;
    const stepY = Math.round(latitude * stepsPerDegree) - y;
    const acrossX = Math.round(longitude * stepsPerDegree) - x;
    const stepX = isFirst ? acrossX : acrossX - turn * Math.round(acrossX / turn);
    if (!isFirst && stepX === 0 && stepY === 0) continue;
    numbers.push(stepX, stepY);
    x += stepX;
    y += stepY;
  }
  return numbers;
}
