/** The node at the epoch: its right ascension and the local time of either node. */
import { meanSunRightAscensionRad } from '../../bodies/sun';
import { twoPi, wrapTwoPi } from '../../numerics/angles';
import { localTimeOfNodeH } from '../../orbit/localTime';
import { add, frac, group, mul, neg, num } from '../formula';
import { buildWorking, noteOnly } from '../workings/working';
import type { ReadingPoint, ReadingSpec } from './reading';

type Node = 'ascending' | 'descending';

function noLocalTime({ body, epochJd }: ReadingPoint): string | null {
  if (body.id !== 'earth') return 'Local times at an epoch are worked out for the Earth only.';
  return epochJd === null ? 'Needs an epoch.' : null;
}

function localTime({ mean, epochJd }: ReadingPoint, node: Node, sun: 'mean' | 'apparent'): number {
  return epochJd === null ? Number.NaN : localTimeOfNodeH(mean.nodeRad, epochJd, { node, sun });
}

function localTimeReading(id: 'localTimeAscending' | 'localTimeDescending', node: Node): ReadingSpec {
  return {
    id,
    label: `Local time of the ${node} node`,
    symbol: node === 'ascending' ? 'LTAN' : 'LTDN',
    quantity: 'localTime',
    mark: 'node',
    ordered: false,
    sensitive: false,
    missing: noLocalTime,
    evaluate: (point) => localTime(point, node, 'mean'),
    alternates: (point) => [
      { label: 'Mean Sun', quantity: 'localTime', value: localTime(point, node, 'mean') },
      { label: 'Apparent Sun', quantity: 'localTime', value: localTime(point, node, 'apparent') },
    ],
    working: (point) => localTimeWorking(point, node),
  };
}

function localTimeWorking({ mean, epochJd }: ReadingPoint, node: Node) {
  if (epochJd === null) throw new Error('Expected an epoch for a local time, got none');
  const sun = meanSunRightAscensionRad(epochJd);
  const noon = node === 'ascending' ? 12 : 0;
  const hours = noon + ((mean.nodeRad - sun) * 24) / twoPi;
  const days = Math.floor(hours / 24);
  const turn = days === 0 ? [] : [num(-24 * days)];
  const angle = group('node', neg('sunAngle'));
  return buildWorking({
    inputs: { node: mean.nodeRad },
    constants: {
      sunAngle: { value: wrapTwoPi(sun), source: 'Right ascension of the mean Sun at the epoch, from its series.' },
    },
    first: [['localTime', add(noon, frac(mul(12, angle), num(Math.PI, 'π')), ...turn)]],
    result: 'localTime',
    note: `Mean local time of the ${node} node: with both angles in degrees the fraction is their difference over 15.`,
  });
}

export const nodeReadings: readonly ReadingSpec[] = [
  {
    id: 'nodeAtEpoch',
    label: 'Node at epoch',
    symbol: 'Ω',
    quantity: 'angle',
    mark: 'node',
    ordered: false,
    sensitive: false,
    evaluate: ({ mean }) => mean.nodeRad,
    working: ({ mean }) =>
      noteOnly(mean.nodeRad, 'Right ascension of the ascending node, mean equator and equinox of the epoch.'),
  },
  localTimeReading('localTimeAscending', 'ascending'),
  localTimeReading('localTimeDescending', 'descending'),
];
