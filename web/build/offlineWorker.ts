/**
 * Ends the build of the page: writes the notices of all bundled packages, then the service worker with the list of
 * every file in the output folder. Packages differ between page and worker, so the worker is bundled first and gets
 * the list last.
 */
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join, relative, resolve } from 'node:path';
import { build, type Plugin, type Rolldown } from 'vite';
import { noticesOf } from './notices.ts';

const listPlaceholder = 'self.__WB_MANIFEST';

export function offlineWorker({ entry, fileName }: { entry: string; fileName: string }): Plugin {
  let outDir = '';
  return {
    name: 'driftbook-offline-worker',
    apply: 'build',
    configResolved(config) {
      outDir = resolve(config.root, config.build.outDir);
    },
    writeBundle: {
      order: 'post',
      sequential: true,
      async handler(_options, bundle) {
        const worker = await bundleWorker(entry);
        const pageModules = Object.values(bundle).flatMap((file) => (file.type === 'chunk' ? file.moduleIds : []));
        writeFileSync(join(outDir, 'notices.txt'), noticesOf([...pageModules, ...worker.moduleIds]));
        const list = JSON.stringify(precachedFiles(outDir));
        if (worker.code.split(listPlaceholder).length !== 2) {
          throw new Error(`Expected ${listPlaceholder} exactly once in the bundled service worker`);
        }
        writeFileSync(
          join(outDir, fileName),
          worker.code.replace(listPlaceholder, () => list),
        );
      },
    },
  };
}

async function bundleWorker(entry: string): Promise<Rolldown.OutputChunk> {
  const result = await build({
    configFile: false,
    logLevel: 'warn',
    build: {
      write: false,
      copyPublicDir: false,
      target: 'es2022',
      rolldownOptions: { input: entry, output: { format: 'iife' } },
    },
  });
  const [output] = [result].flat();
  const chunk = output && 'output' in output ? output.output[0] : undefined;
  if (!chunk) throw new Error(`Expected one bundle of ${entry}, got none`);
  return chunk;
}

/** Names that Vite has hashed need no revision: their content never changes. */
function precachedFiles(outDir: string): { url: string; revision: string | null }[] {
  return readdirSync(outDir, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name))
    .sort()
    .map((path) => {
      const url = relative(outDir, path).replaceAll('\\', '/');
      const hash = createHash('sha256').update(readFileSync(path)).digest('hex').slice(0, 16);
      return { url, revision: /^assets\/.+-[\w-]{8}\.\w+$/.test(url) ? null : hash };
    });
}
