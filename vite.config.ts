import vue from '@vitejs/plugin-vue';
import { defineConfig } from 'vite';

/**
 * Two builds from one place. The client goes to dist/client. With `--ssr` the server's beginnings go to dist/server, with
 * packages left in node_modules; its decorators are turned into calls by the settings in server/tsconfig.json.
 */
export default defineConfig(({ isSsrBuild }) => ({
  plugins: [vue()],
  publicDir: isSsrBuild ? false : 'public',
  build: isSsrBuild
    ? {
        outDir: 'dist/server',
        emptyOutDir: true,
        target: 'node20',
        minify: false,
        sourcemap: true,
        rolldownOptions: {
          input: {
            main: 'server/main.ts',
            migrate: 'server/migrate.ts',
            demo: 'server/demo.ts',
            rebuild: 'server/rebuild.ts',
          },
        },
      }
    : { outDir: 'dist/client', emptyOutDir: true, target: 'es2022', sourcemap: false, assetsInlineLimit: 0 },
  server: {
    host: '127.0.0.1',
    port: Number(process.env.VITE_PORT ?? 5173),
    strictPort: true,
    proxy: Object.fromEntries(
      ['/api', '/healthz', '/readyz'].map((path) => [
        path,
        { target: process.env.SERVER_ADDRESS ?? 'http://127.0.0.1:4180' },
      ]),
    ),
  },
}));
