import { defineConfig } from 'astro/config';

// BASE_PATH: the folder of the host under which the site is served, "/" by default.
export default defineConfig({
  base: process.env.BASE_PATH ?? '/',
  trailingSlash: 'always',
  devToolbar: { enabled: false },
  // Nothing inline: the Content-Security-Policy of the pages allows scripts and styles from files only.
  build: { inlineStylesheets: 'never' },
  vite: { build: { assetsInlineLimit: 0 } },
});
