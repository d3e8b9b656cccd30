/** The canvas with the map, drawn anew when the track, its size or the lighting changes. */
import { useEffect, useRef, useState } from 'preact/hooks';
import { type ChartLayer, chartLayer } from '../../parts/chartCanvas';
import { createFrame } from '../../parts/frame';
import { type Land, loadLand } from './land';
import { drawMap, type MapDrawing } from './mapCanvas';

interface MapProps extends Omit<MapDrawing, 'land'> {
  /** What a listener hears of the picture. */
  readonly says: string;
  /** The land belongs to the Earth alone. */
  readonly hasLand: boolean;
}

export function WorldMap({ says, hasLand, track, style }: MapProps) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const layer = useRef<ChartLayer | null>(null);
  const { land, failed } = useLand(hasLand);
  const latest = useRef<MapDrawing>({ land, track, style });
  latest.current = { land, track, style };
  useEffect(() => {
    if (!canvas.current) return;
    const frame = createFrame();
    const drawn = chartLayer({ canvas: canvas.current, frame, draw: (surface) => drawMap(surface, latest.current) });
    layer.current = drawn;
    return () => {
      drawn.end();
      frame.end();
    };
  }, []);
  useEffect(() => layer.current?.invalidate(), [land, track, style]);
  return (
    <>
      <canvas ref={canvas} class="map-canvas" role="img" aria-label={says} />
      {failed && <p class="soft small">The outline of the land could not be read; the track is drawn without it.</p>}
    </>
  );
}

function useLand(isWanted: boolean) {
  const [land, setLand] = useState<Land | null>(null);
  const [failed, setFailed] = useState(false);
  useEffect(() => {
    let isShown = isWanted;
    if (isWanted) {
      loadLand().then(
        (loaded) => isShown && setLand(loaded),
        () => isShown && setFailed(true),
      );
    }
    return () => {
      isShown = false;
    };
  }, [isWanted]);
  return { land: isWanted ? land : null, failed };
}
