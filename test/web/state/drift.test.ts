import { signal } from '@preact/signals';
import { describe, expect, it } from 'vitest';
import type { ResolvedOrbit } from '../../../core/index';
import { createDrift } from '../../../web/state/drift';
import { documentOf } from './support';

describe('the drift that is drawn', () => {
  it('is none without an orbit', () => {
    expect(createDrift(signal<ResolvedOrbit | null>(null), signal(30)).value).toBeNull();
  });

  it('follows the orbit and the span', () => {
    const document = documentOf();
    const spanDays = signal(30);
    const drift = createDrift(document.orbit, spanDays);
    const nodeDrift = () => drift.value?.second.nodeRad.at(-1) ?? Number.NaN;
    const overThirtyDays = nodeDrift();
    spanDays.value = 60;
    expect(nodeDrift()).toBeCloseTo(2 * overThirtyDays, 9);
    document.setText('inclination', '82.4');
    expect(Math.sign(nodeDrift())).toBe(-Math.sign(overThirtyDays));
    const before = drift.value;
    document.setText('inclination', 'x');
    expect(drift.value).toBe(before);
  });
});
