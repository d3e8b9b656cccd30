import { describe, expect, it } from 'vitest';
import { createPreferences } from '../../../web/state/preferences';
import { createMemoryShelf } from '../../../web/store/memoryShelf';
import { loadSettings } from '../../../web/store/settings';
import { valueIn } from '../store/support';

describe('preferences', () => {
  it('start in room light, in km and degrees a day, over five years', async () => {
    const preferences = createPreferences(await loadSettings(createMemoryShelf()));
    expect(preferences.values.value).toEqual({
      lighting: 'room',
      lengthUnit: 'km',
      rateUnit: 'degPerDay',
      spanDays: 1826.25,
    });
  });

  it('take what is set at once, and have it after a restart', async () => {
    const shelf = createMemoryShelf();
    const preferences = createPreferences(await loadSettings(shelf));
    const kept = preferences.set('lighting', 'night');
    expect(preferences.values.value).toMatchObject({ lighting: 'night', lengthUnit: 'km' });
    expect(await kept).toMatchObject({ ok: true });
    await preferences.set('spanDays', 30);
    const later = createPreferences(await loadSettings(shelf));
    expect(later.values.value).toMatchObject({ lighting: 'night', spanDays: 30, rateUnit: 'degPerDay' });
  });

  it('take a stored value that makes no sense for none', async () => {
    const shelf = createMemoryShelf();
    valueIn(await shelf.change((rows) => rows.putSetting('lighting', 'disco')));
    expect(createPreferences(await loadSettings(shelf)).values.value.lighting).toBe('room');
  });
});
