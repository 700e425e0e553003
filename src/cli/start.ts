import { parseArgs } from 'node:util';
import { InputError } from '../quantity/problem.ts';
import { buildSite } from './build-site.ts';
import { site } from './project.ts';
import { run } from './run.ts';
import { serve } from './serve.ts';

const usual = 4321;

/** @throws InputError when the command line asks for anything but a port */
function readPort(args: readonly string[]): number {
  const { values, tokens } = parseArgs({
    args: [...args],
    options: { port: { type: 'string', default: String(usual) } },
    strict: false,
    tokens: true,
  });
  const stranger = tokens.find((token) => token.kind !== 'option' || token.name !== 'port');
  const would = `give a port from 1 to 65535, as in --port ${usual}, or nothing`;
  if (stranger !== undefined) {
    const read = args[stranger.index] ?? '';
    throw new InputError({ field: 'command line', read, why: 'this means nothing here', would });
  }
  const read = typeof values.port === 'string' ? values.port : '';
  const port = /^\d{1,5}$/.test(read) ? Number(read) : 0;
  if (port < 1 || port > 65_535) throw new InputError({ field: '--port', read, why: 'not a port', would });
  return port;
}

/** Builds the site if it must be, serves it until it is stopped, and says what to do next. */
await run(async (args) => {
  const port = readPort(args);
  process.stderr.write('Building the site … ');
  const { ok, fresh, output } = await buildSite();
  process.stderr.write(ok ? (fresh ? 'done.\n' : 'it is up to date.\n') : `\n${output}\n`);
  if (!ok) {
    process.exitCode = 1;
    return 'The site could not be built; what stands above says why.\n';
  }
  const served = await serve({ root: site, port, orNext: true });
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.on(signal, () => void served.close().then(() => process.exit(0)));
  }
  return `${served.port === port ? '' : `Port ${port} is taken by another program.\n`}
Ferrule is at  ${served.url}

Open that address in a browser: a worked example is there already. Type your own source, load and frequency
under Given, and everything follows. The PDF report is made under Record and report, at the end of the sheet.
Two more sheets: ${served.url}resistive/ and ${served.url}sections/

Only this machine can reach it. Press Ctrl-C to stop.
`;
});
