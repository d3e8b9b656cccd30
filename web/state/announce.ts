/** One short message at the lower edge, with an action such as undo. */
import { type ReadonlySignal, signal } from '@preact/signals';

export interface Announcement {
  readonly text: string;
  readonly tone: 'note' | 'caution';
  readonly action?: { readonly label: string; readonly run: () => void };
  /** True where the action puts back a draft: once something else is typed, it would undo that too. */
  readonly untilEdited?: boolean;
}

export interface Announcer {
  readonly current: ReadonlySignal<Announcement | null>;
  say(announcement: Announcement): void;
  dismiss(): void;
}

/** Messages stay until they are dismissed or replaced: nobody should have to race a clock for an undo. */
export function createAnnouncer(): Announcer {
  const current = signal<Announcement | null>(null);
  return {
    current,
    say: (announcement) => {
      current.value = announcement;
    },
    dismiss: () => {
      current.value = null;
    },
  };
}
