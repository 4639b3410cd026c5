import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { toast } from 'sonner';
import type { InvitationView } from '#core/contract/people.ts';
import { roleNames } from '#core/review/role.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { invitationsQuery } from './team-queries.ts';

const head = [
  { label: 'Name' },
  { label: 'E-mail' },
  { label: 'Roles' },
  { label: 'Invited' },
  { label: 'Good until' },
  { label: 'Actions', hidden: true },
];

/** Invitations that wait for an answer; for administrators. */
export function InvitationsTable() {
  const invitations = useQuery(invitationsQuery);
  const [withdrawing, setWithdrawing] = useState<InvitationView | null>(null);
  const items = invitations.data?.items ?? [];
  return (
    <section aria-labelledby="invitations">
      <h2 id="invitations" className="mb-2 text-xl">
        Open invitations
      </h2>
      {invitations.error && !invitations.data ? (
        <ProblemNotice error={invitations.error} retry={() => void invitations.refetch()} />
      ) : !invitations.data ? (
        <Loading what="the invitations" />
      ) : items.length === 0 ? (
        <p className="border-y border-line py-6 text-ink-soft">
          Nobody is invited at present. An invitation goes out by mail and waits here until it is accepted.
        </p>
      ) : (
        <Table caption="Open invitations" head={head}>
          {items.map((invitation) => (
            <Row key={invitation.id}>
              <Cell className="font-semibold">{invitation.name}</Cell>
              <Cell className="text-sm whitespace-nowrap">{invitation.email}</Cell>
              <Cell>{invitation.roles.map((role) => roleNames[role]).join(', ')}</Cell>
              <Cell>
                <Timestamp at={invitation.createdAt} dayOnly /> by {invitation.invitedBy}
              </Cell>
              <Cell>
                <Timestamp at={invitation.expiresAt} />
              </Cell>
              <Cell className="text-right">
                <Button size="small" variant="danger" onClick={() => setWithdrawing(invitation)}>
                  Withdraw <span className="sr-only">the invitation of {invitation.name}</span>
                </Button>
              </Cell>
            </Row>
          ))}
        </Table>
      )}
      {withdrawing ? <WithdrawInvitation invitation={withdrawing} onClose={() => setWithdrawing(null)} /> : null}
    </section>
  );
}

function WithdrawInvitation({ invitation, onClose }: { invitation: InvitationView; onClose: () => void }) {
  const client = useQueryClient();
  const withdraw = useMutation({
    mutationFn: () => call('withdrawInvitation', { params: { invitationId: invitation.id } }),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: invitationsQuery.queryKey });
      toast.success(`The invitation of ${invitation.name} is withdrawn`);
      onClose();
    },
  });
  return (
    <Dialog
      title={`Withdraw the invitation of ${invitation.name}?`}
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      footer={
        <>
          <Button autoFocus onClick={onClose}>
            Keep it
          </Button>
          <Button variant="danger" disabled={withdraw.isPending} onClick={() => withdraw.mutate()}>
            Withdraw
          </Button>
        </>
      }
    >
      {withdraw.error ? <ProblemNotice error={withdraw.error} /> : null}
      <p>
        The link that was sent to <strong className="break-all">{invitation.email}</strong> stops working.
      </p>
    </Dialog>
  );
}
