import { newId } from '../common/ids.js';

/** Ids that the loader gives to what the seed files name: "P01", "B1", "STB/dr-03", "HL-STB-3" … */
export class SeedKeys {
  private readonly ids = new Map<string, string>();

  give(kind: string, key: string): string {
    const id = newId();
    this.ids.set(`${kind} ${key}`, id);
    return id;
  }

  /** Throws for a name that nothing has: the seed files are wrong then. */
  of(kind: string, key: string): string {
    const id = this.ids.get(`${kind} ${key}`);
    if (!id) throw new Error(`The seed files name no ${kind} ${key}.`);
    return id;
  }

  maybe(kind: string, key: string | null): string | null {
    return key === null ? null : this.of(kind, key);
  }
}
