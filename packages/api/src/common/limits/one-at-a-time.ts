/** Lets what has the same name go one after another, so that what the first found counts for the next. */
export class OneAtATime {
  private readonly last = new Map<string, Promise<unknown>>();

  run<T>(name: string, work: () => Promise<T>): Promise<T> {
    const before = this.last.get(name) ?? Promise.resolve();
    const turn = before.then(work, work);
    const settled = turn.then(
      () => undefined,
      () => undefined,
    );
    this.last.set(name, settled);
    void settled.then(() => {
      if (this.last.get(name) === settled) this.last.delete(name);
    });
    return turn;
  }
}
