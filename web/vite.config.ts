import { defineConfig } from 'vitest/config';
import { mockApi } from './test/mock/plugin.ts';

const serviceUrl = 'http://127.0.0.1:5080';

/** `vite` alone proxies to a running service; `vite --mode mock` answers from invented, deterministic passes. */
export default defineConfig(({ mode }) => ({
  plugins: mode.startsWith('mock') ? [mockApi(mode)] : [],
  build: {
    outDir: '../src/PassPlanner.Service/wwwroot',
    emptyOutDir: true,
    target: 'es2022',
    assetsInlineLimit: 0,
  },
  server: mode.startsWith('mock') ? {} : { proxy: { '/api': serviceUrl, '/openapi': serviceUrl, '/health': serviceUrl } },
  test: { include: ['test/**/*.test.ts'], environment: 'node' },
}));
