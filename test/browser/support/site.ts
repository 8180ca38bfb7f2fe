import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from 'vite';
import { type Served, serve } from '../../../tools/serve.mjs';

/** The host of the built app, which a test can stop, start again at the same address, and give a new version. */
export class Site {
  private served: Served | undefined;
  private port = 0;
  private dir = 'dist';
  private versions: string[] = [];
  private extraDir: string | undefined;

  /** @param base the folder under which the app is served, `/` or `/some/folder/` */
  constructor(private readonly base = '/') {}

  /** The app's address, also while the site is stopped. */
  get url(): string {
    return `http://127.0.0.1:${this.port}${this.base}`;
  }

  get origin(): string {
    return new URL(this.url).origin;
  }

  async start(): Promise<void> {
    if (this.served) return;
    this.served = await serve({
      dir: () => this.dir,
      port: this.port,
      base: this.base,
      extraDir: this.extra,
    });
    this.port = this.served.port;
  }

  async stop(): Promise<void> {
    await this.served?.close();
    this.served = undefined;
  }

  /**
   * Puts a newer version on the site: the same app, whose page says `data-version` with the given text at its
   * root element, and a service worker that knows the new page.
   */
  publish(version: string): void {
    const dir = mkdtempSync(join(tmpdir(), 'site-'));
    this.versions.push(dir);
    cpSync('dist', dir, { recursive: true });
    const page = readFileSync(join(dir, 'index.html'), 'utf8');
    writeFileSync(join(dir, 'index.html'), page.replace('<html ', `<html data-version="${version}" `));
    const worker = readFileSync(join(dir, 'sw.js'), 'utf8');
    const renewed = worker.replace(/(url:\s*"index\.html",\s*revision:\s*")[^"]+/, `$1${version}`);
    if (renewed === worker) throw new Error('the service worker does not list index.html');
    writeFileSync(join(dir, 'sw.js'), renewed);
    this.dir = dir;
  }

  /** A folder served beside the app as /__test__/, with an empty page in it. */
  private get extra(): string {
    if (this.extraDir === undefined) {
      this.extraDir = mkdtempSync(join(tmpdir(), 'extra-'));
      writeFileSync(join(this.extraDir, 'empty.html'), '<!doctype html><title>empty</title>');
    }
    return this.extraDir;
  }

  /**
   * Bundles a module of the project, with all that it imports, for pages of this site.
   *
   * @param entry its path from the project's root
   * @returns the address to `import()` in a page
   */
  async bundle(entry: string): Promise<string> {
    const name = entry.replaceAll(/[^\w]+/g, '-');
    await build({
      configFile: false,
      logLevel: 'warn',
      publicDir: false,
      build: {
        outDir: this.extra,
        emptyOutDir: false,
        lib: { entry, formats: ['es'], fileName: () => `${name}.js` },
      },
    });
    return `${this.origin}/__test__/${name}.js`;
  }

  /** The address of an empty page on the app's origin, without the app: for adapters on their own. */
  get emptyPage(): string {
    return `${this.origin}/__test__/empty.html`;
  }

  async remove(): Promise<void> {
    await this.stop();
    if (this.extraDir !== undefined) rmSync(this.extraDir, { recursive: true });
    for (const dir of this.versions) rmSync(dir, { recursive: true });
  }
}
