/** How many calls of each subject are under way. */
export class ParallelCalls {
  readonly #running = new Map<string, number>();

  /** False where the subject has as many under way as it may; otherwise the call counts until `leave`. */
  enter(subject: string, most: number): boolean {
    const running = this.#running.get(subject) ?? 0;
    if (running >= most) return false;
    this.#running.set(subject, running + 1);
    return true;
  }

  leave(subject: string): void {
    const running = (this.#running.get(subject) ?? 1) - 1;
    if (running > 0) this.#running.set(subject, running);
    else this.#running.delete(subject);
  }
}
