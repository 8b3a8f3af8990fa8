const prefix = 'spinhue-draft:';

/**
 * What was typed and not yet saved, kept through a crash or a reload. A draft that cannot be kept is no error: the
 * words are still on screen.
 */
export const drafts = {
  read(name: string): unknown {
    try {
      const text = localStorage.getItem(prefix + name);
      return text === null ? null : (JSON.parse(text) as unknown);
    } catch {
      return null;
    }
  },
  keep(name: string, draft: unknown): void {
    try {
      localStorage.setItem(prefix + name, JSON.stringify(draft));
    } catch {
      // Full or switched off.
    }
  },
  drop(name: string): void {
    try {
      localStorage.removeItem(prefix + name);
    } catch {
      // As above.
    }
  },
};
