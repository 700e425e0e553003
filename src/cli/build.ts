import { buildSite } from './build-site.ts';

const { ok, fresh, output } = await buildSite();
process.stdout.write(fresh ? output : 'dist/ is up to date\n');
process.exitCode = ok ? 0 : 1;
