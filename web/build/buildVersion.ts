/**
 * The version shown in the app: that of package.json and seven digits of a hash over everything the build reads,
 * so two builds carry the same version exactly when they were made from the same sources.
 */
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const sources = ['core', 'web', 'public', 'package-lock.json', 'vite.config.ts'];

/** Throws if `root` is not the project's folder. `DRIFTBOOK_VERSION` overrides it, for tests of the update. */
export function buildVersion(root: string): string {
  const override = process.env['DRIFTBOOK_VERSION'];
  if (override) return override;
  const hash = createHash('sha256');
  for (const file of sources.flatMap((source) => filesUnder(root, source))) {
    hash.update(`${file}\0`).update(readFileSync(join(root, file)));
  }
  const { version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')) as { version: string };
  return `${version}+${hash.digest('hex').slice(0, 7)}`;
}

function filesUnder(root: string, source: string): string[] {
  if (source.includes('.')) return [source];
  return readdirSync(join(root, source), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath.slice(root.length + 1), entry.name).replaceAll('\\', '/'))
    .sort();
}
