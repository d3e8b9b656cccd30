/** `npm run bench`: bundles the benchmark as the app is bundled, then runs it in this process. */
import { pathToFileURL } from 'node:url';
import { install, root } from './install.mjs';

install();
const { build } = await import('vite');
const outDir = `${root}.cache/bench`;
await build({
  configFile: false,
  root,
  logLevel: 'warn',
  build: {
    ssr: 'test/bench/run.ts',
    outDir,
    emptyOutDir: true,
    rolldownOptions: { output: { entryFileNames: 'run.mjs' } },
  },
});
await import(pathToFileURL(`${outDir}/run.mjs`).href);
