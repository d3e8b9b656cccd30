/** `npm start`: installs if needed, builds, and serves the built app to this computer. */
import { install, root } from './install.mjs';

install();
process.chdir(root);
const { build, preview } = await import('vite');
await build({ configFile: `${root}vite.config.ts`, logLevel: 'warn' });
// Vite takes the next port if this one is in use.
const server = await preview({ configFile: `${root}vite.config.ts`, preview: { host: '127.0.0.1', port: 4173 } });
console.log('Driftbook is served here until you press Ctrl+C:');
console.log(server.resolvedUrls?.local[0]);
