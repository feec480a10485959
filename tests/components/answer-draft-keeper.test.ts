import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import {
  DraftKeeper,
  retryPause,
  savePause,
  type PartRef,
  type SaveOutcome,
} from '@/app/(student)/work/[setId]/_components/draft-keeper';

const part: PartRef = { drawId: 'draw-1', partKey: 'a' };
const other: PartRef = { drawId: 'draw-1', partKey: 'b' };
const held = 'halfmark.unsent.draw-1/a';

type Sent = { text: string; baseRevision: number; leaving: boolean };

/** A server that keeps one text a part, as the real one does, and may be away. */
class FakeServer {
  text = '';
  revision = 0;
  sent: Sent[] = [];
  next: SaveOutcome[] = [];
  /** Called before a request is answered; a promise here keeps it waiting. */
  pause: () => Promise<void> = () => Promise.resolve();

  readonly send = async (
    _part: PartRef,
    text: string,
    baseRevision: number,
    leaving: boolean,
  ): Promise<SaveOutcome> => {
    this.sent.push({ text, baseRevision, leaving });
    await this.pause();
    const instead = this.next.shift();
    if (instead) return instead;
    if (text === this.text) return { kind: 'saved', revision: this.revision };
    if (baseRevision !== this.revision) return { kind: 'changed', text: this.text, revision: this.revision };
    this.text = text;
    this.revision += 1;
    return { kind: 'saved', revision: this.revision };
  };
}

class FakeMemory {
  private readonly items = new Map<string, string>();
  readonly getItem = (name: string) => this.items.get(name) ?? null;
  readonly setItem = (name: string, value: string) => void this.items.set(name, value);
  readonly removeItem = (name: string) => void this.items.delete(name);
}

let server: FakeServer;
let memory: FakeMemory;

function open(text = '', revision = 0): DraftKeeper {
  return new DraftKeeper({ send: server.send, memory, now: Date.now }, [
    { ...part, text, revision },
    { ...other, text: '', revision: 0 },
  ]);
}

const rest = (milliseconds: number) => vi.advanceTimersByTimeAsync(milliseconds);

