import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, expect, test } from 'vitest';
import { boardDocument } from '#core/board/document.ts';
import { ConditionSection } from '#web/conditions/condition-section.tsx';
import { SuppliesSection } from '#web/conditions/supplies-section.tsx';
import { EditorContext } from '#web/editor/editor-context.ts';
import { createEditorStore, type EditorStore, undo } from '#web/editor/editor-store.ts';
import { tinyBoard } from '../../support/tiny-board.ts';

afterEach(cleanup);

function show(readOnly: string | null = null): EditorStore {
  const board = boardDocument.parse(tinyBoard());
  const store = createEditorStore({ board, version: 1, savedAt: '2026-12-01T10:00:00Z', readOnly });
  render(
    <MemoryRouter>
      <EditorContext value={store}>
        <ConditionSection />
        <SuppliesSection />
      </EditorContext>
    </MemoryRouter>,
  );
  return store;
}

async function enter(label: RegExp | string, text: string, place: HTMLElement = document.body): Promise<void> {
  const field = within(place).getByLabelText(label);
  await userEvent.clear(field);
  await userEvent.type(field, `${text}{Enter}`);
}

test('a condition – ambient with a decimal comma, load – goes into the board as one step each', async () => {
  const store = show();
  await enter('Outside ambient', '62,5');
  await enter('U1', '0.12');
  expect(store.getState().board.conditions[0]).toMatchObject({ ambientC: 62.5, loadsA: { U1: 0.12 } });
  expect(undo(store)).toMatch(/loads/);
  expect(store.getState().board.conditions[0]!.loadsA).toEqual({});
});

test('a value outside its range – is refused with range and unit, the board stays', async () => {
  const store = show();
  await enter('Rise in the box', '900');
  expect(screen.getByText(/From 0 to 200\sK/)).toBeTruthy();
  expect(store.getState().board.conditions[0]!.boxRiseK).toBe(0);
});

test('a supply – added and given its voltages – stays in order', async () => {
  const store = show();
  await userEvent.click(screen.getByRole('button', { name: 'Add supply' }));
  const section = screen.getByRole('region', { name: 'Supplies' });
  await enter('Highest', '14.8', section);
  await enter('Lowest', '20', section);
  expect(store.getState().board.supplies).toEqual([{ name: 'VIN', minV: 5, nominalV: 5, maxV: 14.8 }]);
});

test('a sketch that may not be changed – shows its conditions without buttons', () => {
  show('Only to be read.');
  expect(screen.queryByRole('button', { name: 'Add condition' })).toBeNull();
  expect((screen.getByLabelText('Outside ambient') as HTMLInputElement).disabled).toBe(true);
});
