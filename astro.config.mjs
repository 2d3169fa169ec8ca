import './scripts/requireNode.mjs';
import { readFileSync } from 'node:fs';
import { defineConfig } from 'astro/config';
import { parse } from 'yaml';

process.env.ASTRO_TELEMETRY_DISABLED ??= '1';

const { site, base } = siteSettings();

export default defineConfig({
  site,
  base,
  trailingSlash: 'always',
  publicDir: './src/public',
  build: { format: 'directory', inlineStylesheets: 'never' },
  compressHTML: true,
  prerenderConflictBehavior: 'error',
  markdown: { syntaxHighlight: false },
  vite: { build: { assetsInlineLimit: 0 } },
  security: {
    csp: {
      directives: [
        "default-src 'none'",
        "img-src 'self'",
        "font-src 'self'",
        "connect-src 'self'",
        "base-uri 'none'",
        "form-action 'self'",
      ],
    },
  },
});

/** Origin and base path: from the tables a command has left in this process, otherwise from the keeper's file. */
function siteSettings() {
  const left = globalThis[Symbol.for('redbound.press')];
  if (left) return left.content.site;
  return parse(readFileSync(`${process.env.REDBOUND_CONTENT ?? 'content'}/site.yaml`, 'utf8'));
}
