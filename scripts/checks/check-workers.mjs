import { Worker } from 'node:worker_threads';

/** A check that a worker has not ended after this time is given up: the work limit of a check is far below it. */
const TIME_LIMIT_MS = 1000;
/** A new worker first has to load the checker. */
const START_LIMIT_MS = 60_000;
const WATCH_MS = 200;
/** Room for what a check lets go at once: collecting it less often is a tenth of the time. */
const YOUNG_MB = 64;

/** Worker threads that answer batches of lines; a hung one is ended and replaced. */
export class CheckWorkers {
  #idle = [];
  #all = new Set();
  #waiting = [];
  #watch;

  #code;

  /** `code` is the compiled check-worker. */
  constructor(size, code) {
    this.size = size;
    this.#code = code;
    this.#watch = setInterval(() => this.#endHung(), WATCH_MS);
    this.#watch.unref();
  }

  /** Answers a batch of `{number, text}`: as many lines of JSON, in order. */
  check(batch) {
    return new Promise((resolve, reject) => {
      this.#waiting.push({ batch, resolve, reject, givenUp: new Set() });
      this.#assign();
    });
  }

  async close() {
    clearInterval(this.#watch);
    await Promise.all([...this.#all].map((slot) => slot.worker.terminate()));
  }

  #assign() {
    while (this.#waiting.length > 0) {
      const slot = this.#idle.pop() ?? (this.#all.size < this.size ? this.#start() : null);
      if (slot === null) return;
      slot.task = this.#waiting.shift();
      slot.since = performance.now();
      slot.seen = -1;
      Atomics.store(slot.progress, 0, -1);
      slot.worker.postMessage({ batch: slot.task.batch, givenUp: [...slot.task.givenUp] });
    }
  }

  #start() {
    const shared = new SharedArrayBuffer(4);
    const worker = new Worker(this.#code, {
      eval: true,
      workerData: shared,
      resourceLimits: { maxYoungGenerationSizeMb: YOUNG_MB },
    });
    const slot = { worker, progress: new Int32Array(shared), task: null, since: 0, seen: -1 };
    this.#all.add(slot);
    worker.on('message', (lines) => {
      const { task } = slot;
      slot.task = null;
      this.#idle.push(slot);
      task?.resolve(lines);
      this.#assign();
    });
    worker.on('error', (error) => {
      this.#all.delete(slot);
      slot.task?.reject(error);
    });
    return slot;
  }

  /** Ends workers that have been at one line for longer than the limit, and gives that line up. */
  #endHung() {
    for (const slot of this.#all) {
      if (slot.task === null) continue;
      const at = Atomics.load(slot.progress, 0);
      const now = performance.now();
      if (at !== slot.seen) {
        slot.seen = at;
        slot.since = now;
      } else if (now - slot.since > (at < 0 ? START_LIMIT_MS : TIME_LIMIT_MS)) {
        const { task } = slot;
        this.#all.delete(slot);
        void slot.worker.terminate();
        task.givenUp.add(at);
        this.#waiting.unshift(task);
        this.#assign();
      }
    }
  }
}
