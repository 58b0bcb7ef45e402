import { sendJson } from '@/components/net/send';
import { KEPT_FOR_UNDO, readDraft, writeDraft } from '@/components/offline/drafts';
import type { SaveState } from '@/components/round/useEvidence';
import { type KeptMarks, layOver, startKept } from './kept-marks';
import { holdPhoto } from './photo-lock';
import { answerOf, type ServerAnswer } from './mark-answers';
import { type MarkHistory, replaceMarks } from './model/history';
import {
  batchOf,
  batchSize,
  type MarkBatch,
  type MarkConflict,
  partToSend,
  type SavedMark,
  settleConflict,
  whenAnswered,
  whenSent,
} from './model/sync';

const PAUSE_MS = 600;
const RETRY_MS = 8000;
/** What was refused for good is asked again seldom: a photo brought back from the bin takes its marks after all. */
const REFUSED_MS = 60_000;

/** What waits of one photo, on the device: how many marks, and the revision that they were drawn on. */
export interface WaitingMarks {
  count: number;
  revision: number;
}
export const WAITING = 'marks ';

export interface KeeperState {
  /** Null until it is known what the device keeps. */
  kept: KeptMarks | null;
  saveState: SaveState;
  conflicts: MarkConflict[];
}

interface Options {
  userId: string;
  photo: { id: string; revision: number };
  /** Told of each answer, so that what was asked for before it is not taken for newer. */
  onAnswer?: (answer: ServerAnswer) => void;
}

/**
 * Keeps the marks of one photo: the person's at once, on the device before they leave it, sent in batches behind, kept until the
 * server has them. It goes on to the end of a request even when the photo is put aside.
 */
export class MarkKeeper {
  #state: KeeperState = { kept: null, saveState: { kind: 'saved' }, conflicts: [] };
  #server: readonly SavedMark[] | null = null;
  #listeners = new Set<() => void>();
  #timer: ReturnType<typeof setTimeout> | undefined;
  #sending: Promise<void> | null = null;
  #isOpen = false;
  #release = () => {};

  constructor(readonly options: Options) {}

  snapshot = (): KeeperState => this.#state;
  subscribe = (listener: () => void) => {
    this.#listeners.add(listener);
    return () => void this.#listeners.delete(listener);
  };

  /** Reads what the device keeps, once. */
  async load(): Promise<void> {
    if (this.#state.kept) return;
    const draft = await readDraft<KeptMarks>(this.options.userId, this.#keptKey);
    if (!this.#state.kept) void this.#put(layOver(draft ?? startKept(), this.#server));
  }

  /** From now on what is done is sent, at once or as soon as it can be. */
  async open(): Promise<void> {
    if (this.#isOpen) return;
    this.#isOpen = true;
    this.#release = holdPhoto(this.options.photo.id);
    window.addEventListener('online', this.#sendSoon);
    document.addEventListener('visibilitychange', this.#whenHidden);
    await this.load();
    this.#schedule(0);
  }

  /** Puts the photo aside; what waits is sent once more. */
  close(): void {
    this.#isOpen = false;
    clearTimeout(this.#timer);
    window.removeEventListener('online', this.#sendSoon);
    document.removeEventListener('visibilitychange', this.#whenHidden);
    void this.flush().finally(this.#release);
  }

  /** Lays what the server holds under what was done here. */
  layUnder(server: readonly SavedMark[]): void {
    this.#server = server;
    if (this.#state.kept) this.#put(layOver(this.#state.kept, server));
  }

  act(step: (history: MarkHistory) => MarkHistory): void {
    const { kept } = this.#state;
    const history = kept && step(kept.history);
    if (!history || history === kept.history) return;
    this.#put({ ...kept, history });
    this.#schedule(PAUSE_MS);
  }

  /** The person has chosen between two versions of a mark. */
  settle(conflict: MarkConflict, keepsMine: boolean): void {
    const { kept, conflicts } = this.#state;
    if (!kept) return;
    const { marks, standing } = settleConflict(kept.history.marks, kept.standing, conflict, keepsMine);
    this.#tell({ conflicts: conflicts.filter(({ id }) => id !== conflict.id) });
    this.#put({ history: replaceMarks(kept.history, marks), standing });
    this.#schedule(0);
  }

  /** Sends what waits now, and resolves when it was answered or failed. */
  async flush(): Promise<void> {
    await this.#sending;
    this.#sending ??= this.#send().finally(() => (this.#sending = null));
    await this.#sending;
  }

  #sendSoon = () => this.#schedule(0);
  #whenHidden = () => void (document.visibilityState === 'hidden' && this.flush());

  #schedule(ms: number): void {
    clearTimeout(this.#timer);
    if (this.#isOpen) this.#timer = setTimeout(() => void this.flush(), ms);
  }

  get #keptKey() {
    return `${KEPT_FOR_UNDO}mark-steps ${this.options.photo.id} ${this.options.photo.revision}`;
  }

  #tell(change: Partial<KeeperState>): void {
    this.#state = { ...this.#state, ...change };
    for (const listener of this.#listeners) listener();
  }

  #put(kept: KeptMarks): Promise<unknown> {
    this.#tell({ kept });
    const { userId, photo } = this.options;
    const count = batchSize(batchOf(kept.history.marks, kept.standing));
    const waiting: WaitingMarks | null = count > 0 ? { count, revision: photo.revision } : null;
    return Promise.all([
      writeDraft(userId, this.#keptKey, kept),
      writeDraft(userId, WAITING + photo.id, waiting),
    ]);
  }

  #part(): MarkBatch | null {
    const { kept, conflicts } = this.#state;
    const contested = new Set(conflicts.map(({ id }) => id));
    const part = kept && partToSend(batchOf(kept.history.marks, kept.standing), contested);
    return part && batchSize(part) > 0 ? part : null;
  }

  async #send(): Promise<void> {
    const { kept } = this.#state;
    const part = this.#part();
    if (!kept || !part) return;
    const before = kept.standing;
    const { id, revision } = this.options.photo;
    this.#tell({ saveState: { kind: 'saving' } });
    await this.#put({ ...kept, standing: whenSent(before, part) });
    const sent = await sendJson<ServerAnswer>('POST', `/api/photos/${id}/marks`, { revision, ...part });
    const now = this.#state.kept ?? kept;
    if (!sent.ok) {
      const count = batchSize(batchOf(now.history.marks, now.standing));
      this.#tell({ saveState: { kind: 'waiting', count, message: sent.problem.message } });
      const isRefused = sent.status >= 400 && sent.status < 500 && sent.status !== 429;
      return this.#schedule(isRefused ? REFUSED_MS : RETRY_MS);
    }
    const { standing, conflicts } = whenAnswered(now.standing, before, answerOf(sent.value));
    const fresh = new Set(conflicts.map((one) => one.id));
    const others = this.#state.conflicts.filter((one) => !fresh.has(one.id));
    this.#tell({ saveState: { kind: 'saved' }, conflicts: [...others, ...conflicts] });
    this.options.onAnswer?.(sent.value);
    await this.#put({ ...now, standing });
    if (this.#part()) this.#schedule(0);
  }
}
