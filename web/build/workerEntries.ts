/**
 * Workers as further entries of the one build. Vite bundles each worker apart, with a copy of all it imports; here they
 * share the page's chunks, which are fetched and kept once. The development server serves them as they are.
 */
import { dirname, resolve } from 'node:path';
import type { Plugin } from 'vite';

const address = /new URL\(\s*'(\.\/[^']+\.ts)',\s*import\.meta\.url\s*\)(?=,\s*\{\s*type: 'module')/g;

/** Takes `new Worker(new URL('./file.ts', import.meta.url), { type: 'module' })`, written in full. */
export function workerEntries(): Plugin {
  return {
    name: 'driftbook-worker-entries',
    apply: 'build',
    // Before Vite finds the address and bundles what stands there.
    enforce: 'pre',
    transform: {
      filter: { code: 'new Worker(' },
      handler(code, importer) {
        return code.replace(address, (_, file: string) => {
          const id = resolve(dirname(importer), file);
          return `import.meta.ROLLUP_FILE_URL_${this.emitFile({ type: 'chunk', id })}`;
        });
      },
    },
  };
}
