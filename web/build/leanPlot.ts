/**
 * Leaves out of uPlot the ways to join points that Driftbook draws no line with (steps, bars, splines): 3 kB of what a
 * tablet has to keep. A release of uPlot that names them differently stops the build.
 */
import type { Plugin } from 'vite';

const unusedPaths = /\t\(paths\.(stepped|bars|spline)\s*= \w+\);\n/g;

export function leanPlot(): Plugin {
  return {
    name: 'driftbook-lean-plot',
    apply: 'build',
    transform: {
      filter: { id: /uPlot\.esm\.js$/ },
      handler(code) {
        const found = code.match(unusedPaths)?.length ?? 0;
        if (found !== 3) throw new Error(`Expected 3 ways to join points in uPlot to leave out, got ${found}`);
        return { code: code.replace(unusedPaths, ''), map: null };
      },
    },
  };
}
