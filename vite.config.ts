import { readFileSync } from 'node:fs';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';
import { broughtAlong } from './tools/vite/broughtAlong.ts';
import { contentPolicy } from './tools/vite/contentPolicy.ts';

const { version } = JSON.parse(readFileSync(new URL('./package.json', import.meta.url), 'utf8')) as {
  version: string;
};

const ownModule = /[\\/]src[\\/](?!app[\\/]main\.tsx$|worker[\\/]worker\.ts$).*\.tsx?$/;

export default defineConfig({
  // Relative, so that the built files work under any folder of any host.
  base: './',
  define: { __APP_VERSION__: JSON.stringify(version) },
  build: {
    target: ['chrome111', 'firefox115', 'safari16.4'],
    // Nothing inlined: the content security policy knows files only.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    // Which file holds what: the size of the recorder is added up from it.
    manifest: true,
    rolldownOptions: {
      // Our modules do nothing by being imported, but for the two that start something: an index file that is passed
      // through brings along only what is used of it.
      treeshake: { moduleSideEffects: [{ test: ownModule, sideEffects: false }] },
    },
  },
  worker: { format: 'es' },
  plugins: [
    react(),
    contentPolicy(),
    broughtAlong(),
    VitePWA({
      // A new version waits until it is asked for: it must never be swapped in under a session.
      registerType: 'prompt',
      injectRegister: null,
      strategies: 'generateSW',
      includeManifestIcons: false,
      manifest: {
        id: './',
        name: 'Lookbell',
        short_name: 'Lookbell',
        description:
          'Prompts and records lesson observation: percent on-task, agreement and change, with no network.',
        lang: 'en',
        start_url: './',
        scope: './',
        display: 'standalone',
        orientation: 'any',
        theme_color: '#f6f3ea',
        background_color: '#f6f3ea',
        icons: [
          { src: 'icon-192.png', sizes: '192x192', type: 'image/png', purpose: 'any' },
          { src: 'icon-512.png', sizes: '512x512', type: 'image/png', purpose: 'any' },
          { src: 'icon-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
          { src: 'icon.svg', sizes: 'any', type: 'image/svg+xml', purpose: 'any' },
        ],
      },
      workbox: {
        globPatterns: ['**/*.{js,css,html,svg,png,woff2,json,csv}'],
        maximumFileSizeToCacheInBytes: 8_000_000,
        cleanupOutdatedCaches: true,
        clientsClaim: false,
        skipWaiting: false,
        navigateFallback: 'index.html',
        navigateFallbackDenylist: [/\/(schema|demo-sessions|__test__)\//],
      },
    }),
  ],
});
