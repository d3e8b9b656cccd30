/** The node at the epoch: its right ascension and the local time of either node. */
import { localTimeOfNodeH } from '../../orbit/localTime';
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
  };
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
  },
  localTimeReading('localTimeAscending', 'ascending'),
  localTimeReading('localTimeDescending', 'descending'),
];
