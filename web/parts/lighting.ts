/** The chosen lighting on the page itself, where the colour tokens and the plots look for it. */
import { effect } from '@preact/signals';
import type { Preferences } from '../state/preferences';

/** Keeps the page in the chosen lighting from this call on, and the browser's own bar in the colour of the paper. */
export function followLighting(preferences: Preferences, page: Document): void {
  effect(() => {
    page.documentElement.dataset['lighting'] = preferences.values.value.lighting;
    const paper = getComputedStyle(page.documentElement).getPropertyValue('--paper').trim();
    page.querySelector('meta[name="theme-color"]')?.setAttribute('content', paper);
  });
}
