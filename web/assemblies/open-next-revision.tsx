import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { AssemblyView } from '#core/contract/assemblies.ts';
import { nextLetter } from '#core/review/next-letter.ts';
import { revisionRules } from '#core/review/permissions.ts';
import { paths } from '#web/paths.ts';
import { call } from '#web/server/call.ts';
import { newKey } from '#web/server/new-key.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { assembliesKey } from './assembly-queries.ts';

/** Button and dialog that open the next revision from an earlier one; nothing where no revision may be followed yet. */
export function OpenNextRevision({ assembly }: { assembly: AssemblyView }) {
  const client = useQueryClient();
  const navigate = useNavigate();
  const startable = assembly.revisions.filter(({ state }) => revisionRules['open-next'].states.includes(state));
  const [open, setOpen] = useState(false);
  const [key, setKey] = useState(newKey);
  const [chosen, setChosen] = useState<string | null>(null);
  const from = startable.find(({ id }) => id === chosen) ?? startable[0];
  const next = nextLetter(assembly.revisions[0]?.letter ?? null);
  const openNext = useMutation({
    mutationFn: (id: string) =>
      call('openNextRevision', { params: { assemblyId: assembly.id }, body: { from: id }, idempotencyKey: key }),
    onSuccess: async (revision) => {
      await client.invalidateQueries({ queryKey: assembliesKey });
      await navigate(paths.sketch(revision.id));
    },
  });
  if (!from) return null;
  return (
    <>
      <Button
        variant="primary"
        onClick={() => {
          setKey(newKey());
          openNext.reset();
          setOpen(true);
        }}
      >
        Open revision {next}
      </Button>
      <Dialog
        title={`Open revision ${next} of ${assembly.number}`}
        open={open}
        onOpenChange={setOpen}
        footer={
          <>
            <Button onClick={() => setOpen(false)}>Cancel</Button>
            <Button variant="primary" disabled={openNext.isPending} onClick={() => openNext.mutate(from.id)}>
              {openNext.isPending ? 'Opening …' : `Open revision ${next}`}
            </Button>
          </>
        }
      >
        <div className="flex flex-col gap-5">
          {openNext.error ? <ProblemNotice error={openNext.error} /> : null}
          <SelectField
            label="Start from the sketch of"
            hint="The sketch is copied; the earlier revision stays as it is."
            value={from.id}
            onChange={setChosen}
            options={startable.map(({ id, letter, state }) => ({ value: id, label: `Revision ${letter} (${state})` }))}
          />
        </div>
      </Dialog>
    </>
  );
}
