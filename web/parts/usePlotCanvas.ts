/** Keeps the drawing of a plot as its model is, and says so where the browser cannot draw. */
import type { RefObject } from 'preact';
import { useEffect, useRef, useState } from 'preact/hooks';
import { drawPlot, type PlotHandle } from './plotCanvas';
import type { PlotModel } from './plotModel';

export interface PlotRefs {
  readonly canvas: RefObject<HTMLCanvasElement | null>;
  readonly area: RefObject<HTMLDivElement | null>;
}

/** Draws the model into the elements; answers true once drawing turned out to be impossible. */
export function usePlotCanvas({ canvas, area }: PlotRefs, model: PlotModel): boolean {
  const [failed, setFailed] = useState(false);
  const handle = useRef<PlotHandle | null>(null);
  const latest = useRef(model);
  latest.current = model;

  useEffect(() => {
    if (!canvas.current || !area.current) return;
    try {
      handle.current = drawPlot({ canvas: canvas.current, area: area.current }, latest.current);
    } catch {
      setFailed(true);
    }
    return () => {
      handle.current?.end();
      handle.current = null;
    };
  }, [canvas, area]);

  useEffect(() => handle.current?.show(model), [model]);
  return failed;
}
