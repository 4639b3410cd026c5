import { type Command, allCommands } from './command.ts';

type Pressed = { key: string; ctrlKey: boolean; metaKey: boolean; shiftKey: boolean; altKey: boolean };

/**
 * The command of a key press; null when there is none.
 * @param singleKeys false leaves only the keys with Ctrl (or Command) and Delete
 */
export function commandFor(pressed: Pressed, singleKeys: boolean): Command | null {
  if (pressed.altKey) return null;
  const name = keyName(pressed);
  const found = allCommands.find((command) => command.keys.includes(name)) ?? null;
  if (!found || singleKeys || name.includes('Ctrl+') || name === 'Delete') return found;
  return null;
}

function keyName({ key, ctrlKey, metaKey, shiftKey }: Pressed): string {
  const plain = key.length === 1 ? key.toUpperCase() : key;
  const isLetter = /^[A-Z]$/.test(plain) || key.length > 1;
  // Signs such as + need Shift on many keyboards; only for letters does Shift mean something else.
  return `${ctrlKey || metaKey ? 'Ctrl+' : ''}${shiftKey && isLetter ? 'Shift+' : ''}${plain}`;
}

/** Whether keys belong to what has the focus and not to the editor. */
export function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  return (
    target.isContentEditable ||
    target.closest('[role="dialog"], [role="alertdialog"], [role="menu"], [role="listbox"]') !== null ||
    (target.matches('input, textarea, select') && !target.matches('[type="checkbox"], [type="radio"]'))
  );
}
