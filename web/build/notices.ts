/** Licence notices of the packages whose modules ended up in the build, as their licences demand. */
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';

interface PackageJson {
  readonly name: string;
  readonly version: string;
  readonly license?: string;
}

/** Throws if a bundled package has no licence file, so that none is shipped without its notice. */
export function noticesOf(moduleIds: readonly string[]): string {
  const folders = new Set(moduleIds.filter((id) => id.includes('node_modules')).map(packageFolder));
  const notices = [...folders].map(noticeOf).sort();
  return ['Driftbook contains the following software of others.', ...notices].join(`\n\n${'-'.repeat(78)}\n\n`);
}

function packageFolder(moduleId: string): string {
  const folder = /^\0?(.*[\\/]node_modules[\\/](?:@[^\\/]+[\\/])?[^\\/]+)/.exec(moduleId)?.[1];
  if (!folder || !existsSync(join(folder, 'package.json'))) {
    throw new Error(`Expected a package around ${moduleId}, found none in ${folder ?? dirname(moduleId)}`);
  }
  return folder;
}

function noticeOf(folder: string): string {
  const about = JSON.parse(readFileSync(join(folder, 'package.json'), 'utf8')) as PackageJson;
  const file = readdirSync(folder).find((name) => /^licen[cs]e(\.\w+)?$/i.test(name));
  if (!file) throw new Error(`Expected a licence file in ${about.name}, found none`);
  const text = readFileSync(join(folder, file), 'utf8').replaceAll('\r\n', '\n').trim();
  return `${about.name} ${about.version} (${about.license ?? 'see below'})\n\n${text}`;
}
