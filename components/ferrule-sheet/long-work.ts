import type { DesignRecord } from '../../src/record/design-record.ts';
import '../search-progress/search-progress.ts';
import type { FromWorker, ToWorker } from '../../src/workers/messages.ts';

/** The pipeline off the main thread, for one record at a time; its worker starts with the first of them. */
export class LongWork {
  private worker: Worker | null = null;
  private id = 0;
  private readonly hear: (message: FromWorker) => void;

  constructor(hear: (message: FromWorker) => void) {
    this.hear = hear;
  }

  /** Takes the place of the record at work. */
  start(record: DesignRecord) {
    this.id += 1;
    this.worker ??= this.begin();
    this.say({ kind: 'design', id: this.id, record });
  }

  /** The best so far is the result. */
  stop() {
    this.say({ kind: 'stop', id: this.id });
  }

  /** Nothing more is heard of the record at work. */
  drop() {
    this.stop();
    this.id += 1;
  }

  end() {
    this.worker?.terminate();
    this.worker = null;
  }

  private say(message: ToWorker) {
    this.worker?.postMessage(message);
  }

  private begin(): Worker {
    const worker = new Worker(new URL('../../src/workers/design.worker.ts', import.meta.url), { type: 'module' });
    worker.addEventListener('message', ({ data }: MessageEvent<FromWorker>) => {
      if (data.id === this.id) this.hear(data);
    });
    worker.addEventListener('error', ({ message }) => {
      this.end();
      const why = message === '' ? 'the search can’t be fetched' : message;
      const problem = { field: 'method', read: '', why, would: 'reload the page, or take another method' };
      this.hear({ kind: 'refused', id: this.id, problems: [problem] });
    });
    return worker;
  }
}
