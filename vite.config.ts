import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { fileURLToPath } from 'node:url';
import { defineConfig, loadEnv, type Plugin } from 'vite';
import { markSvg } from './shared/format/mark';
import { LIGHT } from './shared/format/palette';

const root = fileURLToPath(new URL('.', import.meta.url));

/** The tab's icon, drawn from the mark and the palette so that neither is written twice. */
function tabIcon(): Plugin {
  const icon = markSvg((token) => LIGHT[token]);
  return {
    name: 'tab-icon',
    configureServer(server) {
      server.middlewares.use('/mark.svg', (_req, res) => {
        res.setHeader('Content-Type', 'image/svg+xml');
        res.end(icon);
      });
    },
    generateBundle() {
      this.emitFile({ type: 'asset', fileName: 'mark.svg', source: icon });
    },
  };
}

/** The client: built into dist/client, served by the server; in development beside it, with /api passed on. */
export default defineConfig(({ mode }) => {
  const env = loadEnv(mode, root, ['PORT', 'CLIENT_PORT']);
  const apiPort = env['PORT'] ?? '8080';
  return {
    root,
    plugins: [react(), tailwindcss(), tabIcon()],
    // The server puts each response's own nonce in its place (and Radix reads it, see src/app/nonce.ts).
    html: { cspNonce: '__CSP_NONCE__' },
    build: {
      outDir: 'dist/client',
      emptyOutDir: true,
      target: 'es2022',
      // No file is inlined as data: fonts and pictures stay under 'self'.
      assetsInlineLimit: 0,
      // The polyfill would be an inline script, which the page's policy forbids.
      modulePreload: { polyfill: false },
    },
    worker: { format: 'es' as const },
    server: {
      host: '127.0.0.1',
      port: Number(env['CLIENT_PORT'] ?? 5173),
      proxy: { '/api': { target: `http://127.0.0.1:${apiPort}`, changeOrigin: false } },
    },
  };
});
