/** Loads the drawing code when a plot is first shown, and says so where the browser cannot run it. */
import type { RefObject } from 'preact';
import { useEffect, useRef, useState } from 'preact/hooks';
import { inTurn, leaveTurn } from './inTurn';
import type { PlotHandle } from './plotCanvas';
import type { PlotModel } from './plotModel';

export interface PlotRefs {
  readonly host: RefObject<HTMLDivElement | null>;
  readonly area: RefObject<HTMLDivElement | null>;
}

/** Draws the model into the elements; answers true once drawing turned out to be impossible. */
export function usePlotCanvas({ host, area }: PlotRefs, model: PlotModel): boolean {
  const [failed, setFailed] = useState(false);
  const handle = useRef<PlotHandle | null>(null);
  const latest = useRef(model);
  latest.current = model;

  useEffect(() => {
    let isShown = true;
    const start = async () => {
      try {
        const { drawPlot } = await import('./plotCanvas');
        inTurn(handle, () => {
          if (isShown && host.current && area.current) {
            handle.current = drawPlot({ host: host.current, area: area.current }, latest.current);
          }
        });
      } catch {
        // uPlot formats numbers as it is loaded, and throws where the browser's language is no language tag.
        if (isShown) setFailed(true);
      }
    };
    void start();
    return () => {
      isShown = false;
      leaveTurn(handle);
      handle.current?.end();
      handle.current = null;
    };
  }, [host, area]);

  useEffect(() => {
    if (handle.current) inTurn(handle, () => handle.current?.show(latest.current));
  }, [model]);
  return failed;
}
