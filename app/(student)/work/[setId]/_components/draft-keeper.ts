/** Names one answer field: the student's draw and the letter of the part. */
export interface PartRef {
  readonly drawId: string;
  readonly partKey: string;
}

/** What came of sending a draft to the server. */
export type SaveOutcome =
  | { readonly kind: 'saved'; readonly revision: number }
  | { readonly kind: 'changed'; readonly text: string; readonly revision: number }
  | { readonly kind: 'signed-out' }
  | { readonly kind: 'refused'; readonly message: string }
  | { readonly kind: 'offline' };

/** How far a draft is: `held` is in this browser only and will be sent; `stuck` is held, too, but the server refused it. */
export type DraftState = 'clean' | 'typing' | 'sending' | 'held' | 'signed-out' | 'stuck' | 'changed';

export interface Draft {
  readonly text: string;
  /** Grows when the text came from elsewhere than the keyboard, so that the field is made anew with it. */
  readonly renewed: number;
  readonly state: DraftState;
  /** For `stuck`: why, in the server's words. */
  readonly message?: string;
  /** For `changed`: what another tab or device saved meanwhile. */
  readonly theirs?: { readonly text: string; readonly revision: number };
}

/** What the keeper needs of the world around it. */
export interface KeeperDoors {
  /** Sends one draft; `leaving` asks that it survive the page. Never rejects. */
  send(part: PartRef, text: string, baseRevision: number, leaving: boolean): Promise<SaveOutcome>;
  /** The browser's own memory; may throw (switched off, full), which only means that nothing is held there. */
  memory: Pick<Storage, 'getItem' | 'setItem' | 'removeItem'>;
  now(): number;
}

/** Rest after the last key before a draft is sent, and the longest that steady typing puts it off, in milliseconds. */
export const savePause = { rest: 1_000, longest: 6_000 } as const;

/** First pause before a failed save is tried again, doubled each time up to the second figure. */
export const retryPause = { first: 2_000, longest: 30_000 } as const;

interface Entry {
  readonly part: PartRef;
  draft: Draft;
  /** The revision that the text on the server has, as far as this page knows. */
  revision: number;
  /** The text that the server has. */
  onServer: string;
  typedSince: number | null;
  inFlight: boolean;
  failures: number;
  timer: ReturnType<typeof setTimeout> | undefined;
}

/**
 * Keeps what is typed on a page from being lost: held in the browser at every key, sent to the server after a rest, one
 * request a part at a time, tried again when the connection comes back. A save carries the revision it is laid over, so a
 * request that is repeated is stored once and another tab's text is never overwritten unseen.
 */
export class DraftKeeper {
  private readonly entries = new Map<string, Entry>();
  private readonly listeners = new Set<() => void>();
  private lastSaved: number | null = null;
  private view: { readonly worst: DraftState; readonly lastSaved: number | null };

