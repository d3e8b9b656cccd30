/** The orbit drawn: how its rates depend on inclination, its plane to scale, its node from above the pole. */
import { useMemo } from 'preact/hooks';
import type { ResolvedOrbit } from '../../../core/index';
import { useDeferred } from '../../parts/useDeferred';
import './orbit.css';
import { PlaneSketch } from './planeSketch';
import { PoleSketch } from './poleSketch';
import { RateChart } from './rateChart';

/** Drawn a frame after the readings, and only when the orbit has changed. */
export function OrbitView({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const shown = useDeferred(orbit);
  return useMemo(
    () => (
      <>
        <RateChart orbit={shown} />
        <div class="sketches">
          <PlaneSketch orbit={shown} />
          <PoleSketch orbit={shown} />
        </div>
      </>
    ),
    [shown],
  );
}
