const CHUNK = 1 << 16;

/** Working memory that is handed out in pieces and taken back all at once, so that no reading leaves work for the collector. */
export class Workspace {
  private chunks: Float64Array[] = [];
  private chunk = 0;
  private used = 0;

  /** A zeroed piece of `length` numbers, valid until `release`. */
  take(length: number): Float64Array {
    while (this.chunk < this.chunks.length && this.chunks[this.chunk]!.length - this.used < length) {
      this.chunk++;
      this.used = 0;
    }
    if (this.chunk === this.chunks.length) this.chunks.push(new Float64Array(Math.max(CHUNK, length)));
    const piece = this.chunks[this.chunk]!.subarray(this.used, this.used + length);
    this.used += length;
    return piece.fill(0);
  }

  release(): void {
    this.chunk = 0;
    this.used = 0;
  }
}
