/** Licence notices of the packages whose modules ended up in the build, as their licences demand. */
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';

interface PackageJson {
  readonly name: string;
  readonly version: string;
  readonly license?: string;
}

const rule = `\n\n${'-'.repeat(78)}\n\n`;

/** Each licence once, under all that it covers. Throws if a bundled package has none, so that none is shipped without. */
export function noticesOf(moduleIds: readonly string[]): string {
  const folders = new Set(moduleIds.filter((id) => id.includes('node_modules')).map(packageFolder));
  const covered = new Map<string, string[]>();
  const byTitle = (one: PackageNotice, other: PackageNotice) => (one.title < other.title ? -1 : 1);
  for (const { title, licence } of [...folders].map(noticeOf).sort(byTitle)) {
    covered.set(licence, [...(covered.get(licence) ?? []), title]);
  }
  const notices = [...covered].map(([licence, titles]) => `${titles.join('\n')}\n\n${licence}`);
  return ['Driftbook contains the following software of others.', ...notices].join(rule);
}

function packageFolder(moduleId: string): string {
  const folder = /^\0?(.*[\\/]node_modules[\\/](?:@[^\\/]+[\\/])?[^\\/]+)/.exec(moduleId)?.[1];
  if (!folder || !existsSync(join(folder, 'package.json'))) {
    throw new Error(`Expected a package around ${moduleId}, found none in ${folder ?? dirname(moduleId)}`);
  }
  return folder;
}

interface PackageNotice {
  readonly title: string;
  readonly licence: string;
}

function noticeOf(folder: string): PackageNotice {
  const about = JSON.parse(readFileSync(join(folder, 'package.json'), 'utf8')) as PackageJson;
  const file = readdirSync(folder).find((name) => /^licen[cs]e(\.\w+)?$/i.test(name));
  if (!file) throw new Error(`Expected a licence file in ${about.name}, found none`);
  const licence = readFileSync(join(folder, file), 'utf8').replaceAll('\r\n', '\n').trim();
  return { title: `${about.name} ${about.version} (${about.license ?? 'see below'})`, licence };
}
