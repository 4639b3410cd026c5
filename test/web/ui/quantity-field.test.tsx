import '@testing-library/jest-dom/vitest';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { QuantityField } from '#web/ui/quantity-field.tsx';

afterEach(cleanup);

function setup(props: Partial<Parameters<typeof QuantityField>[0]> = {}) {
  const onCommit = vi.fn<(value: number | null) => void>();
  render(
    <QuantityField label="Width" unit="mm" value={1.4} minimum={0.05} maximum={200} onCommit={onCommit} {...props} />,
  );
  return { onCommit, user: userEvent.setup(), input: screen.getByRole('textbox', { name: 'Width' }) };
}

test('quantity field – decimal comma and Enter – commits the number', async () => {
  const { onCommit, user, input } = setup();
  await user.clear(input);
  await user.type(input, '0,125{Enter}');
  expect(onCommit).toHaveBeenCalledExactlyOnceWith(0.125);
});

test('quantity field – a unit of the same kind – commits in the unit of the field', async () => {
  const { onCommit, user, input } = setup();
  await user.clear(input);
  await user.type(input, '40 mil');
  await user.tab();
  // 40 × 0.0254 mm, the definition of the mil.
  expect(onCommit).toHaveBeenCalledExactlyOnceWith(1.016);
});

test('quantity field – a value outside the range – kept as typed, range and unit said, nothing committed', async () => {
  const { onCommit, user, input } = setup();
  await user.clear(input);
  await user.type(input, '500{Enter}');
  expect(input).toHaveValue('500');
  expect(input).toBeInvalid();
  expect(input).toHaveAccessibleDescription(/From 0\.05 to 200.mm/);
  expect(onCommit).not.toHaveBeenCalled();
});

test('quantity field – Escape while something is typed – the old value, nothing committed', async () => {
  const { onCommit, user, input } = setup();
  await user.clear(input);
  await user.type(input, '77{Escape}');
  await user.tab();
  expect(input).toHaveValue('1.4');
  expect(onCommit).not.toHaveBeenCalled();
});

test('quantity field – emptied – an error where a value is needed, null where it is optional', async () => {
  const needed = setup();
  await needed.user.clear(needed.input);
  await needed.user.tab();
  expect(needed.input).toBeInvalid();
  expect(needed.onCommit).not.toHaveBeenCalled();
  cleanup();
  const optional = setup({ optional: true });
  await optional.user.clear(optional.input);
  await optional.user.tab();
  expect(optional.onCommit).toHaveBeenCalledExactlyOnceWith(null);
});

test('quantity field – arrow and page keys – one step and ten, never past the range', async () => {
  const { onCommit, user, input } = setup();
  await user.type(input, '{ArrowUp}');
  expect(onCommit).toHaveBeenLastCalledWith(1.5);
  await user.type(input, '{PageDown}');
  expect(onCommit).toHaveBeenLastCalledWith(0.4);
  cleanup();
  const atEnd = setup({ value: 199.95 });
  await atEnd.user.type(atEnd.input, '{PageUp}');
  expect(atEnd.onCommit).toHaveBeenLastCalledWith(200);
});
