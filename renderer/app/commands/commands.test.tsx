import { afterEach, describe, expect, it, type Mock, vi } from 'vitest';
import { type Command, CommandRegistry } from './command';
import { listenToKeys } from './keyboard';
import { comboOf } from './keyCombo';

let stop: () => void = () => undefined;
afterEach(() => {
  stop();
  document.body.replaceChildren();
});

const command = (keys: string, more: Partial<Command> = {}): Command & { run: Mock<() => void> } => ({
  id: keys,
  label: keys,
  group: 'Test',
  keys: [keys],
  ...more,
  run: vi.fn<() => void>(),
});

function press(key: string, init: KeyboardEventInit = {}, target: EventTarget = document.body): void {
  target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...init }));
}

function setup(commands: readonly Command[], singleKeys = true): CommandRegistry {
  const registry = new CommandRegistry();
  registry.offer({}, commands);
  stop = listenToKeys(registry, () => singleKeys);
  return registry;
}

describe('key combinations', () => {
  it('are spelled one way, whatever the case of the letter', () => {
    const plain = { ctrlKey: false, metaKey: false, altKey: false, shiftKey: false };
    expect(comboOf({ ...plain, key: 'k', ctrlKey: true })).toBe('Mod+K');
    expect(comboOf({ ...plain, key: 'Z', ctrlKey: true, shiftKey: true })).toBe('Mod+Shift+Z');
    expect(comboOf({ ...plain, key: '?', shiftKey: true })).toBe('?');
    expect(comboOf({ ...plain, key: 'Delete' })).toBe('Delete');
  });
});

describe('shortcuts', () => {
  it('run their command, alone and as a sequence', () => {
    const [one, two] = [command('Mod+K'), command('g c')];
    setup([one, two]);
    press('k', { ctrlKey: true });
    press('g');
    press('c');
    expect(one.run).toHaveBeenCalledOnce();
    expect(two.run).toHaveBeenCalledOnce();
  });

  it('leave letters alone in a field, but not those that are meant to work there', () => {
    const [letter, anywhere] = [command('s'), command('Mod+K', { whileTyping: true })];
    setup([letter, anywhere]);
    const field = document.body.appendChild(document.createElement('input'));
    press('s', {}, field);
    press('k', { ctrlKey: true }, field);
    expect(letter.run).not.toHaveBeenCalled();
    expect(anywhere.run).toHaveBeenCalledOnce();
  });

  it('of a single letter can be switched off', () => {
    const [letter, withMod] = [command('s'), command('Mod+K')];
    setup([letter, withMod], false);
    press('s');
    press('k', { ctrlKey: true });
    expect(letter.run).not.toHaveBeenCalled();
    expect(withMod.run).toHaveBeenCalledOnce();
  });

  it('of the view on screen win over those of the frame', () => {
    const [frame, view] = [command('a'), command('a')];
    const registry = setup([frame]);
    const withdraw = registry.offer({}, [view]);
    press('a');
    withdraw();
    press('a');
    expect(view.run).toHaveBeenCalledOnce();
    expect(frame.run).toHaveBeenCalledOnce();
  });
});
