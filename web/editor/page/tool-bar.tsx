import { Toolbar } from 'radix-ui';
import { classes } from '#web/ui/classes.ts';
import { chooseTool, commands } from '../commands/command.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { type ToolName, toolWords } from '../tools/tool-name.ts';
import { type SaveActs, SaveText } from './save-text.tsx';
import { ToolSign } from './tool-sign.tsx';

const groups: readonly (readonly ToolName[])[] = [
  ['select', 'hand'],
  ['outline', 'pour', 'cutout', 'via-field'],
  ['regulator', 'source', 'sink', 'probe'],
];

const itemClass =
  'inline-flex min-h-9 items-center gap-1.5 rounded-sm px-2 text-sm whitespace-nowrap hover:bg-copper-soft disabled:text-unknown disabled:hover:bg-transparent aria-checked:bg-ink aria-checked:text-paper';

/** Tools, undo, zoom: one stop of the Tab key, arrow keys inside. */
export function ToolBar({ showKeys, ...saveActs }: { showKeys: () => void } & SaveActs) {
  const store = useEditorStore();
  const tool = useEditor((state) => state.tool);
  const mayEdit = useEditor((state) => state.readOnly === null);
  const undoable = useEditor((state) => state.history.undo.at(-1)?.name ?? null);
  const redoable = useEditor((state) => state.history.redo.at(-1)?.name ?? null);
  return (
    <div className="flex flex-wrap items-center gap-x-3 border-b border-line bg-panel px-2 sm:px-4">
      <Toolbar.Root aria-label="Drawing tools" className="flex min-w-0 flex-wrap items-center gap-x-1 py-1">
        <Toolbar.ToggleGroup
          type="single"
          value={tool}
          onValueChange={(value) => chooseTool(store, (value || 'select') as ToolName)}
          aria-label="Tool"
          className="contents"
        >
          {(mayEdit ? groups : groups.slice(0, 1)).map((group, index) => (
            <div key={group[0]} className={classes('flex flex-wrap', index > 0 && 'border-l border-line pl-1')}>
              {group.map((name) => (
                <Toolbar.ToggleItem
                  key={name}
                  value={name}
                  title={`${toolWords[name].label} (${toolWords[name].key.toUpperCase()})`}
                  className={itemClass}
                >
                  <ToolSign name={name} />
                  {toolWords[name].label}
                </Toolbar.ToggleItem>
              ))}
            </div>
          ))}
        </Toolbar.ToggleGroup>
        {mayEdit ? (
          <div className="flex border-l border-line pl-1">
            <Toolbar.Button
              className={itemClass}
              disabled={undoable === null}
              title={undoable ? `Undo: ${undoable} (Ctrl+Z)` : 'Nothing to undo'}
              onClick={() => commands.undo.run(store)}
            >
              Undo
            </Toolbar.Button>
            <Toolbar.Button
              className={itemClass}
              disabled={redoable === null}
              title={redoable ? `Redo: ${redoable} (Ctrl+Shift+Z)` : 'Nothing to redo'}
              onClick={() => commands.redo.run(store)}
            >
              Redo
            </Toolbar.Button>
          </div>
        ) : null}
        <div className="flex border-l border-line pl-1">
          <Toolbar.Button className={itemClass} title="Keys (?)" onClick={showKeys}>
            Keys
          </Toolbar.Button>
        </div>
      </Toolbar.Root>
      <div className="ml-auto py-1">
        <SaveText {...saveActs} />
      </div>
    </div>
  );
}
