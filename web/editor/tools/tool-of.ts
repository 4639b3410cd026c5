import type { EditorState } from '../editor-store.ts';
import { handTool } from './hand-tool.ts';
import { placeTool } from './place-tool.ts';
import { selectTool } from './select-tool.ts';
import { shapeTool } from './shape-tool.ts';
import type { Tool } from './tool.ts';
import type { ToolName } from './tool-name.ts';

const tools: Record<ToolName, Tool> = {
  select: selectTool,
  hand: handTool,
  outline: shapeTool,
  pour: shapeTool,
  cutout: shapeTool,
  'via-field': placeTool,
  regulator: placeTool,
  source: placeTool,
  sink: placeTool,
  probe: placeTool,
};

/** The tool that takes the next press; whoever may only look has but two. */
export function toolOf({ tool, readOnly }: Pick<EditorState, 'tool' | 'readOnly'>): Tool {
  return tools[readOnly !== null && tool !== 'hand' ? 'select' : tool];
}

/** Middle button and space bar. */
export const panTool = handTool;
