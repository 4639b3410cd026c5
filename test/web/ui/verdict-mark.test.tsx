import '@testing-library/jest-dom/vitest';
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { verdict } from '#core/result/result.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

afterEach(cleanup);

test.each([
  ['within', 'Within'],
  ['close', 'Close'],
  ['over', 'Over'],
  ['not evaluated', 'Not evaluated'],
] as const)('verdict mark – %s – says the word %s, also when only the shape is shown', (value, word) => {
  render(<VerdictMark verdict={value} wordHidden />);
  expect(screen.getByText(word)).toBeInTheDocument();
});

test('verdict marks – all four – a shape of its own each, so that colour is never alone', () => {
  const shapes = verdict.options.map(
    (value) => render(<VerdictMark verdict={value} />).container.querySelector('svg')?.innerHTML,
  );
  expect(new Set(shapes).size).toBe(4);
});
