import type { Command, CommandRegistry } from './command';
import { comboOf, isSingleKey, isTyping } from './keyCombo';

/** How long the first key of a sequence waits for the second, ms. */
const patience = 1200;

/** Runs commands by their keys. Gives what takes the listener away. */
export function listenToKeys(
  registry: CommandRegistry,
  singleKeys: () => boolean,
  target: Pick<Window, 'addEventListener' | 'removeEventListener'> = window,
): () => void {
  let begun: { key: string; at: number } | null = null;

  const matching = (combo: string, typing: boolean): Command | undefined =>
    registry.all.find(
      (command) =>
        !command.disabled &&
        (!typing || command.whileTyping === true) &&
        (command.keys ?? []).some((keys) => keys === combo && (singleKeys() || !isSingleKey(keys))),
    );

  const onKeyDown = (event: Event): void => {
    if (!(event instanceof KeyboardEvent) || event.defaultPrevented || event.isComposing) return;
    // A modal dialog keeps its keys to itself.
    if (document.querySelector('dialog[open]')) return;
    const combo = comboOf(event);
    const typing = isTyping(event.target);
    const sequence = begun && event.timeStamp - begun.at < patience ? `${begun.key} ${combo}` : null;
    const command = (sequence !== null && matching(sequence, typing)) || matching(combo, typing);
    begun = null;
    if (command) {
      event.preventDefault();
      command.run();
    } else if (!typing && combo.length === 1) {
      begun = { key: combo, at: event.timeStamp };
    }
  };

  target.addEventListener('keydown', onKeyDown);
  return () => target.removeEventListener('keydown', onKeyDown);
}
