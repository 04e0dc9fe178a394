/** Where saving stands. Nothing is lost in any of them: the value stays in the form and in the local keep. */
export type SaveState =
  | { kind: 'saved'; at: Date | null }
  | { kind: 'waiting' }
  | { kind: 'saving' }
  | { kind: 'failed'; error: Error }
  | { kind: 'conflict' };

/** What a save answers: the version that holds now and when it was made. */
export interface SavedVersion {
  version: number;
  at: Date;
}

export interface AutosaverOptions<T> {
  /** Sends a value on top of the version that was read. */
  save: (value: T, version: number) => Promise<SavedVersion>;
  /** Whether a refusal means that somebody else saved in between. */
  isConflict: (error: unknown) => boolean;
  onState: (state: SaveState) => void;
  /** Called when a value has arrived and nothing newer waits. */
  onSettled?: () => void;
  delayMs: number;
  /** Pause before another try after a failure that is no conflict. */
  retryMs: number;
}

/**
 * Saves a value a moment after its last change, one request at a time, each on top of the version that
 * the last one gave. A conflict stops it until somebody has chosen; a failure is tried again by itself.
 */
export class Autosaver<T> {
  private pending: { value: T } | null = null;
  private timer: ReturnType<typeof setTimeout> | null = null;
  private running: Promise<void> | null = null;
  private stopped = false;

  constructor(
    private version: number,
    private readonly options: AutosaverOptions<T>,
  ) {}

  /** The version that the next save builds on. */
  get base(): number {
    return this.version;
  }

  /** Takes a changed value; it is sent once the typing pauses. */
  change(value: T): void {
    this.pending = { value };
    if (this.stopped) return;
    if (!this.running) this.options.onState({ kind: 'waiting' });
    this.schedule(this.options.delayMs);
  }

  /** Sends at once what waits; resolves when nothing waits any more or saving has stopped. */
  async flush(): Promise<void> {
    this.clear();
    while (!this.stopped && (this.running || this.pending)) {
      this.running ??= this.send();
      const before = this.pending;
      await this.running;
      if (this.pending && this.pending === before) return;
    }
  }

  /** Goes on after a conflict: on top of the version that holds now, with the value that stands here. */
  keepMine(version: number, value: T): Promise<void> {
    this.pending = { value };
    return this.goOn(version);
  }

  /** Goes on with what waits, on top of another version: the conflict was with a save of our own. */
  goOn(version: number): Promise<void> {
    this.version = version;
    this.stopped = false;
    return this.flush();
  }

  /** Goes on after a conflict with what somebody else saved; what stood here is given up. */
  takeTheirs(saved: SavedVersion): void {
    this.version = saved.version;
    this.stopped = false;
    this.pending = null;
    this.options.onState({ kind: 'saved', at: saved.at });
  }

  /** Ends the timers; what waits stays in the local keep. */
  dispose(): void {
    this.clear();
    this.stopped = true;
  }

  private schedule(delayMs: number): void {
    this.clear();
    this.timer = setTimeout(() => void this.flush(), delayMs);
  }

  private clear(): void {
    if (this.timer) clearTimeout(this.timer);
    this.timer = null;
  }

  private async send(): Promise<void> {
    const sent = this.pending;
    if (!sent) return;
    this.options.onState({ kind: 'saving' });
    try {
      const saved = await this.options.save(sent.value, this.version);
      this.version = saved.version;
      if (this.pending === sent) this.pending = null;
      this.running = null;
      this.options.onState(this.pending ? { kind: 'waiting' } : { kind: 'saved', at: saved.at });
      if (!this.pending) this.options.onSettled?.();
    } catch (error) {
      this.running = null;
      this.fail(error);
    }
  }

  private fail(error: unknown): void {
    if (this.options.isConflict(error)) {
      this.stopped = true;
      this.clear();
      this.options.onState({ kind: 'conflict' });
      return;
    }
    this.options.onState({
      kind: 'failed',
      error: error instanceof Error ? error : new Error(String(error)),
    });
    if (!this.stopped) this.schedule(this.options.retryMs);
  }
}
