import { generateSW } from 'workbox-build';
import { site } from './project.ts';

/**
 * Writes the worker that keeps the whole site on the device: pages, scripts fetched on demand, fonts, demonstrations. A
 * new version takes over once the last open sheet is closed, so that no calculation changes under its reader's eyes.
 */
const { count, size, warnings } = await generateSW({
  globDirectory: site,
  globPatterns: ['**/*.{html,js,css,json,svg,png,ttf,webmanifest,woff2,txt}'],
  swDest: `${site}/service-worker.js`,
  inlineWorkboxRuntime: true,
  sourcemap: false,
  cleanupOutdatedCaches: true,
  clientsClaim: true,
  skipWaiting: false,
  // A sheet's address differs in what follows the #, which no request carries; nothing after ? means anything here.
  ignoreURLParametersMatching: [/./],
  // Names under _astro/ carry a hash of what is in them.
  dontCacheBustURLsMatching: /_astro\//,
  maximumFileSizeToCacheInBytes: 8_000_000,
});

for (const warning of warnings) console.error(warning);
if (warnings.length > 0) process.exitCode = 1;
else
  process.stdout.write(
    `${String(count)} files, ${String(Math.round(size / 1000))} kB, kept for use without a network\n`,
  );
