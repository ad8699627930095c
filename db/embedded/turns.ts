/** Gives one backend to many clients, first come first served. A turn lasts as long as its holder wants. */
export class Turns {
  #last: Promise<void> = Promise.resolve();

  /** Waits for the turn and answers with the function that gives it back; calling that twice is harmless. */
  async take(): Promise<() => void> {
    const before = this.#last;
    let giveBack = (): void => undefined;
    this.#last = new Promise((resolve) => {
      giveBack = resolve;
    });
    await before;
    return giveBack;
  }

  /** Runs the work in a turn of its own. */
  async run<T>(work: () => Promise<T>): Promise<T> {
    const giveBack = await this.take();
    try {
      return await work();
    } finally {
      giveBack();
    }
  }
}
