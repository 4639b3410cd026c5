import { useMemo } from 'react';
import { useEditor } from '../editor-context.ts';
import type { EditorState } from '../editor-store.ts';
import type { ConditionCheck } from '../solve/checks.ts';
import type { HeatPicture } from './draw-heat.ts';
import { heatPicture } from './heat-picture.ts';

/** What was calculated last for the active condition. */
export function activeCheck({ checks, activeCondition }: EditorState): ConditionCheck | null {
  return (activeCondition !== null && checks.byCondition.get(activeCondition)) || null;
}

/** Heat of the active layer in the active condition; null where it is switched off or not there yet. */
export function useHeatPicture(): HeatPicture | null {
  const check = useEditor(activeCheck);
  const layer = useEditor((state) => state.activeLayer);
  const isShown = useEditor((state) => state.shown === 'heat');
  return useMemo(() => (check && isShown ? heatPicture(check, layer) : null), [check, layer, isShown]);
}
