import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));
const dist = join(root, 'dist');
const files = readdirSync(dist, { recursive: true, withFileTypes: true })
  .filter((entry) => entry.isFile())
  .map((entry) => join(entry.parentPath, entry.name).slice(dist.length + 1));
const read = (file: string) => readFileSync(join(dist, file), 'utf8');
const gzippedBytes = (names: readonly string[]) =>
  names.reduce((sum, name) => sum + gzipSync(readFileSync(join(dist, name)), { level: 9 }).length, 0);
const texts = files.filter((file) => /\.(html|js|css|webmanifest|svg)$/.test(file));

/** The entry and all that it imports before it runs; what is imported on demand is left out. */
function scriptsBeforeFirstPlot(): string[] {
  const found = new Set<string>();
  const follow = (file: string) => {
    if (found.has(file)) return;
    found.add(file);
    for (const [, target] of read(file).matchAll(/(?:\bfrom|\bimport)\s*["'`](\.[^"'`]+\.js)["'`]/g)) {
      if (target) follow(join(dirname(file), target));
    }
  };
  for (const [, target] of read('index.html').matchAll(/(?:src|href)="\.\/([^"]+\.js)"/g)) if (target) follow(target);
  return [...found];
}

/** Every address in the worker's list of files. */
function precached(): string[] {
  return [...read('serviceWorker.js').matchAll(/"url":"([^"]+)"/g)].map(([, url]) => url ?? '');
}

describe('what is built', () => {
  it('loads at most 60 kB of gzipped JavaScript before the first plot', () => {
    const scripts = scriptsBeforeFirstPlot();
    expect(scripts.length).toBeGreaterThan(0);
    const bytes = gzippedBytes(scripts);
    console.log(`JavaScript before the first plot: ${(bytes / 1000).toFixed(1)} kB gz in ${scripts.length} files`);
    expect(bytes).toBeLessThanOrEqual(60_000);
  });

  it('precaches every file but the worker itself, at most 250 kB gzipped', () => {
    const listed = precached();
    expect(listed.toSorted()).toEqual(files.filter((file) => file !== 'serviceWorker.js').sort());
    const bytes = gzippedBytes([...listed, 'serviceWorker.js']);
    console.log(`Precached, with the worker: ${(bytes / 1000).toFixed(1)} kB gz in ${listed.length + 1} files`);
    expect(bytes).toBeLessThanOrEqual(250_000);
  });

  it('has no WebAssembly', () => {
    expect(files.filter((file) => file.endsWith('.wasm'))).toEqual([]);
    expect(texts.filter((file) => /\bWebAssembly\b/.test(read(file)))).toEqual([]);
  });

  it('names no address on any network: only XML namespaces, and one link in the text of an error of the worker', () => {
    const addresses = texts.flatMap((file) =>
      [...read(file).matchAll(/(?:https?|wss?):\/\/[^\s"'`)<>]+/g)].map(([url]) => url),
    );
    const known =
      /^http:\/\/www\.w3\.org\/(2000\/svg|1999\/xhtml|1999\/xlink|1998\/Math\/MathML)$|^https:\/\/bit\.ly\/wb-precache/;
    expect(addresses.filter((address) => !known.test(address))).toEqual([]);
  });

  it('has no absolute path, neither of the host nor of the machine that built it', () => {
    const attributes = /(?:src|href|content|url)\s*[=:(]\s*["']?\/(?!\/)/;
    const pages = texts.filter((file) => /\.(html|css|webmanifest)$/.test(file));
    expect(pages.filter((file) => attributes.test(read(file)))).toEqual([]);
    expect(texts.filter((file) => /["'`]\/assets\//.test(read(file)) || read(file).includes(root))).toEqual([]);
  });

  it('carries the notice of every bundled package', () => {
    const notices = read('notices.txt');
    for (const name of ['preact', '@preact/signals', 'workbox-precaching', 'workbox-window']) {
      expect(notices).toMatch(new RegExp(`^${name} \\d+\\.`, 'm'));
    }
  });
});
