import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, expect, it } from 'vitest';
import { type Served, serve } from '../../tools/serve.mjs';

const root = mkdtempSync(join(tmpdir(), 'serve-'));
const dir = join(root, 'dist');
let served: Served | undefined;

beforeAll(() => {
  mkdirSync(join(dir, 'assets'), { recursive: true });
  mkdirSync(join(root, 'extra'));
  writeFileSync(join(root, 'secret.txt'), 'secret');
  writeFileSync(join(dir, 'index.html'), '<p>page');
  writeFileSync(join(dir, 'sw.js'), '1');
  writeFileSync(join(dir, 'assets', 'index-abc.js'), '1');
  writeFileSync(join(root, 'extra', 'x.js'), '2');
});
afterEach(() => served?.close());
afterAll(() => rmSync(root, { recursive: true }));

const start = async (options = {}) => {
  served = await serve({ dir, ...options });
  return served;
};

/** The status of a path sent as it stands; fetch would tidy it up before. */
const rawStatus = (port: number, path: string) =>
  new Promise((done) =>
    request({ port, path, host: '127.0.0.1' }, ({ statusCode }) => done(statusCode)).end(),
  );

it('types and caching fit each file', async () => {
  const { url } = await start();
  const seen = await Promise.all(
    ['', 'sw.js', 'assets/index-abc.js'].map(async (path) => {
      const { headers } = await fetch(url + path);
      return [headers.get('content-type')?.split(';')[0], headers.get('cache-control')];
    }),
  );
  expect(seen).toEqual([
    ['text/html', 'no-cache'],
    ['text/javascript', 'no-cache'],
    ['text/javascript', 'public, max-age=31536000, immutable'],
  ]);
});

it('an unchanged file is not sent again', async () => {
  const { url } = await start();
  const tag = (await fetch(url)).headers.get('etag') ?? '';
  expect((await fetch(url, { headers: { 'If-None-Match': tag } })).status).toBe(304);
});

it('nothing outside of the folder is reached', async () => {
  const { port } = await start();
  for (const path of [
    '/../secret.txt',
    '/%2e%2e/secret.txt',
    '/..%2fsecret.txt',
    '/assets/../../secret.txt',
  ]) {
    expect(await rawStatus(port, path)).toBe(404);
  }
  expect(await rawStatus(port, '/%')).toBe(400);
});

it('only reading is allowed', async () => {
  const { url } = await start();
  expect((await fetch(url, { method: 'POST' })).status).toBe(405);
});

it('the extra folder is there only when asked for', async () => {
  const plain = await start();
  expect((await fetch(`${plain.url}__test__/x.js`)).status).toBe(404);
  await plain.close();
  const { url } = await start({ extraDir: join(root, 'extra') });
  expect(await (await fetch(`${url}__test__/x.js`)).text()).toBe('2');
});

it('a taken port is an error, or another one is taken', async () => {
  const { port } = await start();
  await expect(serve({ dir, port })).rejects.toThrow('EADDRINUSE');
  const other = await serve({ dir, port, orNext: true });
  expect(other.port).not.toBe(port);
  await other.close();
});

it('under a folder, only that folder answers', async () => {
  const { url, port } = await start({ base: '/some/folder/' });
  expect(await (await fetch(url)).text()).toBe('<p>page');
  expect(await rawStatus(port, '/')).toBe(404);
});
