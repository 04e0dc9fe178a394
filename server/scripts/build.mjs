// npm run build: the client and the server as they run in production.
import { pathToFileURL } from 'node:url';
import { build as esbuild } from 'esbuild';
import { build as vite } from 'vite';
import { buildValidators } from './build-validators.mjs';

// Says nothing about what a later version of vite will want.
process.env.VITE_CONFIG_NATIVE_IGNORE_WARNING = 'true';

// mathjs takes a second to load from its own files and a tenth of that when bundled.
const BUNDLED = ['mathjs'];

/** Every package stays outside the bundle, save those that gain by being in it. */
const outside = {
  name: 'outside',
  setup(build) {
    build.onResolve({ filter: /^[^.#/]/ }, ({ path, importer }) => {
      const isOwn = !importer.includes('/node_modules/');
      const bundled = BUNDLED.some((name) => path === name || path.startsWith(`${name}/`));
      return isOwn && !bundled && !path.startsWith('node:') ? { path, external: true } : undefined;
    });
  },
};

function buildServer() {
  return esbuild({
    entryPoints: { main: 'server/main.ts', 'workers/check.worker': 'server/workers/check.worker.ts' },
    outdir: 'dist/server',
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    splitting: true,
    chunkNames: 'chunks/[name]-[hash]',
    plugins: [outside],
    // The data model is known by the names of its classes.
    keepNames: true,
    sourcemap: true,
    logLevel: 'warning',
    banner: { js: "import { createRequire as cr } from 'node:module'; const require = cr(import.meta.url);" },
  });
}

export async function build() {
  await buildValidators();
  await Promise.all([
    buildServer(),
    vite({ logLevel: 'warn', build: { rolldownOptions: { checks: { pluginTimings: false } } } }),
  ]);
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) await build();
