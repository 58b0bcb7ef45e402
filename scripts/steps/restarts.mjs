const RESTARTS_MAX = 5;
const WINDOW_MS = 60_000;
const PAUSE_MS = 200;

/** How often one process may be started again: five times within a minute, each after a longer pause. */
export class Restarts {
  #moments = [];

  /** @returns the pause before the next start in milliseconds, or null when it has died too often */
  next(nowMs) {
    this.#moments = this.#moments.filter((moment) => nowMs - moment < WINDOW_MS);
    if (this.#moments.length >= RESTARTS_MAX) return null;
    this.#moments.push(nowMs);
    return PAUSE_MS * 2 ** (this.#moments.length - 1);
  }
}
