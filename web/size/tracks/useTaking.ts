/** Taking a track: said at the lower edge, with an undo. */
import { conditionEntry } from '../../../core/index';
import { useApp } from '../../state/appContext';
import { type TakenTrack, takeTrack } from './takeTrack';
import type { TracksModel } from './tracksModel';

export function useTakeTrack() {
  const { document, announcer, store } = useApp();
  return {
    blocked: store.tabs.editorElsewhere.value,
    take: (track: TakenTrack, isSunSynchronous: boolean) => {
      const before = document.draft.value;
      const { taken, dropped } = takeTrack(document, track, isSunSynchronous);
      if (!taken) {
        announcer.say({
          tone: 'caution',
          text: 'The entry cannot be read yet, so the track could not be written into it.',
        });
        return;
      }
      const instead = dropped.length > 0 ? ` in place of ${dropped.join(' and ')}` : '';
      announcer.say({
        tone: 'note',
        text: `Held on ${track.revolutions} revolutions in ${track.days} days${isSunSynchronous ? ', Sun-synchronous' : ''}${instead}.`,
        untilEdited: true,
        action: { label: 'Undo', run: () => document.restoreDraft(before) },
      });
    },
  };
}

/** As listed: Sun-synchronous where that was searched for. */
export function useTaking({ search }: Pick<TracksModel, 'search'>) {
  const { document } = useApp();
  const { blocked, take } = useTakeTrack();
  const held = document.draft.value.conditions.map(conditionEntry).find((entry) => entry?.kind === 'repeat')?.texts;
  const isSunSynchronous = search.found.value?.request.inclination.kind === 'sunSynchronous';
  return {
    blocked,
    take: (track: TakenTrack) => take(track, isSunSynchronous),
    isCurrent: ({ revolutions, days }: Pick<TakenTrack, 'revolutions' | 'days'>) =>
      held?.revolutions === String(revolutions) && held.days === String(days),
  };
}
