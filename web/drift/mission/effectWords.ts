/** The ledger in words and numbers: rows, sum, what was left out. Pure. */
import {
  degPerRad,
  type EffectChange,
  formatNumber,
  isoFromJulianDate,
  type LedgerEffect,
  type LeftOutBound,
  type LeftOutForce,
  type MissionSettings,
} from '../../../core/index';
import type { DragEnd, LedgerPart, MissionRequest } from '../../work/missionCalls';

export const effectNames: Readonly<Record<LedgerEffect, string>> = {
  j2: 'J2',
  j2SquareAndJ4: 'J2² and J4',
  evenZonals: 'higher even zonals',
  oddZonals: 'odd zonals',
  sun: 'Sun',
  moon: 'Moon',
  drag: 'drag',
  precession: 'precession of the equinox',
};

export const boundNames: Readonly<Record<LeftOutBound['effect'], string>> = {
  tesserals: 'tesserals',
  tides: 'tides',
  radiation: 'radiation pressure',
  density: 'density of the air',
  method: 'the method itself',
};

export interface EffectColumn {
  readonly id: string;
  readonly title: string;
  readonly unit: string;
  readonly hue: 'node' | 'perigee' | 'ink';
  readonly write: (change: EffectChange) => string;
}

const number = (value: number, digits: number) => formatNumber(value, { digits, plus: true });

/** Minutes and degrees with the digits that the smallest effect of a year still shows in. */
export function effectColumns(lengthUnit: 'km' | 'NM', apsis: string): { node: EffectColumn[]; shape: EffectColumn[] } {
  const perKm = lengthUnit === 'NM' ? 1 / 1.852 : 1;
  const minutes = (seconds: number | null) => (seconds === null ? '–' : number(seconds / 60, 1));
  return {
    node: [
      {
        id: 'node',
        title: 'node',
        unit: '°',
        hue: 'node',
        write: ({ nodeRad }) => number(nodeRad * degPerRad, 3),
      },
      {
        id: 'localTime',
        title: 'local time',
        unit: 'min',
        hue: 'node',
        write: ({ localTimeS }) => minutes(localTimeS),
      },
      {
        id: 'inclination',
        title: 'inclination',
        unit: '°',
        hue: 'ink',
        write: ({ inclinationRad }) => number(inclinationRad * degPerRad, 4),
      },
    ],
    shape: [
      {
        id: 'perigee',
        title: apsis,
        unit: '°',
        hue: 'perigee',
        write: ({ perigeeRad }) => number(perigeeRad * degPerRad, 1),
      },
      {
        id: 'eccentricity',
        title: 'eccentricity',
        unit: '',
        hue: 'ink',
        write: ({ eccentricity }) => number(eccentricity, 6),
      },
      {
        id: 'altitude',
        title: 'altitude',
        unit: lengthUnit,
        hue: 'ink',
        write: ({ altitudeKm }) => number(altitudeKm * perKm, 2),
      },
    ],
  };
}

/** All bounds but that of the air's density, which has a sentence of its own; null where none is known. */
export function leftOutSum(bounds: readonly LeftOutBound[]) {
  const counted = bounds.filter(({ effect }) => effect !== 'density');
  if (counted.length === 0) return null;
  const sum = (value: (bound: LeftOutBound) => number) => counted.reduce((total, bound) => total + value(bound), 0);
  const nodeDeg = sum(({ nodeRad }) => nodeRad) * degPerRad;
  return {
    nodeDeg,
    localTimeMin: nodeDeg * 4,
    inclinationDeg: sum(({ inclinationRad }) => inclinationRad) * degPerRad,
    eccentricity: sum(({ eccentricity }) => eccentricity),
  };
}

/** Two figures of a size. */
export function sizeText(size: number): string {
  const digits = size > 0 ? Math.max(0, Math.min(7, 1 - Math.floor(Math.log10(size)))) : 1;
  return formatNumber(size, { digits });
}

/** What the ledger has no row for: switched off, or not to be had, with the reason. */
export function absentText({ entry }: MissionSettings, leftOut: readonly LeftOutForce[]): string[] {
  const off = [entry.sun ? '' : 'Sun', entry.moon ? '' : 'Moon', entry.drag ? '' : 'drag'].filter(
    (name) => name !== '',
  );
  const reasons = leftOut.map(({ reason }) => reason);
  return off.length > 0 ? [`Switched off: ${off.join(', ')}.`, ...reasons] : reasons;
}

/** “Half to twice this density: local time −1.7 to −8.9 min at the end, …”. Null without drag. */
export function dragText({ dragSpread }: LedgerPart, { spanDays }: MissionRequest): string | null {
  if (!dragSpread) return null;
  const { low, high } = dragSpread;
  const lead = 'Air density is uncertain by a factor of two or more. From half to twice what is assumed here';
  if (low.endedBy !== 'span' || high.endedBy !== 'span') {
    const latest = low.endedBy === 'span' ? 'beyond this span' : dateOf(low.endJd);
    const earliest = high.endedBy === 'span' ? 'beyond this span' : dateOf(high.endJd);
    return `${lead}, the orbit’s end moves from ${latest} to ${earliest}.`;
  }
  const both = (value: (end: DragEnd) => number, digits: number) =>
    `${number(value(low), digits)} to ${number(value(high), digits)}`;
  const clock =
    low.localTimeChangeH === null
      ? `the node moves ${both(({ nodeChangeRad }) => nodeChangeRad * degPerRad, 2)}°`
      : `local time moves ${both(({ localTimeChangeH }) => (localTimeChangeH ?? 0) * 60, 1)} min`;
  const height = both(({ semiMajorAxisChangeKm }) => semiMajorAxisChangeKm, 1);
  return `${lead}, ${clock} and the mean altitude ${height} km in ${formatNumber(spanDays, { digits: 0 })} days.`;
}

/** The day of a Julian date. */
const dateOf = (jd: number): string => isoFromJulianDate(jd).slice(0, 10);
