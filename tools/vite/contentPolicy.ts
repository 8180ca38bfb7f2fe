import { readFileSync } from 'node:fs';
import type { Plugin } from 'vite';

/**
 * Writes the content security policy into the built page as well, for hosts that send no headers. Only into the
 * built one: the development server needs inline scripts. `frame-ancestors` has no effect in a page and is left out.
 */
export function contentPolicy(): Plugin {
  const headers = JSON.parse(readFileSync(new URL('../headers.json', import.meta.url), 'utf8'));
  const policy = String(headers['Content-Security-Policy'])
    .split('; ')
    .filter((directive) => !directive.startsWith('frame-ancestors'))
    .join('; ');
  return {
    name: 'content-policy',
    apply: 'build',
    transformIndexHtml: () => [
      {
        tag: 'meta',
        attrs: { 'http-equiv': 'Content-Security-Policy', content: policy },
        injectTo: 'head-prepend',
      },
    ],
  };
}
