import { mostBytes } from '../../src/recheck/read-file.ts';
import type { FromRecheck, ToRecheck } from '../../src/workers/recheck-messages.ts';

/** Rechecks a file in a worker of its own; the answer ends it before its time. */
export function checkFile(file: File, hear: (message: FromRecheck) => void): () => void {
  const worker = new Worker(new URL('../../src/workers/recheck.worker.ts', import.meta.url), { type: 'module' });
  const fail = (why: string, would: string): void => {
    worker.terminate();
    hear({ kind: 'refused', problems: [{ field: 'file', read: file.name, why, would }] });
  };
  worker.addEventListener('message', ({ data }: MessageEvent<FromRecheck>) => {
    if (data.kind !== 'progress') worker.terminate();
    hear(data);
  });
  worker.addEventListener('error', ({ message }) => {
    fail(message === '' ? 'its recheck can’t be fetched' : message, 'reload the page');
  });
  // Of a file that is too large, one byte too many is enough to refuse it.
  file
    .slice(0, mostBytes + 1)
    .arrayBuffer()
    .then(
      (buffer) => {
        const fonts = { regular: font('regular'), bold: font('bold') };
        const message: ToRecheck = { name: file.name, bytes: new Uint8Array(buffer), fonts };
        worker.postMessage(message, [buffer]);
      },
      () => fail('the browser can’t read it', 'give a file, not a folder'),
    );
  return () => worker.terminate();
}

const font = (weight: 'regular' | 'bold'): string =>
  new URL(`${import.meta.env.BASE_URL.replace(/\/?$/u, '/')}fonts/ferrule-${weight}.ttf`, location.href).href;
