import { defineConfig } from 'astro/config';

/** Styles without comments and without the space that separates nothing. */
const tight = (css) =>
  css
    .replace(/\/\*[^]*?\*\//g, '')
    .replace(/\s+/g, ' ')
    .replace(/ ?([{};]) ?/g, '$1')
    .replace(/([:,]) /g, '$1')
    .replace(/;}/g, '}');

/**
 * Tightens the elements' styles and takes the indentation out of their templates, which minifiers leave alone. Outside of
 * templates indentation means nothing.
 */
const tightTemplates = {
  name: 'tight-templates',
  apply: 'build',
  enforce: 'pre',
  transform(code, id) {
    if (!/\/components\/.*\.ts$/.test(id)) return null;
    const styled = code.replace(/css`([^`]*)`/g, (_, css) => `css\`${tight(css)}\``);
    return { code: styled.replace(/\n\s+/g, '\n'), map: null };
  },
};

// BASE_PATH: the folder of the host under which the site is served, "/" by default.
export default defineConfig({
  base: process.env.BASE_PATH ?? '/',
  trailingSlash: 'always',
  devToolbar: { enabled: false },
  // Nothing inline: the Content-Security-Policy of the pages allows scripts and styles from files only.
  build: { inlineStylesheets: 'never' },
  vite: { build: { assetsInlineLimit: 0 }, plugins: [tightTemplates] },
});
