import { parseArgs } from 'node:util';
import { buildSite } from './build-site.ts';
import { site } from './project.ts';
import { serve } from './serve.ts';

const usual = 4321;

function readPort(): number {
  const { values } = parseArgs({ options: { port: { type: 'string', default: String(usual) } } });
  const port = Number(values.port);
  if (/^\d+$/.test(values.port) && port >= 1 && port <= 65_535) return port;
  throw new Error(`port "${values.port}": not a port; write a whole number from 1 to 65535, such as ${usual}`);
}

async function start(): Promise<void> {
  const port = readPort();
  console.error('Building the site …');
  const { ok, fresh, output } = await buildSite();
  if (!ok) throw new Error(`the site could not be built:\n${output}`);
  if (!fresh) console.error('It is up to date.');
  const served = await serve({ root: site, port, orNext: true });
  if (served.port !== port) console.error(`Port ${port} is taken by another program.`);
  process.stdout.write(
    [
      '',
      `Ferrule is at  ${served.url}`,
      '',
      'Open that address in a browser: a worked example is there already. Type your own source, load and frequency',
      'under Given and everything follows; Sign-off, at the end of the sheet, makes the PDF report.',
      `Two more sheets: ${served.url}resistive/ and ${served.url}sections/`,
      '',
      'Only this machine can reach it. Press Ctrl-C to stop.',
      '',
    ].join('\n'),
  );
  for (const signal of ['SIGINT', 'SIGTERM'] as const)
    process.on(signal, () => void served.close().then(() => process.exit(0)));
}

start().catch((error: unknown) => {
  console.error(`Ferrule: ${error instanceof Error ? error.message : String(error)}`);
  process.exitCode = 1;
});
