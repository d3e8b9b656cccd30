/** The orbit drawn: its plane to scale, its node from above the pole. */
import type { ResolvedOrbit } from '../../../core/index';
import './orbit.css';
import { PlaneSketch } from './planeSketch';
import { PoleSketch } from './poleSketch';

export function OrbitView({ orbit }: { readonly orbit: ResolvedOrbit }) {
  return (
    <div class="sketches">
      <PlaneSketch orbit={orbit} />
      <PoleSketch orbit={orbit} />
    </div>
  );
}
