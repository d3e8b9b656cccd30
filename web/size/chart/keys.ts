/** Keys on the chart: arrows move the orbit, plus and minus zoom, 0 shows the whole, Enter snaps. */
import { radPerDeg } from '../../../core/index';
import type { Chart } from './chartState';
import { moveTo, snapToNearest } from './moveOrbit';
import { zoomAt } from './steering';

const fineRad = 0.01 * radPerDeg;
const fineKm = 1;
/** With Shift. */
const coarse = { rad: 100, km: 10 } as const;

const arrows: Readonly<Record<string, readonly [right: number, up: number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

type Key = Pick<KeyboardEvent, 'key' | 'shiftKey' | 'ctrlKey' | 'metaKey' | 'altKey'>;

/** Whether the key meant something here. */
export function moveByKey(chart: Chart, { key, shiftKey, ctrlKey, metaKey, altKey }: Key): boolean {
  if (ctrlKey || metaKey || altKey) return false;
  const arrow = arrows[key];
  const point = chart.point.peek();
  if (arrow && point) {
    const [right, up] = arrow;
    moveTo(
      chart,
      {
        inclinationRad: point.inclinationRad + right * fineRad * (shiftKey ? coarse.rad : 1),
        altitudeKm: point.altitudeKm + up * fineKm * (shiftKey ? coarse.km : 1),
      },
      0,
    );
    return true;
  }
  if (key === '+' || key === '=') zoomAt(chart, 1.8);
  else if (key === '-') zoomAt(chart, 1 / 1.8);
  else if (key === '0') chart.zoom.value = null;
  else if (key === 'Enter') snapToNearest(chart);
  else return false;
  return true;
}
