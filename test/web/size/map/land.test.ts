import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { describe, expect, it } from 'vitest';
import { outlineOf } from '../../../../web/build/landOutline';
import { type Land, landOf } from '../../../../web/size/map/land';

const file = createRequire(import.meta.url).resolve('world-atlas/land-110m.json');
const land = landOf(outlineOf(JSON.parse(readFileSync(file, 'utf8'))));

/** Even-odd rule on the plane of longitudes and latitudes, as the map fills it, with what reaches over its edges. */
function isLand(shores: Land, longitude: number, latitude: number): boolean {
  let inside = false;
  for (const shift of [-360, 0, 360]) {
    for (const { area } of shores) {
      for (const [index, [x1, y1]] of area.entries()) {
        const [x0, y0] = area[(index || area.length) - 1] ?? [x1, y1];
        const crossesAt = x0 + ((latitude - y0) / (y1 - y0)) * (x1 - x0) + shift;
        if (y0 > latitude !== y1 > latitude && longitude < crossesAt) inside = !inside;
      }
    }
  }
  return inside;
}

describe('the land on the map', () => {
  it.each([
    ['Madrid', -3.7, 40.4, true],
    ['Brasília', -47.9, -15.8, true],
    ['Alice Springs', 133.9, -23.7, true],
    ['the South Pole', 0, -89.5, true],
    ['far eastern Siberia, beyond the antimeridian', -175, 67, true],
    ['the middle of the Pacific', -140, 0, false],
    ['the middle of the Atlantic', -35, 30, false],
    ['the Caspian Sea', 51, 41, false],
    ['the North Pole', 0, 89, false],
  ] as const)('%s', (_, longitude, latitude, expected) => expect(isLand(land, longitude, latitude)).toBe(expected));

  it('leaps nowhere across the map', () => {
    for (const { line } of land) {
      for (const [index, [longitude]] of line.entries()) {
        expect(Math.abs(longitude - (line[index - 1]?.[0] ?? longitude))).toBeLessThan(30);
      }
    }
  });
});
