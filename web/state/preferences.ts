/** Lighting, units and span: what the user set, or what Driftbook starts with. */
import { computed, type ReadonlySignal } from '@preact/signals';
import type { Settings, SettingsKeeper } from '../store/settings';

export interface Preferences {
  readonly values: ReadonlySignal<Required<Omit<Settings, 'persistence'>>>;
  set: SettingsKeeper['set'];
}

const defaults = { lighting: 'room', lengthUnit: 'km', rateUnit: 'degPerDay', spanDays: 5 * 365.25 } as const;

export function createPreferences(settings: SettingsKeeper): Preferences {
  return {
    values: computed(() => ({ ...defaults, ...settings.values.value })),
    set: (key, value) => settings.set(key, value),
  };
}
