/** The other saved candidates of the same body, as points of the chart. */
import { useSignal, useSignalEffect } from '@preact/signals';
import { type Candidate, type ChartPoint, resolveOrbit } from '../../../core/index';
import { useApp } from '../../state/appContext';

export interface OtherOrbit {
  readonly id: string;
  readonly name: string;
  readonly point: ChartPoint;
}

export function useOtherOrbits() {
  const { store, document } = useApp();
  const found = useSignal<readonly OtherOrbit[]>([]);
  useSignalEffect(() => {
    const { id, body } = document.draft.value;
    const key = `${id} ${body} ${store.book.changes.value}`;
    if (key === latestKey.value) return;
    latestKey.value = key;
    void read(id, body).then((orbits) => {
      if (latestKey.peek() === key) found.value = orbits;
    });
  });
  const latestKey = useSignal('');
  const read = async (id: string, body: Candidate['body']) => {
    const list = await store.book.list();
    const candidates = list.ok
      ? list.value.flatMap((entry) => (entry.kind === 'readable' ? [entry.candidate] : []))
      : [];
    return otherOrbits(candidates.filter((each) => each.id !== id && each.body === body));
  };
  return found;
}

async function otherOrbits(candidates: readonly Candidate[]): Promise<OtherOrbit[]> {
  const { settle } = await import('../../state/settler');
  return candidates.flatMap((candidate) => {
    const entered = resolveOrbit(candidate);
    if (!entered.ok) return [];
    const settlement = candidate.conditions.length > 0 ? settle(candidate, entered.orbit) : null;
    if (settlement?.ok === false) return [];
    const { body, mean } = settlement?.orbit ?? entered.orbit;
    const point = { inclinationRad: mean.inclinationRad, altitudeKm: mean.semiMajorAxisKm - body.equatorialRadiusKm };
    return [{ id: candidate.id, name: candidate.name, point }];
  });
}
