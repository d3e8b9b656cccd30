import { fileURLToPath } from 'node:url';
import { preact } from '@preact/preset-vite';
import { defineConfig } from 'vite';
import { buildVersion } from './web/build/buildVersion.ts';
import { contentSecurityPolicy, contentSecurityPolicyTag } from './web/build/contentSecurityPolicy.ts';
import { landOutline } from './web/build/landOutline.ts';
import { leanPlot } from './web/build/leanPlot.ts';
import { offlineWorker } from './web/build/offlineWorker.ts';
import { secondMinify } from './web/build/secondMinify.ts';
import { workerEntries } from './web/build/workerEntries.ts';

const root = fileURLToPath(new URL('.', import.meta.url)).replace(/[\\/]$/, '');

/** What conditions and limits are called and how they are read: none of it is needed for an orbit that has none. */
const conditions = /[\\/]core[\\/]record[\\/](conditions[\\/](kinds|readConditions)|limit|storedLimit)/;

/** Fetched when a condition, a chart or the book asks for it. */
const onDemand =
  /[\\/]core[\\/](design|forces|mission[\\/](averaged|circularEclipse|equinoctial|event|gaussAverage|history|integrate|leftOut|ledger|light|localTime|missionHistory|motion|oblateness|orbitBasis|orbitEvents|shadow|steadyMean|zonalCoupling)|numerics[\\/](bracket|crossings|dop853|linear|newton|ode|roots)|bodies[\\/](atmosphere|moonPosition|planetOrbits|poles|sunSeenFrom)|record[\\/]conditions[\\/]settleOrbit)/;

/** What a mission is asked for and how it is put in words: fetched with the place that shows it. */
const mission =
  /[\\/]core[\\/](record[\\/]mission|mission[\\/]historyRequest|forces[\\/](drag|zonal)\.|bodies[\\/]atmosphere)|[\\/]web[\\/]state[\\/]mission(Outcome|Request)/;

/** The drawings of Size but the one it opens with, and the workings. */
const pictures =
  /[\\/]web[\\/]size[\\/](limit|map|orbit|sweep|tracks|otherOrbit|working)|[\\/]core[\\/]record[\\/](swe|workings|formula)/;

/** What Size fetches as soon as its first readings stand. */
const chart =
  /[\\/]web[\\/]size[\\/](chart|condition|solutions)|[\\/]web[\\/]parts[\\/](chart|drawing)|[\\/]core[\\/]design[\\/]chart/;

// Core is pure: importing its table of contents needs none of the files that are not used from it.
const pureCore = { moduleSideEffects: [{ test: /[\\/]core[\\/]/, sideEffects: false }] };

/** Core and the one package that it needs. */
const core = /[\\/](core|node_modules[\\/]valibot)[\\/]/;

const page = /[\\/]web[\\/]index\.html$/;

interface ModuleGraph {
  getModuleInfo(id: string): { readonly importers: readonly string[] } | null;
}

/** Whether a chain of imports that run at once leads to the module from the page; workers are entries of their own. */
function isOfFirstPage(id: string, graph: ModuleGraph): boolean {
  const seen = new Set([id]);
  for (const each of seen) {
    if (page.test(each)) return true;
    for (const importer of graph.getModuleInfo(each)?.importers ?? []) seen.add(importer);
  }
  return false;
}

export default defineConfig({
  root: `${root}/web`,
  // Relative, so that the folder works below any path of any static host.
  base: './',
  publicDir: `${root}/public`,
  cacheDir: `${root}/node_modules/.vite`,
  define: { __DRIFTBOOK_VERSION__: JSON.stringify(buildVersion(root)) },
  plugins: [
    preact(),
    workerEntries(),
    landOutline(),
    leanPlot(),
    secondMinify(),
    contentSecurityPolicyTag(),
    offlineWorker({ entry: `${root}/web/offline/serviceWorker.ts`, fileName: 'serviceWorker.js' }),
  ],
  build: {
    outDir: `${root}/dist`,
    emptyOutDir: true,
    target: 'es2022',
    assetsInlineLimit: 0,
    // One sheet packs to two thirds of a dozen, and no place waits for its own.
    cssCodeSplit: false,
    modulePreload: { polyfill: false },
    // What the first page and other places share is one file: fewer requests, and it packs better than many small ones.
    rolldownOptions: {
      treeshake: pureCore,
      output: {
        codeSplitting: {
          // Else what solving needs of the rest would come with it, and the first page would load solving.
          includeDependenciesRecursively: false,
          groups: [
            // Packed together, since all of it is cached anyway: small files pack badly.
            { name: 'pictures', test: pictures, priority: 4 },
            { name: 'chart', test: chart, priority: 4 },
            // Solving serves several places, none of them at the first page.
            { name: 'mission', test: mission, priority: 3 },
            { name: 'design', test: onDemand, minShareCount: 2, priority: 2 },
            { name: 'conditions', test: conditions, priority: 2 },
            // Apart from what needs a page, since workers load it too.
            {
              name: (id, graph) => (isOfFirstPage(id, graph) ? 'core' : null),
              debugName: 'core',
              test: core,
              minShareCount: 2,
              priority: 1,
            },
            {
              name: (id, graph) => (isOfFirstPage(id, graph) ? 'shared' : null),
              debugName: 'shared',
              minShareCount: 2,
            },
          ],
        },
      },
    },
  },
  preview: { headers: { 'Content-Security-Policy': contentSecurityPolicy } },
});
