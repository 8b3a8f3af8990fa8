/** A candidate's place in a ranking: higher probability first, equal ones by id in code-unit order. */
export interface Ranked {
  readonly id: string;
  readonly probability: number;
}

export const before = (a: Ranked, b: Ranked): boolean =>
  a.probability > b.probability || (a.probability === b.probability && a.id < b.id);

/** The best `capacity` of all that are offered, in order. */
export class TopList<T extends Ranked> {
  readonly #capacity: number;
  readonly #items: T[] = [];

  constructor(capacity: number) {
    this.#capacity = capacity;
  }

  get items(): readonly T[] {
    return this.#items;
  }

  /** Probability that a further candidate must at least reach to have a chance of a place. */
  get threshold(): number {
    return this.#items.length < this.#capacity ? 0 : this.#items.at(-1)!.probability;
  }

  offer(item: T): boolean {
    if (this.#items.length === this.#capacity) {
      if (this.#capacity === 0 || !before(item, this.#items.at(-1)!)) return false;
      this.#items.pop();
    }
    let low = 0;
    let high = this.#items.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (before(this.#items[middle]!, item)) low = middle + 1;
      else high = middle;
    }
    this.#items.splice(low, 0, item);
    return true;
  }
}
