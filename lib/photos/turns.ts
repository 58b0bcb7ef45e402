/** A small number of places at a heavy piece of work, and a short queue before it. */
export class Turns {
  #free: number;
  readonly #waiting: (() => void)[] = [];

  /**
   * @param places how many work at once
   * @param queueMax how many may wait; one more is refused
   */
  constructor(
    places: number,
    private readonly queueMax: number,
  ) {
    this.#free = places;
  }

  /** Null when even the queue is full. */
  async take<T>(work: () => Promise<T>): Promise<T | null> {
    if (this.#free === 0) {
      if (this.#waiting.length >= this.queueMax) return null;
      await new Promise<void>((resolve) => this.#waiting.push(resolve));
    } else this.#free -= 1;
    try {
      return await work();
    } finally {
      const next = this.#waiting.shift();
      if (next) next();
      else this.#free += 1;
    }
  }
}
