/** The orbit drawn: how its rates depend on inclination, its plane to scale, its node from above the pole. */
import type { ResolvedOrbit } from '../../../core/index';
import './orbit.css';
import { PlaneSketch } from './planeSketch';
import { PoleSketch } from './poleSketch';
import { RateChart } from './rateChart';

export function OrbitView({ orbit }: { readonly orbit: ResolvedOrbit }) {
  return (
    <>
      <RateChart orbit={orbit} />
      <div class="sketches">
        <PlaneSketch orbit={orbit} />
        <PoleSketch orbit={orbit} />
      </div>
    </>
  );
}
