import { idOf, kindOf, objectKey } from '#core/board/object-key.ts';
import { LadderStrip } from '#web/ladder/ladder-strip.tsx';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';

/** Rise ladders along the foot of the page; a click selects the regulator. */
export function LadderShelf() {
  const store = useEditorStore();
  const check = useEditor(activeCheck);
  const selected = useEditor(({ selection: [only] }) => (only && kindOf(only) === 'regulator' ? idOf(only) : null));
  return (
    <LadderStrip
      results={check?.condition ?? null}
      selected={selected}
      onSelect={(ref) => store.setState({ selection: [objectKey('regulator', ref)] })}
    />
  );
}
