// npm start: serves the built app from dist/ on this machine, with the headers that any host of it should send.
import { createReadStream, readFileSync, statSync } from 'node:fs';
import { createServer } from 'node:http';
import { extname, join, resolve, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

/** @type {Record<string, string>} */
const headers = JSON.parse(readFileSync(new URL('./headers.json', import.meta.url), 'utf8'));

/** @type {Record<string, string>} */
const types = {
  '.css': 'text/css; charset=utf-8',
  '.csv': 'text/csv; charset=utf-8',
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.txt': 'text/plain; charset=utf-8',
  '.webmanifest': 'application/manifest+json',
  '.woff2': 'font/woff2',
};

/**
 * @typedef {object} ServeOptions
 * @property {string | (() => string)} [dir] the built app; a function is asked at every request
 * @property {number} [port] 0: any free one
 * @property {boolean} [orNext] when the port is taken, take any free one instead of failing
 * @property {string} [base] the folder under which the app is served, `/` or `/some/folder/`
 * @property {string} [extraDir] a folder to serve as /__test__/ as well; nothing asks for it but tests
 *
 * @typedef {{ url: string, port: number, close: () => Promise<void> }} Served
 */

/**
 * The file of a folder that an address names, or undefined when it is none of its.
 *
 * @param {string} dir @param {string} path
 */
function fileIn(dir, path) {
  const root = resolve(dir);
  const file = join(root, path.endsWith('/') ? `${path}index.html` : path);
  if (!file.startsWith(root + sep)) return undefined;
  const stat = statSync(file, { throwIfNoEntry: false });
  return stat?.isFile()
    ? { file, size: stat.size, tag: `"${stat.size.toString(36)}-${stat.mtimeMs.toString(36)}"` }
    : undefined;
}

/** Names with a sum of their content never change; everything else is asked for again. @param {string} path */
const caching = (path) => (path.startsWith('assets/') ? 'public, max-age=31536000, immutable' : 'no-cache');

/**
 * Serves the app until closed.
 *
 * @param {ServeOptions} [options]
 * @returns {Promise<Served>}
 */
export function serve({ dir = 'dist', port = 0, orNext = false, base = '/', extraDir } = {}) {
  const server = createServer((request, response) => {
    /** @param {number} code @param {string} text */
    const refuse = (code, text) => {
      response.writeHead(code, { ...headers, 'Content-Type': 'text/plain; charset=utf-8' }).end(`${text}\n`);
    };
    if (request.method !== 'GET' && request.method !== 'HEAD') return refuse(405, 'Only GET and HEAD.');
    let path;
    try {
      path = decodeURIComponent(new URL(request.url ?? '/', 'http://localhost').pathname);
    } catch {
      return refuse(400, 'Not an address.');
    }
    const extra = extraDir !== undefined && path.startsWith('/__test__/');
    if (!extra && !path.startsWith(base)) return refuse(404, 'Not here.');
    const inside = path.slice(extra ? '/__test__/'.length : base.length);
    const found = fileIn(
      extra ? String(extraDir) : typeof dir === 'string' ? dir : dir(),
      inside === '' ? 'index.html' : inside,
    );
    if (!found) return refuse(404, 'Not here.');
    const all = {
      ...headers,
      'Content-Type': types[extname(found.file)] ?? 'application/octet-stream',
      'Cache-Control': caching(inside),
      ETag: found.tag,
    };
    if (request.headers['if-none-match'] === found.tag) {
      response.writeHead(304, all).end();
      return;
    }
    response.writeHead(200, { ...all, 'Content-Length': found.size });
    if (request.method === 'HEAD') response.end();
    else createReadStream(found.file).pipe(response);
  });

  return new Promise((done, failed) => {
    server.on('error', (error) => {
      if (orNext && port !== 0 && 'code' in error && error.code === 'EADDRINUSE') {
        serve({ dir, base, ...(extraDir === undefined ? {} : { extraDir }) }).then(done, failed);
      } else failed(error);
    });
    server.listen(port, '127.0.0.1', () => {
      const address = server.address();
      if (address === null || typeof address === 'string') return failed(new Error('no port'));
      done({
        url: `http://127.0.0.1:${address.port}${base}`,
        port: address.port,
        close: () =>
          new Promise((closed) => {
            server.close(() => closed());
            server.closeAllConnections();
          }),
      });
    });
  });
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const at = process.argv.indexOf('--port');
  const wished = at > 0 ? Number(process.argv[at + 1]) : 4173;
  if (!Number.isInteger(wished) || wished < 0 || wished > 65535) {
    console.error('--port takes a number from 0 to 65535.');
    process.exit(2);
  }
  if (!statSync('dist/index.html', { throwIfNoEntry: false })) {
    console.error('There is no dist/index.html: run "npm run build" first.');
    process.exit(1);
  }
  const extraDir = process.env.TEST_EXTRA_DIR;
  const { port } = await serve({ port: wished, orNext: true, ...(extraDir ? { extraDir } : {}) });
  if (wished !== 0 && port !== wished) console.log(`Port ${wished} is taken.`);
  console.log(`Lookbell is at http://localhost:${port}/ (Ctrl+C stops it)`);
}
