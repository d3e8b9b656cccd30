/** `npm run bench`: times as a table, and an exit code that says whether the bounds held. */
import { chartLimits } from './chartTasks';
import { historyBounds, historyLimits } from './historyTasks';
import { lightLimits } from './lightTasks';
import { measure, type Timing } from './measure';
import { repeatLimits } from './repeatTasks';
import { solveLimits } from './solveTasks';
import { taskGroups } from './tasks';

/** `name` may take at most `times` as long as `yardstick`: one call, its checks and its result object included. */
const bounds = [
  { name: 'secularRates, first order', yardstick: 'first order, inlined', times: 2 },
  { name: 'secularRates, second order', yardstick: 'second order, inlined', times: 2 },
  // 24 points, each an acceleration and about as much again to place and project it; 108 for the ellipse.
  { name: 'averagedRates, e 0.001', yardstick: 'zonals to 14, at a point', times: 120 },
  { name: 'averagedRates, e 0.74', yardstick: 'zonals to 14, at a point', times: 400 },
  // Some twenty rates; far below the 10 ms that a person would notice.
  { name: 'frozenOrbit', yardstick: 'averagedRates, e 0.001', times: 60 },
] as const;

/** What every row is also expressed in. */
const unit = 'first order, inlined';

function nsOf(timings: readonly Timing[], name: string): number {
  const found = timings.find((timing) => timing.name === name);
  if (!found) throw new Error(`nothing measured under the name ${name}`);
  return found.nsPerCall;
}

function table(timings: readonly Timing[]): readonly string[] {
  const unitNs = nsOf(timings, unit);
  const rows = timings.map(({ name, nsPerCall }) => {
    const multiple = nsPerCall / unitNs;
    return [name, nsPerCall.toFixed(nsPerCall < 1000 ? 1 : 0), multiple.toFixed(multiple < 100 ? 2 : 0)] as const;
  });
  const line = ([name, ns, multiple]: readonly [string, string, string]) =>
    `${name.padEnd(34)}${ns.padStart(12)}${multiple.padStart(28)}`;
  return [line(['median of 15', 'ns a call', '× first order, inlined']), ...rows.map(line)];
}

const timings = taskGroups().flatMap((tasks) => measure(tasks, () => performance.now()));
console.log(table(timings).join('\n'));
console.log();
for (const { name, yardstick, times } of [...bounds, ...historyBounds]) {
  const ratio = nsOf(timings, name) / nsOf(timings, yardstick);
  const holds = ratio <= times;
  console.log(`${holds ? 'holds ' : 'BROKEN'}  ${name}: ${ratio.toFixed(2)} × ${yardstick}, at most ${times}`);
  if (!holds) process.exitCode = 1;
}
for (const { name, microseconds } of [
  ...solveLimits,
  ...repeatLimits,
  ...historyLimits,
  ...lightLimits,
  ...chartLimits,
]) {
  const taken = nsOf(timings, name) / 1000;
  const holds = taken <= microseconds;
  console.log(`${holds ? 'holds ' : 'BROKEN'}  ${name}: ${taken.toFixed(1)} µs, at most ${microseconds}`);
  if (!holds) process.exitCode = 1;
}
