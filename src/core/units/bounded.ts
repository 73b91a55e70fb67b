/**
 * A memory of parsed texts that does not grow without limit: a worksheet can hold a million different quantities.
 * When full it is emptied at once, which costs less than keeping an order, and what is in use returns with its next use.
 */
export class BoundedMap<Value> {
  private readonly entries = new Map<string, Value>();

  constructor(private readonly limit: number) {}

  get(key: string): Value | undefined {
    return this.entries.get(key);
  }

  set(key: string, value: Value): void {
    if (this.entries.size >= this.limit) this.entries.clear();
    this.entries.set(key, value);
  }

  get size(): number {
    return this.entries.size;
  }
}
