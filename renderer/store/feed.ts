import type { Edit } from './rows';

export type FeedListener = (edits: readonly Edit[]) => void;

/**
 * Tells views in this window, and the same program in other windows, which rows changed. Views that hold many rows
 * apply the edits instead of reading everything again.
 */
export class ChangeFeed {
  #listeners = new Set<FeedListener>();
  #channel: BroadcastChannel | null = null;

  constructor(channelName?: string) {
    if (channelName === undefined || typeof BroadcastChannel === 'undefined') return;
    this.#channel = new BroadcastChannel(channelName);
    this.#channel.onmessage = ({ data }: MessageEvent<readonly Edit[]>) => this.#tell(data);
  }

  subscribe(listener: FeedListener): () => void {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  }

  /** To be called after the transaction has committed, never before. */
  publish(edits: readonly Edit[]): void {
    this.#tell(edits);
    this.#channel?.postMessage(edits);
  }

  close(): void {
    this.#channel?.close();
    this.#listeners.clear();
  }

  #tell(edits: readonly Edit[]): void {
    for (const listener of this.#listeners) listener(edits);
  }
}
