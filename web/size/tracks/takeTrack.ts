/** Makes a repeat track the candidate: its a and i go into the entry, its cycle is held by a condition. */
import { batch } from '@preact/signals';
import {
  type ConditionEntry,
  conditionEntry,
  conditionWords,
  newCondition,
  type RepeatTrack,
  type SettledElement,
} from '../../../core/index';
import type { OrbitDocument } from '../../state/document';
import { takeElements } from '../../state/entryActions';

export type TakenTrack = Pick<RepeatTrack, 'revolutions' | 'days' | 'semiMajorAxisKm' | 'inclinationRad'>;

/**
 * False where there is no orbit to write it into. A condition that settled what the track now does gives way; the others,
 * such as a frozen eccentricity, stay. `isSunSynchronous`: that is held as a condition too.
 */
export function takeTrack(document: OrbitDocument, track: TakenTrack, isSunSynchronous: boolean): TakenOutcome {
  const dropped: string[] = [];
  const taken = batch(() => {
    const { revolutions, days, semiMajorAxisKm, inclinationRad } = track;
    const settles: SettledElement[] = isSunSynchronous ? ['semiMajorAxisKm', 'inclinationRad'] : ['semiMajorAxisKm'];
    if (!takeElements(document, { semiMajorAxisKm, inclinationRad })) return false;
    dropped.push(...dropConditions(document, settles, isSunSynchronous));
    hold(document, 'repeat', 'semiMajorAxisKm', { revolutions: String(revolutions), days: String(days) });
    if (isSunSynchronous) hold(document, 'sunSynchronous', 'inclinationRad', {});
    return true;
  });
  return { taken, dropped };
}

export interface TakenOutcome {
  readonly taken: boolean;
  /** Names of the conditions of other kinds that gave way. */
  readonly dropped: readonly string[];
}

const replaced: ReadonlySet<string> = new Set(['repeat', 'sunSynchronous']);

/** Drops those that settle one of the elements, and those said anew whatever they settle. */
function dropConditions(document: OrbitDocument, settles: readonly SettledElement[], isSun: boolean): string[] {
  const present = document.draft.value.conditions.map(conditionEntry);
  const dropped: string[] = [];
  for (let place = present.length - 1; place >= 0; place -= 1) {
    const entry = present[place];
    const isSaidAnew = entry?.kind === 'repeat' || (isSun && entry?.kind === 'sunSynchronous');
    if (!entry || !(isSaidAnew || settles.includes(entry.settles))) continue;
    if (!replaced.has(entry.kind)) dropped.unshift(conditionWords[entry.kind].label);
    document.conditions.remove(place);
  }
  return dropped;
}

function hold(
  document: OrbitDocument,
  kind: ConditionEntry['kind'],
  settles: SettledElement,
  texts: ConditionEntry['texts'],
): void {
  document.conditions.add({ ...newCondition(kind, [], texts), settles });
}
