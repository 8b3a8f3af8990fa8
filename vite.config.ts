import { resolve } from 'node:path';
import { builtinModules } from 'node:module';
import { defineConfig, type UserConfig } from 'vite';
import react from '@vitejs/plugin-react';

const root = import.meta.dirname;
const nodeBuiltins = [...builtinModules, ...builtinModules.map((name) => `node:${name}`)];

/** Renderer: static files only, no inlined data addresses, so that the strict content policy holds. */
const renderer: UserConfig = {
  root: resolve(root, 'renderer'),
  publicDir: resolve(root, 'assets/public'),
  base: './',
  plugins: [react()],
  worker: { format: 'es' },
  build: {
    outDir: resolve(root, 'dist/renderer'),
    emptyOutDir: true,
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    chunkSizeWarningLimit: 2500,
    rolldownOptions: {
      output: {
        codeSplitting: {
          // Splitting would otherwise run schemas before zod is told to leave `eval` alone, which the policy forbids.
          groups: [{ name: 'zod', test: /node_modules[\\/]zod[\\/]|boot[\\/]jitless\.ts/ }],
        },
      },
    },
  },
};

const node = (entry: Record<string, string>, outDir: string, format: 'es' | 'cjs'): UserConfig => ({
  publicDir: format === 'es' ? resolve(root, 'assets/icon') : false,
  build: {
    outDir: resolve(root, outDir),
    emptyOutDir: true,
    minify: false,
    target: 'node20',
    lib: {
      entry,
      formats: [format],
      fileName: (_format, name) => `${name}.${format === 'cjs' ? 'cjs' : 'js'}`,
    },
    rollupOptions: { external: ['electron', ...nodeBuiltins] },
  },
});

export default defineConfig(({ mode }) => {
  if (mode === 'main') return node({ main: resolve(root, 'main/main.ts') }, 'dist/main', 'es');
  // A sandboxed preload cannot be an ES module.
  if (mode === 'preload') return node({ preload: resolve(root, 'main/preload.ts') }, 'dist/preload', 'cjs');
  return renderer;
});
