import '@testing-library/jest-dom/vitest';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, expect, test } from 'vitest';
import { Dialog } from '#web/ui/dialog.tsx';
import { TextField } from '#web/ui/text-field.tsx';

afterEach(cleanup);

function Page() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button onClick={() => setOpen(true)}>New assembly</button>
      {open ? (
        <Dialog title="New assembly" open onOpenChange={setOpen}>
          <TextField label="Number" />
        </Dialog>
      ) : null}
    </>
  );
}

test('dialog – opened and closed by keyboard – focus in its first field, then back on what opened it', async () => {
  const user = userEvent.setup();
  render(<Page />);
  await user.tab();
  await user.keyboard('{Enter}');
  expect(screen.getByRole('textbox', { name: 'Number' })).toHaveFocus();
  await user.keyboard('{Escape}');
  expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  await waitFor(() => expect(screen.getByRole('button', { name: 'New assembly' })).toHaveFocus());
});
