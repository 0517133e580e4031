import { readdirSync, readFileSync } from 'node:fs';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';
import { defineConfig } from 'vitest/config';

/** Nothing inline, nothing foreign. Workers, styles, images and the manifest fall under default-src. */
const policy = [
  "default-src 'self'",
  "connect-src 'self'",
  "object-src 'none'",
  "base-uri 'self'",
  "form-action 'none'",
].join('; ');

/** Puts the policy first in the head of the built page; the development server needs inline scripts for its refresh. */
const contentSecurityPolicy = (): Plugin => ({
  name: 'content-security-policy',
  apply: 'build',
  transformIndexHtml: {
    order: 'post',
    handler: () => [
      {
        tag: 'meta',
        attrs: { 'http-equiv': 'Content-Security-Policy', content: policy },
        injectTo: 'head-prepend',
      },
    ],
  },
});

/** Fails the build when a file of the app is missing from the list that the service worker keeps for offline use. */
const everythingKeptOffline = (): Plugin => ({
  name: 'everything-kept-offline',
  apply: 'build',
  closeBundle: {
    sequential: true,
    order: 'post',
    handler() {
      const worker = readFileSync('dist/sw.js', 'utf8');
      const files = readdirSync('dist', { recursive: true, withFileTypes: true })
        .filter((entry) => entry.isFile() && entry.name !== 'sw.js')
        .map((entry) => `${entry.parentPath}/${entry.name}`.replaceAll('\\', '/').replace(/^.*?dist\//, ''));
      const missing = files.filter((file) => !worker.includes(`"${file}"`));
      if (missing.length > 0) throw new Error(`the service worker does not keep: ${missing.join(', ')}`);
    },
  },
});

const offline = () =>
  VitePWA({
    registerType: 'prompt',
    injectRegister: false, // src/app/offline.ts registers, from the bundle
    manifest: {
      id: '/',
      name: 'Headwright',
      short_name: 'Headwright',
      description: 'Sizes and reads differential-pressure flow meters.',
      lang: 'en',
      display: 'standalone',
      background_color: '#ffffff',
      theme_color: '#ffffff',
      icons: [
        { src: 'icons/icon-192.png', sizes: '192x192', type: 'image/png' },
        { src: 'icons/icon-512.png', sizes: '512x512', type: 'image/png' },
        { src: 'icons/icon.svg', sizes: 'any', type: 'image/svg+xml' },
      ],
    },
    includeManifestIcons: false, // the patterns below already find them
    workbox: {
      globPatterns: ['**/*'],
      globIgnores: ['sw.js'],
      inlineWorkboxRuntime: true,
      sourcemap: false,
      cleanupOutdatedCaches: true,
      clientsClaim: true, // the first visit is already kept, chunks of later screens included
      maximumFileSizeToCacheInBytes: 4_000_000,
    },
  });

export default defineConfig({
  appType: 'spa',
  plugins: [react(), contentSecurityPolicy(), offline(), everythingKeptOffline()],
  build: { target: 'es2023', assetsInlineLimit: 0, chunkSizeWarningLimit: 700, modulePreload: { polyfill: false } },
  worker: { format: 'es' },
  server: { host: '127.0.0.1' },
  preview: { host: '127.0.0.1', port: 4173 },
  test: {
    include: ['tests/**/*.test.{ts,tsx}'],
    environment: 'node',
    testTimeout: 60_000,
    hookTimeout: 60_000,
  },
});
