import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));
let folder = '';

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'layering-'));
  const config = JSON.parse(readFileSync(join(root, 'biome.json'), 'utf8'));
  // The copy is no git repository.
  writeFileSync(join(folder, 'biome.json'), JSON.stringify({ ...config, vcs: { enabled: false }, $schema: undefined }));
});

afterEach(() => rmSync(folder, { recursive: true, force: true }));

/** The rules that a file with these imports breaks, under the project's own configuration. */
function brokenRules(files: Readonly<Record<string, string>>): string[] {
  for (const [file, text] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, file)), { recursive: true });
    writeFileSync(join(folder, file), text);
  }
  const args = ['lint', '--reporter=json', '--max-diagnostics=none', folder];
  const report = runBiome(args);
  return report.diagnostics
    .map(({ category }) => category)
    .filter((category) => /noRestrictedImports|noImportCycles/.test(category));
}

function runBiome(args: string[]): { diagnostics: { category: string }[] } {
  try {
    return JSON.parse(
      execFileSync(join(root, 'node_modules/.bin/biome'), args, { cwd: folder, encoding: 'utf8', stdio: 'pipe' }),
    );
  } catch (error) {
    return JSON.parse((error as { stdout: string }).stdout);
  }
}

const restricted = ['lint/style/noRestrictedImports'];
const importOf = (path: string) => `import { thing } from '${path}';\nthing();\n`;

const forbidden = [
  ['core/numerics/a.ts', '../bodies/body'],
  ['core/bodies/a.ts', '../orbit/kepler'],
  ['core/orbit/a.ts', '../forces/zonal'],
  ['core/forces/a.ts', '../mission/history'],
  ['core/mission/a.ts', '../design/solve'],
  ['core/design/a.ts', '../record/candidate'],
  ['core/orbit/deep/a.ts', '../../mission/history'],
  ['core/orbit/a.ts', '../index'],
  ['core/orbit/a.ts', '../../web/state/document'],
  ['core/orbit/a.ts', 'preact'],
  ['core/orbit/a.ts', 'node:fs'],
  ['core/record/formats/a.ts', '../../../web/state/document'],
  ['core/record/a.ts', 'idb'],
  ['web/size/a.tsx', '../drift/driftPlace'],
  ['web/drift/a.tsx', '../book/bookPlace'],
  ['web/book/a.tsx', '../size/sizePlace'],
  ['web/state/a.ts', '../size/sizePlace'],
  ['web/parts/a.tsx', '../book/bookPlace'],
  ['web/size/a.tsx', '../../core/orbit/kepler'],
  ['web/app.tsx', '../core/orbit/kepler'],
  ['web/state/a.ts', 'idb'],
  ['web/app.tsx', 'idb'],
  ['web/drift/a.tsx', 'uplot'],
  ['web/drift/a.tsx', 'uplot/dist/uPlot.min.css'],
  ['web/parts/a.tsx', 'uplot'],
  ['web/main.tsx', 'workbox-window'],
  ['web/store/a.ts', 'workbox-core'],
  ['web/state/a.ts', 'node:fs'],
  ['web/work/a.ts', '../state/document'],
  ['web/work/a.ts', 'preact'],
  ['test/web/a.test.ts', '../../core/orbit/kepler'],
] as const;

const allowed = [
  ['core/orbit/a.ts', '../bodies/body'],
  ['core/orbit/a.ts', '../numerics/angles'],
  ['core/design/deep/a.ts', '../../bodies/body'],
  ['core/design/deep/a.ts', '../shallow'],
  ['core/record/formats/a.ts', '../../orbit/kepler'],
  ['core/record/a.ts', 'valibot'],
  ['web/size/a.tsx', '../../core/index'],
  ['web/size/a.tsx', '../state/document'],
  ['web/app.tsx', './size/sizePlace'],
  ['web/store/a.ts', 'idb'],
  ['web/parts/plot.ts', 'uplot'],
  ['web/offline/a.ts', 'workbox-window'],
  ['web/work/a.ts', './searchTracks'],
  ['web/work/a.ts', '../../core/index'],
  ['web/size/a.tsx', '../work/work'],
  ['test/web/a.test.ts', '../../core/index'],
] as const;

describe('the layering check', () => {
  it.each(forbidden)('refuses that %s imports %s', (file, path) => {
    expect(brokenRules({ [file]: importOf(path) })).toEqual(restricted);
  });

  it.each(allowed)('lets %s import %s', (file, path) => {
    expect(brokenRules({ [file]: importOf(path) })).toEqual([]);
  });

  it('sees type imports, exports and imports on demand too', () => {
    const text = [
      "import type { Body } from '../bodies/body';",
      "export { wide } from '../bodies/body';",
      "export const later = (): Promise<Body> => import('../bodies/body');",
    ].join('\n');
    expect(brokenRules({ 'core/numerics/a.ts': text })).toHaveLength(3);
  });

  it('refuses two modules that import each other', () => {
    const files = {
      'core/orbit/a.ts': "import { b } from './b';\nexport const a = () => b();\n",
      'core/orbit/b.ts': "import { a } from './a';\nexport const b = () => a();\n",
    };
    expect(new Set(brokenRules(files))).toEqual(new Set(['lint/suspicious/noImportCycles']));
  });
});
