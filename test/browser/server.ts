/**
 * A static server for one folder at a time, as any host would serve it, that a test can stop, start again on the same
 * port, and turn to another build; and the making of builds that differ in their version only.
 */
import { execFile } from 'node:child_process';
import { createReadStream, existsSync, statSync } from 'node:fs';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import { extname, join, normalize } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { contentSecurityPolicy } from '../../web/build/contentSecurityPolicy';

const root = fileURLToPath(new URL('../..', import.meta.url));

/** What `npm run build` has made. */
export const distDir = join(root, 'dist');

const types: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.txt': 'text/plain; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.webmanifest': 'application/manifest+json',
};

export interface StaticServer {
  /** With the slash at its end. The same from start to start. */
  readonly url: string;
  /** Serves another folder from the next request on. */
  serve(dir: string): void;
  /** Ends all connections; requests then fail as they do without a network. */
  stop(): Promise<void>;
  start(): Promise<void>;
}

/** Starts serving `dir` on 127.0.0.1. Port 0 takes a free one. */
export async function startServer({ dir = distDir, port = 0 } = {}): Promise<StaticServer> {
  let folder = dir;
  const answer = (request: IncomingMessage, response: ServerResponse) => send(folder, request, response);
  let server = await listen(answer, port);
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error(`Expected a port, got ${address}`);
  return {
    url: `http://127.0.0.1:${address.port}/`,
    serve: (next) => {
      folder = next;
    },
    stop: () => close(server),
    start: async () => {
      server = await listen(answer, address.port);
    },
  };
}

function listen(answer: (request: IncomingMessage, response: ServerResponse) => void, port: number): Promise<Server> {
  const server = createServer(answer);
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve(server));
  });
}

function close(server: Server): Promise<void> {
  if (!server.listening) return Promise.resolve();
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections();
  });
}

function send(folder: string, request: IncomingMessage, response: ServerResponse): void {
  const path = decodeURIComponent(new URL(request.url ?? '/', 'http://host').pathname);
  const file = join(folder, normalize(path.endsWith('/') ? `${path}index.html` : path));
  if (!file.startsWith(folder) || !existsSync(file) || !statSync(file).isFile()) {
    response.writeHead(404).end();
    return;
  }
  response.writeHead(200, {
    'Content-Type': types[extname(file)] ?? 'application/octet-stream',
    'Content-Security-Policy': contentSecurityPolicy,
    // The browser must ask again, so that a test sees a new build at once.
    'Cache-Control': 'no-cache',
  });
  createReadStream(file).pipe(response);
}

/** Builds the app with this version into a folder of that name, and answers its path. */
export async function buildVersionOf(version: string): Promise<string> {
  const outDir = join(root, '.cache/builds', version);
  await promisify(execFile)(join(root, 'node_modules/.bin/vite'), ['build', '--outDir', outDir, '--logLevel', 'warn'], {
    cwd: root,
    env: { ...process.env, DRIFTBOOK_VERSION: version },
  });
  return outDir;
}
