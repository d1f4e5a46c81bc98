import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { brotliCompressSync, constants } from 'node:zlib';
import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig, type Plugin } from 'vite';

const SMALL = 1_024;
const COMPRESSED = /\.(js|css|svg|json)$/;
/** What the first paint is set in; the numbers' font comes with the first page that shows numbers. */
const FIRST_FONTS = [
  /lato-latin-400-normal-[^/]+\.woff2$/,
  /lato-latin-700-normal-[^/]+\.woff2$/,
  /lato-latin-900-normal-[^/]+\.woff2$/,
];

/** The server hands out `name.br` instead of `name` where the browser takes it. */
function brotli(): Plugin {
  return {
    name: 'rivetside-brotli',
    apply: 'build',
    enforce: 'post',
    writeBundle({ dir }, bundle) {
      for (const name of Object.keys(bundle).filter((one) => COMPRESSED.test(one))) {
        const file = join(dir ?? 'dist', name);
        const text = readFileSync(file);
        if (text.length < SMALL) continue;
        const params = {
          [constants.BROTLI_PARAM_QUALITY]: 11,
          [constants.BROTLI_PARAM_SIZE_HINT]: text.length,
        };
        writeFileSync(`${file}.br`, brotliCompressSync(text, { params }));
      }
    },
  };
}

/** Else the fonts wait until the styles that name them have come. */
function preloadFonts(): Plugin {
  return {
    name: 'rivetside-preload-fonts',
    apply: 'build',
    transformIndexHtml: {
      order: 'post',
      handler: (_html, { bundle }) =>
        Object.keys(bundle ?? {})
          .filter((name) => FIRST_FONTS.some((font) => font.test(name)))
          .map((name) => ({
            tag: 'link',
            attrs: { rel: 'preload', as: 'font', type: 'font/woff2', href: `/${name}`, crossorigin: true },
            injectTo: 'head' as const,
          })),
    },
  };
}

export default defineConfig({
  plugins: [react(), preloadFonts(), brotli()],
  resolve: { conditions: ['source', ...defaultClientConditions] },
  build: {
    target: 'es2022',
    sourcemap: false,
    manifest: true,
    // Fonts and drawings keep files of their own: inlined they would be fetched by everybody, and the policy forbids data: fonts.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
  },
  server: {
    proxy: {
      '/api': 'http://127.0.0.1:3000',
      '/socket.io': { target: 'http://127.0.0.1:3000', ws: true },
    },
  },
});
