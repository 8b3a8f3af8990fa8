import { useSyncExternalStore } from 'react';

/** Something large that changes in place; views re-read it when its version grows. */
export class Observable {
  #version = 0;
  #listeners = new Set<() => void>();
  #due: ReturnType<typeof setTimeout> | null = null;

  get version(): number {
    return this.#version;
  }

  subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  /** Tells the views, at once or gathered: a list that fills up need not be drawn again for every portion. */
  protected changed(gather_ms = 0): void {
    if (gather_ms > 0) {
      this.#due ??= setTimeout(() => this.#tell(), gather_ms);
      return;
    }
    this.#tell();
  }

  protected stopTelling(): void {
    if (this.#due !== null) clearTimeout(this.#due);
    this.#due = null;
    this.#listeners.clear();
  }

  #tell(): void {
    if (this.#due !== null) clearTimeout(this.#due);
    this.#due = null;
    this.#version += 1;
    for (const listener of this.#listeners) listener();
  }
}

/** Draws the component again whenever `observable` changes; gives its version, for dependency lists. */
export const useVersion = (observable: Observable): number =>
  useSyncExternalStore(observable.subscribe, () => observable.version);
