import { beforeEach, describe, expect, it, vi } from 'vitest';
import { createPersistence } from '../../../web/store/persistence';
import { loadSettings } from '../../../web/store/settings';
import { freshDatabase, openShelf } from './support';

const answering = (answer: boolean, already = false) => ({
  persist: vi.fn(async () => answer),
  persisted: vi.fn(async () => already),
});
const settingsAfterRestart = async () => loadSettings(await openShelf());

describe('the question whether storage may be kept', () => {
  beforeEach(freshDatabase);

  it('is not put before the first save', async () => {
    const storage = answering(true);
    const persistence = createPersistence(await settingsAfterRestart(), storage);
    await persistence.look();
    expect(persistence.answer.value).toBe('notAsked');
    expect(storage.persist).not.toHaveBeenCalled();
  });

  it('is put once, and its answer remembered across restarts', async () => {
    const storage = answering(false);
    const persistence = createPersistence(await settingsAfterRestart(), storage);
    await Promise.all([persistence.askAtFirstSave(), persistence.askAtFirstSave()]);
    expect(persistence.answer.value).toBe('refused');
    const later = createPersistence(await settingsAfterRestart(), storage);
    expect(await later.askAtFirstSave()).toBe('refused');
    expect(storage.persist).toHaveBeenCalledTimes(1);
  });

  it('is not put to the user where the browser has granted it by itself', async () => {
    const storage = answering(false, true);
    const persistence = createPersistence(await settingsAfterRestart(), storage);
    expect(await persistence.askAtFirstSave()).toBe('granted');
    expect(storage.persist).not.toHaveBeenCalled();
  });

  it('answers granted later when the browser has changed its mind', async () => {
    await createPersistence(await settingsAfterRestart(), answering(false)).askAtFirstSave();
    const later = createPersistence(await settingsAfterRestart(), answering(false, true));
    expect(await later.look()).toBe('granted');
  });

  it('answers unsupported, and no estimate, where the browser lacks it', async () => {
    const persistence = createPersistence(await settingsAfterRestart(), {});
    expect(await persistence.askAtFirstSave()).toBe('unsupported');
    expect(await persistence.estimate()).toBeNull();
  });

  it('tells how much is used and how much is left', async () => {
    const storage = { estimate: async () => ({ usage: 100, quota: 1000 }) };
    const persistence = createPersistence(await settingsAfterRestart(), storage);
    expect(await persistence.estimate()).toEqual({ usedBytes: 100, availableBytes: 900 });
  });
});
