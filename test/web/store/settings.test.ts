import { beforeEach, describe, expect, it } from 'vitest';
import { loadSettings } from '../../../web/store/settings';
import { freshDatabase, openShelf } from './support';

describe('settings', () => {
  beforeEach(freshDatabase);

  it('are empty at first and hold across a restart', async () => {
    const settings = await loadSettings(await openShelf());
    expect(settings.values.value).toEqual({});
    const kept = settings.set('lighting', 'night');
    expect(settings.values.value).toEqual({ lighting: 'night' });
    await kept;
    await settings.set('spanDays', 365);
    expect((await loadSettings(await openShelf())).values.value).toEqual({ lighting: 'night', spanDays: 365 });
  });

  it('that make no sense count as not set', async () => {
    const shelf = await openShelf();
    await shelf.change((rows) => rows.putSetting('lighting', 'purple'));
    await shelf.change((rows) => rows.putSetting('spanDays', Number.NaN));
    expect((await loadSettings(shelf)).values.value).toEqual({});
  });
});
