/** Something that can be done now: found in the command search, by its keys, and from the menu of the window. */
export interface Command {
  /** `candidates.add`: the part before the dot is where it belongs. */
  readonly id: string;
  /** In the imperative, as on a button: `Add a candidate`. */
  readonly label: string;
  /** Heading under which it is listed. */
  readonly group: string;
  /** `Mod+K`, `g c`; several spellings are allowed. */
  readonly keys?: readonly string[];
  /** Other words it should be found by. */
  readonly keywords?: string;
  /** Works while one types in a field, too. */
  readonly whileTyping?: boolean;
  readonly disabled?: boolean;
  readonly run: () => void;
}

/** All commands that are on offer; views add theirs while they are on screen. */
export class CommandRegistry {
  readonly #sets = new Map<object, readonly Command[]>();
  readonly #listeners = new Set<() => void>();
  #all: readonly Command[] = [];

  offer(owner: object, commands: readonly Command[]): () => void {
    this.#sets.set(owner, commands);
    this.#changed();
    return () => {
      this.#sets.delete(owner);
      this.#changed();
    };
  }

  get all(): readonly Command[] {
    return this.#all;
  }

  subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  find(id: string): Command | undefined {
    return this.#all.find((command) => command.id === id);
  }

  #changed(): void {
    // A view's own commands come before those of the frame around it.
    this.#all = [...this.#sets.values()].reverse().flat();
    for (const listener of this.#listeners) listener();
  }
}
