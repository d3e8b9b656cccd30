/** The user's settings: read once at the start, then held in memory and written through. */
import { type ReadonlySignal, signal } from '@preact/signals';
import * as v from 'valibot';
import type { Outcome, Shelf } from './rows';

const settingSchemas = {
  lighting: v.picklist(['room', 'sunlight', 'night']),
  lengthUnit: v.picklist(['km', 'NM']),
  rateUnit: v.picklist(['degPerDay', 'degPerYear']),
  /** Span of the drift plots in days. */
  spanDays: v.pipe(v.number(), v.minValue(1), v.maxValue(15 * 366)),
  /** What the browser answered when asked to keep the storage. */
  persistence: v.picklist(['granted', 'refused', 'unsupported']),
} as const;

type SettingKey = keyof typeof settingSchemas;
/** A key is absent until the user, or the browser, has decided it. */
export type Settings = { readonly [Key in SettingKey]?: v.InferOutput<(typeof settingSchemas)[Key]> };

export interface SettingsKeeper {
  readonly values: ReadonlySignal<Settings>;
  /** Holds from this call on; the outcome says whether it will hold after a restart. */
  set<Key extends SettingKey>(key: Key, value: NonNullable<Settings[Key]>): Promise<Outcome<void>>;
}

const keys = Object.keys(settingSchemas) as SettingKey[];

/** Reads all settings; a stored value that makes no sense counts as not set. */
export async function loadSettings(shelf: Shelf): Promise<SettingsKeeper> {
  const stored = await shelf.look((rows) => Promise.all(keys.map((key) => rows.setting(key))));
  const found = stored.ok ? keys.map((key, index) => [key, stored.value[index]] as const) : [];
  const valid = found.filter(([key, value]) => v.is(settingSchemas[key], value));
  const values = signal<Settings>(Object.fromEntries(valid));
  return {
    values,
    set: (key, value) => {
      values.value = { ...values.value, [key]: value };
      return shelf.change((rows) => rows.putSetting(key, value));
    },
  };
}
