import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { type Plugin, runnerImport } from 'vite';

const demoFiles = (root: string) => {
  const folder = join(root, 'demo-sessions');
  if (!existsSync(folder)) return [];
  return readdirSync(folder)
    .filter((name) => /\.(json|csv)$/.test(name))
    .sort();
};

const index = (root: string) => `${JSON.stringify({ files: demoFiles(root) }, null, 2)}\n`;

/**
 * Puts beside the app what it brings along: the demo study (demo-sessions/*, and demo-sessions/index.json that
 * lists it), and the published JSON Schemas (schema/*.json).
 */
export function broughtAlong(): Plugin {
  let root = '.';
  return {
    name: 'brought-along',
    configResolved(config) {
      root = config.root;
    },
    configureServer(server) {
      // Vite serves demo-sessions/ from the root by itself; only the list has to be made.
      server.middlewares.use((request, response, next) => {
        if (request.url?.split('?')[0] !== '/demo-sessions/index.json') return next();
        response.setHeader('Content-Type', 'application/json');
        response.end(index(root));
      });
    },
    async generateBundle() {
      if (this.environment.name !== 'client') return;
      for (const name of demoFiles(root)) {
        const source = readFileSync(join(root, 'demo-sessions', name));
        this.emitFile({ type: 'asset', fileName: `demo-sessions/${name}`, source });
      }
      this.emitFile({ type: 'asset', fileName: 'demo-sessions/index.json', source: index(root) });
      for (const [name, schema] of Object.entries(await jsonSchemas(root))) {
        const source = `${JSON.stringify(schema, null, 2)}\n`;
        this.emitFile({ type: 'asset', fileName: `schema/${name.replace(/\.json$/, '')}.json`, source });
      }
    },
  };
}

/** The schemas are made by the app's own source, so that they cannot say anything else than it checks. */
async function jsonSchemas(root: string): Promise<Record<string, object>> {
  const file = join(root, 'src/exchange/jsonSchemas.ts');
  if (!existsSync(file)) return {};
  const { module } = await runnerImport<{ jsonSchemas(): Record<string, object> }>(file, {
    configFile: false,
    logLevel: 'warn',
  });
  return module.jsonSchemas();
}
