/** A map that forgets everything when it grows beyond its limit: texts of a workbook repeat, but a column may hold a million different ones. */
export class BoundedCache<Value> {
  private readonly held = new Map<string, Value>();

  constructor(private readonly limit: number) {}

  get(key: string): Value | undefined {
    return this.held.get(key);
  }

  /** The value held for the key, or the one made now and held from now on. What throws is not held. */
  at(key: string, make: () => Value): Value {
    const found = this.held.get(key);
    if (found !== undefined) return found;
    const made = make();
    if (this.held.size >= this.limit) this.held.clear();
    this.held.set(key, made);
    return made;
  }
}
