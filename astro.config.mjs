import { defineConfig } from 'astro/config';

/**
 * Takes the indentation out of the elements' templates and styles, which minifiers leave alone. Outside of templates it
 * means nothing.
 */
const unindented = {
  name: 'unindented-templates',
  apply: 'build',
  enforce: 'pre',
  transform: (code, id) =>
    /\/components\/.*\.ts$/.test(id) ? { code: code.replace(/\n\s+/g, '\n'), map: null } : null,
};

// BASE_PATH: the folder of the host under which the site is served, "/" by default.
export default defineConfig({
  base: process.env.BASE_PATH ?? '/',
  trailingSlash: 'always',
  devToolbar: { enabled: false },
  // Nothing inline: the Content-Security-Policy of the pages allows scripts and styles from files only.
  build: { inlineStylesheets: 'never' },
  vite: { build: { assetsInlineLimit: 0 }, plugins: [unindented] },
});
