/** What the actions of the book ask about the orbit in the editor. */
import type { AppState } from '../state/appState';

export const isOpen = ({ document }: AppState, id: string) => document.draft.value.id === id;
export const hasUnsaved = (app: AppState, id: string) => isOpen(app, id) && app.document.changed.value;

/** Saves the unsaved changes of the open orbit where it is this one; false if they could not be kept. */
export async function keepUnsaved(app: AppState, id: string, note: string): Promise<boolean> {
  return hasUnsaved(app, id) ? app.saving.save(note) : true;
}
