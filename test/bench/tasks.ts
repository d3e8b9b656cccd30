/** What is measured: the public calls of `core` on the path from a keystroke to a reading. */
import {
  gravitySets,
  heightsAlongOrbit,
  type MeanElements,
  meanFromState,
  parseTle,
  periods,
  readingsOf,
  type SecularRates,
  secularRates,
  stateFromMean,
} from '../../core/index';
import { averagedTasks } from './averagedTasks';
import { chartTasks } from './chartTasks';
import { historyTasks } from './historyTasks';
import { type Columns, inlinedFirst, inlinedSecond } from './inlined';
import { lightTasks } from './lightTasks';
import type { Task } from './measure';
import { repeatTasks } from './repeatTasks';
import { columnsOf, fieldOf, randomOrbits } from './samples';
import { solveTasks } from './solveTasks';

const earth = gravitySets.EGM2008;

/** An invented set, checksums right. */
const twoLines = [
  'SKERRY 1',
  '1 99001U 26001A   26152.50000000  .00000100  00000-0  10000-4 0  9995',
  '2 99001  97.6790 210.0000 0011000  90.0000 270.0000 15.00000000    19',
].join('\n');

/** In groups that are measured one after the other: the bounded ones first, before anything else fills the memory. */
export function taskGroups(): readonly (readonly Task[])[] {
  const orbits = randomOrbits();
  const columns = columnsOf(orbits);
  return [
    [...inlinedTasks(columns), ...ratesTasks(orbits, columns)],
    otherTasks(orbits),
    averagedTasks(),
    chartTasks(),
    solveTasks(),
    repeatTasks(),
    historyTasks(),
    lightTasks(),
  ];
}

/** Times that a run goes through the list, so that it lasts milliseconds. */
const passes = 50;

function repeated(name: string, orbits: number, pass: () => number): Task {
  const run = () => {
    let sum = 0;
    for (let index = 0; index < passes; index += 1) sum += pass();
    return sum;
  };
  return { name, calls: orbits * passes, run };
}

function inlinedTasks(columns: Columns): readonly Task[] {
  const field = fieldOf(earth);
  const orbits = columns.axisKm.length;
  return [
    repeated('first order, inlined', orbits, () => inlinedFirst(field, columns)),
    repeated('second order, inlined', orbits, () => inlinedSecond(field, columns)),
  ];
}

/** The results go to the same columns as the inlined ones, so that only the way to them differs. */
function ratesTasks(orbits: readonly MeanElements[], columns: Columns): readonly Task[] {
  const { nodeRadPerS, perigeeRadPerS, meanAnomalyRadPerS } = columns;
  const store = (index: number, rates: SecularRates) => {
    nodeRadPerS[index] = rates.nodeRadPerS;
    perigeeRadPerS[index] = rates.perigeeRadPerS;
    meanAnomalyRadPerS[index] = rates.meanAnomalyRadPerS;
  };
  const first = () => {
    for (let index = 0; index < orbits.length; index += 1) {
      store(index, secularRates(earth, orbits[index] as MeanElements, 'first'));
    }
    return nodeRadPerS[0] ?? Number.NaN;
  };
  const second = () => {
    for (let index = 0; index < orbits.length; index += 1) {
      store(index, secularRates(earth, orbits[index] as MeanElements, 'second'));
    }
    return nodeRadPerS[0] ?? Number.NaN;
  };
  return [
    repeated('secularRates, first order', orbits.length, first),
    repeated('secularRates, second order', orbits.length, second),
  ];
}

function otherTasks(orbits: readonly MeanElements[]): readonly Task[] {
  const states = orbits.map((orbit) => stateFromMean(earth, orbit));
  const over = <T>(name: string, items: readonly T[], value: (item: T) => number): Task => ({
    name,
    calls: items.length,
    run: () => items.reduce((sum, item) => sum + value(item), 0),
  });
  return [
    over('periods, second order', orbits, (orbit) => periods(earth, orbit, 'second').nodalS),
    over('stateFromMean', orbits, (orbit) => stateFromMean(earth, orbit).positionKm[0]),
    over('meanFromState', states, (state) => meanFromState(earth, state).semiMajorAxisKm),
    over('heightsAlongOrbit', orbits.slice(0, 100), (orbit) => heightsAlongOrbit(earth, orbit).leastKm),
    over('readingsOf', orbits.slice(0, 20), (mean) => readingsOf({ ...readingPoint, mean }).length),
    over('parseTle', new Array<string>(1000).fill(twoLines), (text) => {
      const set = parseTle(text);
      return set.ok ? set.epochJd : Number.NaN;
    }),
  ];
}

const readingPoint = {
  body: earth,
  epochJd: 2_461_193,
  theory: 'Brouwer',
  origin: 'shape',
  typedAs: 'mean',
} as const;
