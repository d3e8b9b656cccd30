/** The quantities of a mission as the tables write them: averaged, and what the closed form says. Pure. */
import { degPerRad, formatClock, formatNumber } from '../../../core/index';
import { heights, localTimeLines, type MissionLines } from './missionLines';

export interface Quantity {
  readonly id: string;
  readonly title: string;
  readonly unit: string;
  readonly hue: 'node' | 'perigee' | 'ink';
  readonly averaged: (sample: number) => string;
  /** Null where the closed form says nothing. */
  readonly second: ((sample: number) => string) | null;
  readonly first: ((sample: number) => string) | null;
}

export function quantitiesOf(all: MissionLines): Quantity[] {
  return [...localTimeQuantities(all), ...elementQuantities(all), ...lightQuantities(all)];
}

type Column = ArrayLike<number> | null;

function number(values: Column, digits: number, plus = false) {
  return values && ((k: number) => formatNumber(values[k] ?? Number.NaN, { digits, plus }));
}

function localTimeQuantities(all: MissionLines): Quantity[] {
  const lines = localTimeLines(all);
  const { localTimeH } = all.result.history;
  if (!lines || !localTimeH) return [];
  const digits = lines.unit.short === 'min' ? 1 : 2;
  const clock: Quantity = {
    id: 'clock',
    title: 'Local time',
    unit: '',
    hue: 'node',
    averaged: (k) => formatClock(localTimeH[k] ?? Number.NaN).slice(0, 5),
    second: null,
    first: null,
  };
  const change: Quantity = {
    id: 'localTime',
    title: 'from the start',
    unit: lines.unit.short,
    hue: 'node',
    averaged: (k) => formatNumber(lines.averaged[k] ?? 0, { digits, plus: true }),
    second: number(lines.second, digits, true),
    first: number(lines.first, digits, true),
  };
  return [clock, change];
}

function elementQuantities(all: MissionLines): Quantity[] {
  const { columns } = all.result.history;
  const { closed, apsis, lengthUnit } = all;
  const turned = (values: Float64Array) => values.map((value) => (value - (values[0] ?? 0)) * degPerRad);
  const height = heights(all, columns);
  const inclination = columns.inclinationRad.map((rad) => rad * degPerRad);
  const held = inclination.map(() => inclination[0] ?? 0);
  const apoapsis = apsis === 'perigee' ? 'apogee' : 'apoapsis';
  const quantity = (
    id: string,
    words: Pick<Quantity, 'title' | 'unit' | 'hue'>,
    digits: number,
    lines: { readonly averaged: Float64Array; readonly second?: Float64Array; readonly first?: Float64Array },
    plus = false,
  ): Quantity => ({
    id,
    ...words,
    averaged: (k) => formatNumber(lines.averaged[k] ?? Number.NaN, { digits, plus }),
    second: number(lines.second ?? null, digits, plus),
    first: number(lines.first ?? null, digits, plus),
  });
  const node = { averaged: columns.nodeRad, second: closed.second.nodeRad, first: closed.first.nodeRad };
  const perigee = { averaged: columns.perigeeRad, second: closed.second.perigeeRad, first: closed.first.perigeeRad };
  const change = (lines: typeof node) => ({
    averaged: turned(lines.averaged),
    second: turned(lines.second),
    first: turned(lines.first),
  });
  return [
    quantity('node', { title: 'Node', unit: '°', hue: 'node' }, 2, change(node), true),
    quantity('inclination', { title: 'Inclination', unit: '°', hue: 'ink' }, 4, {
      averaged: inclination,
      second: held,
      first: held,
    }),
    quantity('perigeeAngle', { title: `ω of ${apsis}`, unit: '°', hue: 'perigee' }, 1, change(perigee), true),
    quantity('low', { title: `Altitude of ${apsis}`, unit: lengthUnit, hue: 'perigee' }, 1, {
      averaged: height.perigee,
    }),
    quantity('high', { title: `Altitude of ${apoapsis}`, unit: lengthUnit, hue: 'ink' }, 1, {
      averaged: height.apogee,
    }),
    quantity('eccentricity', { title: 'Eccentricity', unit: '', hue: 'ink' }, 5, { averaged: columns.eccentricity }),
  ];
}

function lightQuantities({ result }: MissionLines): Quantity[] {
  const light = result.sky?.light;
  if (!light?.ok) return [];
  const only = (id: string, title: string, unit: string, write: (k: number) => string): Quantity => ({
    id,
    title,
    unit,
    hue: 'ink',
    averaged: write,
    second: null,
    first: null,
  });
  return [
    only('beta', 'β', '°', (k) => formatNumber((light.betaRad[k] ?? 0) * degPerRad, { digits: 1, plus: true })),
    only('umbra', 'Umbra', 'min', (k) => formatNumber((light.umbraS[k] ?? 0) / 60, { digits: 1 })),
  ];
}
