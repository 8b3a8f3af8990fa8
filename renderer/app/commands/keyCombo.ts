/**
 * Key combinations as written: `Mod+K`, `Shift+Delete`, `?`, or a sequence `g c`. `Mod` is Ctrl, on a Mac Command.
 */
export const isMac = (): boolean => /Mac|iPhone|iPad/.test(globalThis.navigator?.platform ?? '');

/** How a combination is shown to the user. */
export const shownCombo = (combo: string): string =>
  combo
    .replaceAll('Mod', isMac() ? '⌘' : 'Ctrl')
    .replaceAll('ArrowUp', '↑')
    .replaceAll('ArrowDown', '↓');

type KeyPress = Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'altKey' | 'shiftKey'>;

/** The pressed keys in the spelling of the combinations above. */
export function comboOf(event: KeyPress): string {
  const mod = isMac() ? event.metaKey : event.ctrlKey;
  const key = event.key.length === 1 && (mod || event.altKey) ? event.key.toUpperCase() : event.key;
  // Shift is part of what a printed sign is (`?`), but not of a letter or a named key.
  const shift = event.shiftKey && (key.length > 1 || mod || event.altKey);
  return [mod && 'Mod', event.altKey && 'Alt', shift && 'Shift', key].filter(Boolean).join('+');
}

/** A key that types something or moves a cursor belongs to the field it is pressed in. */
export function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  if (target.isContentEditable) return true;
  if (target instanceof HTMLInputElement)
    return !/^(checkbox|radio|button|range|submit|reset)$/.test(target.type);
  return target instanceof HTMLTextAreaElement || target instanceof HTMLSelectElement;
}

/** Single printed signs, alone or in sequence: what a speech-input user may want switched off. */
export const isSingleKey = (combo: string): boolean => combo.split(' ').every((step) => step.length === 1);
