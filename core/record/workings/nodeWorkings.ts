/** Workings of the node at the epoch and of the local time of either node. */
import { meanSunRightAscensionRad } from '../../bodies/sun';
import { degPerRad, twoPi, wrapTwoPi } from '../../numerics/angles';
import { add, type Expr, frac, group, neg, num } from '../formula';
import type { ReadingPoint } from '../readings/reading';
import { buildWorking, noteOnly, type Working } from './working';

export const nodeWorkings = {
  nodeAtEpoch: ({ mean }: ReadingPoint) =>
    noteOnly(mean.nodeRad, 'Right ascension of the ascending node, mean equator and equinox of the epoch.'),
  localTimeAscending: (point: ReadingPoint) => localTimeWorking(point, 'ascending'),
  localTimeDescending: (point: ReadingPoint) => localTimeWorking(point, 'descending'),
} as const;

function localTimeWorking({ mean, epochJd }: ReadingPoint, node: 'ascending' | 'descending'): Working {
  if (epochJd === null) throw new Error('Expected an epoch for a local time, got none');
  const sun = meanSunRightAscensionRad(epochJd);
  const noon = node === 'ascending' ? 12 : 0;
  const hours = noon + ((mean.nodeRad - sun) * 24) / twoPi;
  const days = Math.floor(hours / 24);
  const turn: Expr = days < 0 ? num(-24 * days) : neg(num(24 * days));
  const terms = [...(noon === 0 ? [] : [num(noon)]), frac(group('node', neg('sunAngle')), 15)];
  return buildWorking({
    inputs: { node: mean.nodeRad * degPerRad },
    constants: {
      sunAngle: {
        value: wrapTwoPi(sun) * degPerRad,
        source: 'Right ascension of the mean Sun at the epoch, from its series.',
      },
    },
    first: [['localTime', add(...terms, ...(days === 0 ? [] : [turn]))]],
    result: 'localTime',
    note: `Mean local time of the ${node} node: 15° of right ascension an hour from the mean Sun, which stands at 12 h.`,
  });
}