beforeEach(() => {
  vi.useFakeTimers();
  server = new FakeServer();
  memory = new FakeMemory();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('saving', () => {
  it('waits for a rest, sends the last text once, and says so', async () => {
    const keeper = open();
    for (const text of ['S', 'S_', 'S_x']) {
      keeper.type(part, text);
      await rest(300);
    }
    expect(server.sent).toEqual([]);
    expect(keeper.overall().worst).toBe('typing');
    await rest(savePause.rest);
    expect(server.sent).toEqual([{ text: 'S_x', baseRevision: 0, leaving: false }]);
    expect(keeper.draftOf(part)).toMatchObject({ text: 'S_x', state: 'clean' });
    expect(keeper.overall()).toMatchObject({ worst: 'clean', lastSaved: Date.now() - (savePause.rest - 700) });
    await rest(60_000);
    expect(server.sent).toHaveLength(1);
  });

  it('does not put it off for ever while somebody types on', async () => {
    const keeper = open();
    for (let key = 0; key < 30; key += 1) {
      keeper.type(part, 'x'.repeat(key + 1));
      await rest(400);
    }
    expect(server.sent.length).toBeGreaterThanOrEqual(1);
  });

  it('holds the text in the browser at every key until the server has it', async () => {
    const keeper = open();
    keeper.type(part, 'S_x');
    expect(memory.getItem(held)).toBe(JSON.stringify({ text: 'S_x', baseRevision: 0 }));
    await rest(savePause.rest);
    expect(memory.getItem(held)).toBeNull();
  });

  it('sends one request at a time, and what was typed meanwhile after it, over its revision', async () => {
    let answer: () => void = () => undefined;
    server.pause = () => new Promise((resolve) => (answer = resolve));
    const keeper = open();
    keeper.type(part, 'S');
    await rest(savePause.rest);
    keeper.type(part, 'S_x');
    await rest(5 * savePause.rest);
    expect(server.sent).toHaveLength(1);
    answer();
    await rest(savePause.rest);
    answer();
    await rest(0);
    expect(server.sent.map(({ text, baseRevision }) => [text, baseRevision])).toEqual([
      ['S', 0],
      ['S_x', 1],
    ]);
    expect(server.text).toBe('S_x');
  });

  it('works without a memory of the browser’s own', async () => {
    const broken = () => {
      throw new Error('switched off');
    };
    const keeper = new DraftKeeper(
      { send: server.send, memory: { getItem: broken, setItem: broken, removeItem: broken }, now: Date.now },
      [{ ...part, text: '', revision: 0 }],
    );
    keeper.recover();
    keeper.type(part, 'S_x');
    await rest(savePause.rest);
    expect(server.text).toBe('S_x');
  });
});

describe('a lost connection', () => {
  it('keeps the text and tries again, less and less often, until it is back', async () => {
    server.next = [{ kind: 'offline' }, { kind: 'offline' }];
    const keeper = open();
    keeper.type(part, 'S_x');
    await rest(savePause.rest);
    expect(keeper.draftOf(part).state).toBe('held');
    expect(memory.getItem(held)).toContain('S_x');
    await rest(retryPause.first);
    await rest(2 * retryPause.first);
    expect(server.sent).toHaveLength(3);
    expect(keeper.draftOf(part).state).toBe('clean');
    expect(memory.getItem(held)).toBeNull();
  });

  it('sends at once when the connection is said to be back', async () => {
    server.next = [{ kind: 'offline' }];
    const keeper = open();
    keeper.type(part, 'S_x');
    await rest(savePause.rest);
    keeper.flush();
    await rest(0);
    expect(server.text).toBe('S_x');
    await rest(60_000);
    expect(server.sent).toHaveLength(2);
  });

  it('is stored once when only the answer was lost', async () => {
    const keeper = open();
    const { send } = server;
    const lossy = new DraftKeeper(
      {
        send: async (...request) => {
          await send(...request);
          return server.sent.length === 1 ? { kind: 'offline' } : send(...request);
        },
        memory,
        now: Date.now,
      },
      [{ ...part, text: '', revision: 0 }],
    );
    keeper.stop();
    lossy.type(part, 'S_x');
    await rest(savePause.rest + retryPause.first);
    expect(server.revision).toBe(1);
    expect(lossy.draftOf(part).state).toBe('clean');
  });

  it('is survived by the text: the next visit finds it and sends it', async () => {
    server.next = [{ kind: 'offline' }];
    const first = open();
    first.type(part, 'S_x');
    await rest(savePause.rest);
    first.stop();
    const second = open();
    expect(second.recover()).toEqual([part]);
    expect(second.draftOf(part)).toMatchObject({ text: 'S_x', renewed: 1 });
    await rest(0);
    expect(server.text).toBe('S_x');
    expect(memory.getItem(held)).toBeNull();
  });

  it('does not bring back what the server has already, nor trip over what is no draft', () => {
    memory.setItem(held, JSON.stringify({ text: 'S_x', baseRevision: 0 }));
    memory.setItem('halfmark.unsent.draw-1/b', '{"text": 3');
    expect(open('S_x', 1).recover()).toEqual([]);
    expect(memory.getItem(held)).toBeNull();
  });
});

describe('leaving the page', () => {
  it('sends what is not saved in a way that outlives it', async () => {
    const keeper = open();
    keeper.type(part, 'S_x');
    keeper.flush(true);
    await rest(0);
    expect(server.sent).toEqual([{ text: 'S_x', baseRevision: 0, leaving: true }]);
  });
});

describe('what the server refuses', () => {
  it('stays in the browser when the session has ended, and goes when the person is back', async () => {
    server.next = [{ kind: 'signed-out' }];
    const keeper = open();
    keeper.type(part, 'S_x');
    await rest(60_000);
    expect(server.sent).toHaveLength(1);
    expect(keeper.overall().worst).toBe('signed-out');
    expect(memory.getItem(held)).toContain('S_x');
    keeper.flush();
    await rest(0);
    expect(server.text).toBe('S_x');
  });

  it('is told in the server’s words and kept', async () => {
    server.next = [{ kind: 'refused', message: 'This set is closed.' }];
    const keeper = open();
    keeper.type(part, 'S_x');
    await rest(savePause.rest);
    expect(keeper.draftOf(part)).toMatchObject({ state: 'stuck', message: 'This set is closed.', text: 'S_x' });
    expect(memory.getItem(held)).toContain('S_x');
  });
});

describe('another tab', () => {
  async function meet(): Promise<DraftKeeper> {
    const mine = open();
    const theirs = open();
    theirs.type(part, 'theirs');
    await rest(savePause.rest);
    mine.type(part, 'mine');
    await rest(savePause.rest);
    return mine;
  }

  it('is not overwritten: both texts are shown, and nothing is sent before the person chose', async () => {
    const mine = await meet();
    expect(mine.draftOf(part)).toMatchObject({
      text: 'mine',
      state: 'changed',
      theirs: { text: 'theirs', revision: 1 },
    });
    mine.type(part, 'mine, longer');
    mine.flush();
    await rest(60_000);
    expect(server.text).toBe('theirs');
    expect(mine.draftOf(part).text).toBe('mine, longer');
  });

  it('gives way to this page’s text when that is chosen', async () => {
    const mine = await meet();
    mine.settle(part, 'mine');
    await rest(0);
    expect([server.text, server.revision]).toEqual(['mine', 2]);
    expect(mine.draftOf(part)).toMatchObject({ text: 'mine', state: 'clean', renewed: 0 });
  });

  it('is taken over when that is chosen, and the field made anew', async () => {
    const mine = await meet();
    mine.settle(part, 'theirs');
    expect(mine.draftOf(part)).toEqual({ text: 'theirs', state: 'clean', renewed: 1 });
    expect(memory.getItem(held)).toBeNull();
    mine.type(part, 'theirs, longer');
    await rest(savePause.rest);
    expect(server.text).toBe('theirs, longer');
  });
});

describe('handing in', () => {
  it('saves the text as well, so nothing more is sent', async () => {
    const keeper = open();
    keeper.type(part, 'S_x');
    server.text = 'S_x';
    server.revision = 1;
    keeper.handedIn(part, 'S_x', 1);
    await rest(60_000);
    expect(server.sent).toEqual([]);
    expect(keeper.draftOf(part).state).toBe('clean');
    expect(memory.getItem(held)).toBeNull();
  });

  it('leaves what was typed meanwhile to be saved over it', async () => {
    const keeper = open();
    keeper.type(part, 'S_x + S_y');
    server.text = 'S_x';
    server.revision = 1;
    keeper.handedIn(part, 'S_x', 1);
    await rest(savePause.rest);
    expect([server.text, server.revision]).toEqual(['S_x + S_y', 2]);
  });
});

describe('the whole page', () => {
  it('tells the most pressing state of all parts', async () => {
    const keeper = open();
    const seen: string[] = [];
    keeper.subscribe(() => seen.push(keeper.overall().worst));
    server.next = [{ kind: 'offline' }];
    keeper.type(part, 'S_x');
    await rest(savePause.rest);
    keeper.type(other, '1');
    expect(keeper.overall().worst).toBe('held');
    expect(seen).toContain('sending');
    keeper.stop();
  });
});
