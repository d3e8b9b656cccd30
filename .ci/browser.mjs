/** Finds Chromium for the browser tests, and as root on Debian installs it. */
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

const debian = '/usr/bin/chromium';

/** The path of the browser, or null after saying what is missing. */
export function findBrowser() {
  const wanted = process.env.CHROMIUM_PATH;
  if (wanted && existsSync(wanted)) return wanted;
  if (wanted) console.error(`CHROMIUM_PATH points to ${wanted}, where there is nothing.`);
  if (existsSync(debian)) return debian;
  if (process.getuid?.() === 0 && existsSync('/usr/bin/apt-get')) {
    console.log('Installing Chromium with apt-get');
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    const run = (...args) => spawnSync('apt-get', args, { stdio: ['ignore', 'inherit', 'inherit'], env }).status === 0;
    run('update');
    if (run('install', '-y', '--no-install-recommends', 'chromium') && existsSync(debian)) return debian;
  }
  console.error('The browser tests need Chromium: install it, or set CHROMIUM_PATH to its program.');
  return null;
}
