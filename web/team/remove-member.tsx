import { useMutation, useQueryClient } from '@tanstack/react-query';
import { toast } from 'sonner';
import type { MemberView } from '#core/contract/people.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { membersQuery } from './team-queries.ts';

/** Asks once more, by name, before a member loses access. */
export function RemoveMember({ member, onClose }: { member: MemberView; onClose: () => void }) {
  const client = useQueryClient();
  const remove = useMutation({
    mutationFn: () => call('removeMember', { params: { memberId: member.id } }),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: membersQuery.queryKey });
      toast.success(`${member.name} is removed`);
      onClose();
    },
  });
  return (
    <Dialog
      title={`Remove ${member.name}?`}
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      footer={
        <>
          <Button autoFocus onClick={onClose}>
            Keep {member.name}
          </Button>
          <Button variant="danger" disabled={remove.isPending} onClick={() => remove.mutate()}>
            {remove.isPending ? 'Removing …' : `Remove ${member.name}`}
          </Button>
        </>
      }
    >
      <div className="flex flex-col gap-4">
        {remove.error ? <ProblemNotice error={remove.error} /> : null}
        <p>
          Every open session of <strong className="break-all">{member.email}</strong> ends at once, and the sign-in no
          longer works. Signatures, comments and audit events of {member.name} stay.
        </p>
      </div>
    </Dialog>
  );
}