  constructor(
    private readonly doors: KeeperDoors,
    parts: readonly (PartRef & { readonly text: string; readonly revision: number })[],
  ) {
    for (const { drawId, partKey, text, revision } of parts) {
      this.entries.set(keyOf({ drawId, partKey }), {
        part: { drawId, partKey },
        draft: { text, renewed: 0, state: 'clean' },
        revision,
        onServer: text,
        typedSince: null,
        inFlight: false,
        failures: 0,
        timer: undefined,
      });
    }
    this.view = { worst: 'clean', lastSaved: null };
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** The same object until that part changes. */
  draftOf(part: PartRef): Draft {
    return this.entry(part).draft;
  }

  /** The most pressing state of all parts, and when something was last saved (milliseconds). */
  readonly overall = () => this.view;

  /** Takes up what an earlier visit left in the browser and could not send. Returns the parts whose text it changed. */
  recover(): PartRef[] {
    const recovered: PartRef[] = [];
    for (const entry of this.entries.values()) {
      const left = this.heldText(entry.part);
      if (left === null) continue;
      if (left.text === entry.onServer) {
        this.forget(entry.part);
        continue;
      }
      entry.revision = left.baseRevision;
      this.set(entry, { text: left.text, renewed: entry.draft.renewed + 1, state: 'held' });
      recovered.push(entry.part);
      void this.push(entry);
    }
    return recovered;
  }

  /** A key was pressed. */
  type(part: PartRef, text: string): void {
    const entry = this.entry(part);
    if (text === entry.draft.text) return;
    this.hold(entry, text);
    entry.typedSince ??= this.doors.now();
    const state = entry.draft.state === 'changed' ? 'changed' : 'typing';
    this.set(entry, { ...entry.draft, text, state });
    if (state === 'changed') return;
    const waited = this.doors.now() - entry.typedSince;
    this.later(entry, Math.max(0, Math.min(savePause.rest, savePause.longest - waited)));
  }

  /** Sends everything that is not on the server now: on leaving the page, or when the connection or the person is back. */
  flush(leaving = false): void {
    for (const entry of this.entries.values()) {
      if (entry.draft.state !== 'clean' && entry.draft.state !== 'changed') void this.push(entry, leaving);
    }
  }

  /** Another tab changed the text: this page's text is laid over it, or given up for it. */
  settle(part: PartRef, keep: 'mine' | 'theirs'): void {
    const entry = this.entry(part);
    const { theirs } = entry.draft;
    if (!theirs) return;
    entry.revision = theirs.revision;
    entry.onServer = theirs.text;
    if (keep === 'theirs') {
      this.forget(part);
      this.set(entry, { text: theirs.text, renewed: entry.draft.renewed + 1, state: 'clean' });
    } else {
      this.move(entry, { state: 'typing' });
      void this.push(entry);
    }
  }

  /** A part was handed in, which saves its text as well. */
  handedIn(part: PartRef, text: string, revision: number): void {
    const entry = this.entry(part);
    entry.revision = revision;
    entry.onServer = text;
    if (entry.draft.text !== text) return;
    clearTimeout(entry.timer);
    this.forget(part);
    this.move(entry, { state: 'clean' });
  }

  /** Ends every timer; what is not on the server stays in the browser's memory. */
  stop(): void {
    for (const entry of this.entries.values()) clearTimeout(entry.timer);
  }

  private entry(part: PartRef): Entry {
    const entry = this.entries.get(keyOf(part));
    if (!entry) throw new RangeError('That part is not on this page.');
    return entry;
  }

  private later(entry: Entry, milliseconds: number): void {
    clearTimeout(entry.timer);
    entry.timer = setTimeout(() => void this.push(entry), milliseconds);
  }

  private async push(entry: Entry, leaving = false): Promise<void> {
    clearTimeout(entry.timer);
    const { text } = entry.draft;
    if (entry.inFlight && !leaving) return;
    if (text === entry.onServer) {
      this.forget(entry.part);
      this.move(entry, { state: 'clean' });
      return;
    }
    entry.inFlight = true;
    entry.typedSince = null;
    this.move(entry, { state: 'sending' });
    const outcome = await this.doors.send(entry.part, text, entry.revision, leaving);
    entry.inFlight = false;
    this.take(entry, text, outcome);
  }

  private take(entry: Entry, sent: string, outcome: SaveOutcome): void {
    const { text } = entry.draft;
    entry.failures = outcome.kind === 'offline' ? entry.failures + 1 : 0;
    switch (outcome.kind) {
      case 'saved':
        entry.revision = outcome.revision;
        entry.onServer = sent;
        this.lastSaved = this.doors.now();
        if (text === sent) {
          this.forget(entry.part);
          this.move(entry, { state: 'clean' });
        } else {
          this.hold(entry, text);
          this.move(entry, { state: 'typing' });
          this.later(entry, savePause.rest);
        }
        return;
      case 'changed':
        this.move(entry, { state: 'changed', theirs: { text: outcome.text, revision: outcome.revision } });
        return;
      case 'signed-out':
        this.move(entry, { state: 'signed-out' });
        return;
      case 'refused':
        this.move(entry, { state: 'stuck', message: outcome.message });
        return;
      case 'offline':
        this.move(entry, { state: 'held' });
        this.later(entry, Math.min(retryPause.longest, retryPause.first * 2 ** (entry.failures - 1)));
    }
  }

  /** Passes to another state with the text as it is. */
  private move(entry: Entry, to: Pick<Draft, 'state' | 'message' | 'theirs'>): void {
    this.set(entry, { text: entry.draft.text, renewed: entry.draft.renewed, ...to });
  }

  private set(entry: Entry, draft: Draft): void {
    entry.draft = draft;
    const states = [...this.entries.values()].map((each) => each.draft.state);
    const worst = urgency.find((state) => states.includes(state)) ?? 'clean';
    this.view = { worst, lastSaved: this.lastSaved };
    for (const listener of this.listeners) listener();
  }

  private hold({ part, revision }: Entry, text: string): void {
    try {
      this.doors.memory.setItem(memoryKey(part), JSON.stringify({ text, baseRevision: revision }));
    } catch {
      // A browser without memory of its own still saves to the server.
    }
  }

  private forget(part: PartRef): void {
    try {
      this.doors.memory.removeItem(memoryKey(part));
    } catch {
      // Nothing was held there.
    }
  }

  private heldText(part: PartRef): { text: string; baseRevision: number } | null {
    try {
      const held: unknown = JSON.parse(this.doors.memory.getItem(memoryKey(part)) ?? 'null');
      return isHeld(held) ? held : null;
    } catch {
      return null;
    }
  }
}

/** What is told first where several parts are in different states. */
const urgency: readonly DraftState[] = ['signed-out', 'stuck', 'changed', 'held', 'sending', 'typing', 'clean'];

function keyOf({ drawId, partKey }: PartRef): string {
  return `${drawId}/${partKey}`;
}

/** A draw belongs to one student, so texts of several people on one computer do not meet. */
function memoryKey(part: PartRef): string {
  return `halfmark.unsent.${keyOf(part)}`;
}

function isHeld(value: unknown): value is { text: string; baseRevision: number } {
  return (
    typeof value === 'object' &&
    value !== null &&
    'text' in value &&
    typeof value.text === 'string' &&
    'baseRevision' in value &&
    typeof value.baseRevision === 'number'
  );
}
