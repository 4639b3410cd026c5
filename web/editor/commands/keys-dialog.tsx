import { useState } from 'react';
import { CheckField } from '#web/ui/check-field.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { allCommands } from './command.ts';
import { setSingleKeys, singleKeysOn } from './single-keys.ts';

const canvasKeys = [
  { label: 'Move the selection by one grid step', keys: ['Arrows'] },
  { label: 'by ten steps · by 0.1 mm', keys: ['Shift+Arrows', 'Alt+Arrows'] },
  { label: 'With a drawing tool: move the crosshair', keys: ['Arrows'] },
  { label: 'Set a point, place, put down', keys: ['Enter'] },
  { label: 'Close the polygon', keys: ['Shift+Enter'] },
  { label: 'One level out: gesture, tool, selection', keys: ['Escape'] },
  { label: 'Suspend snapping while dragging', keys: ['Alt'] },
  { label: 'Move the picture', keys: ['Space+drag', 'Middle button'] },
  { label: 'Copy and paste objects, also between boards', keys: ['Ctrl+C', 'Ctrl+V'] },
  { label: 'This list', keys: ['?'] },
];

/** Every key of the sketch page. */
export function KeysDialog({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
  const [singleKeys, choose] = useState(singleKeysOn);
  return (
    <Dialog title="Keys of the sketch page" open={open} onOpenChange={onOpenChange}>
      <KeyTable title="Tools and acts" rows={allCommands} />
      <KeyTable title="On the canvas" rows={canvasKeys} />
      <CheckField
        label="Single letters act as keys"
        hint="Switch off when you dictate or when letters are pressed by accident."
        checked={singleKeys}
        onChange={(event) => {
          setSingleKeys(event.target.checked);
          choose(event.target.checked);
        }}
      />
    </Dialog>
  );
}

function KeyTable({ title, rows }: { title: string; rows: readonly { label: string; keys: readonly string[] }[] }) {
  return (
    <table className="mb-5 w-full text-sm">
      <caption className="pb-1 text-left font-semibold">{title}</caption>
      <tbody>
        {rows.map((row) => (
          <tr key={row.label} className="border-t border-line">
            <th scope="row" className="py-1 pr-4 text-left font-normal">
              {row.label}
            </th>
            <td className="py-1 text-right whitespace-nowrap">
              {row.keys.map((key) => (
                <kbd key={key} className="ml-2 border border-line-strong px-1.5 font-sans">
                  {key}
                </kbd>
              ))}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
