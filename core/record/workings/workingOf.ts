/** The working of any reading. Apart from the readings, so that a page can show those before it loads this. */
import type { ReadingId, ReadingPoint } from '../readings/reading';
import { driftWorkings } from './driftWorkings';
import { nodeWorkings } from './nodeWorkings';
import { shapeWorkings } from './shapeWorkings';
import { timeWorkings } from './timeWorkings';
import type { Working } from './working';

const workings: Readonly<Record<ReadingId, (point: ReadingPoint) => Working>> = {
  ...driftWorkings,
  ...nodeWorkings,
  ...timeWorkings,
  ...shapeWorkings,
};

/**
 * Formula and numbers behind a reading, by first and by second order. For readings the orbit has:
 * throws where the epoch, the day or the year that the reading needs is lacking.
 */
export function workingOf(point: ReadingPoint, id: ReadingId): Working {
  return workings[id](point);
}
