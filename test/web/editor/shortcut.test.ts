import { expect, test } from 'vitest';
import { allCommands } from '#web/editor/commands/command.ts';
import { commandFor } from '#web/editor/commands/shortcut.ts';

const pressed = (key: string, keys: { ctrl?: boolean; shift?: boolean } = {}) => ({
  key,
  ctrlKey: keys.ctrl ?? false,
  metaKey: false,
  shiftKey: keys.shift ?? false,
  altKey: false,
});

test('keys – letters, Ctrl, Shift and signs – find their commands', () => {
  const id = (...given: Parameters<typeof pressed>) => commandFor(pressed(...given), true)?.id;
  expect(id('p')).toBe('tool-pour');
  expect(id('z', { ctrl: true })).toBe('undo');
  expect(id('Z', { ctrl: true, shift: true })).toBe('redo');
  expect(id('R', { shift: true })).toBe('rotate-back');
  expect(id('+', { shift: true })).toBe('zoom-in');
  expect(id('j')).toBeUndefined();
});

test('keys – single letters switched off – only Ctrl and Delete still act', () => {
  expect(commandFor(pressed('p'), false)).toBeNull();
  expect(commandFor(pressed('z', { ctrl: true }), false)?.id).toBe('undo');
  expect(commandFor(pressed('Delete'), false)?.id).toBe('delete');
});

test('keys – of all commands together – none stands for two', () => {
  const keys = allCommands.flatMap((command) => command.keys);
  expect(new Set(keys).size).toBe(keys.length);
});
