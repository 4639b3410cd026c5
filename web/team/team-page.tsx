import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { sessionQuery } from '#web/session/session-query.ts';
import { Button } from '#web/ui/button.tsx';
import { Icon } from '#web/ui/icon.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { Page } from '#web/ui/page.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { InvitationsTable } from './invitations-table.tsx';
import { InviteDialog } from './invite-dialog.tsx';
import { MembersTable } from './members-table.tsx';
import { RenameTeam } from './rename-team.tsx';
import { RightsTable } from './rights-table.tsx';
import { membersQuery, teamQuery } from './team-queries.ts';

export function Component() {
  const { data: session } = useQuery(sessionQuery);
  const team = useQuery(teamQuery);
  const members = useQuery(membersQuery);
  const [inviting, setInviting] = useState(false);
  const [renaming, setRenaming] = useState(false);
  const manages = session?.allowed.includes('manage-members') ?? false;
  const failed = team.error ?? members.error;
  return (
    <Page
      title={team.data?.name ?? session?.team.name ?? 'Team'}
      actions={
        manages ? (
          <>
            <Button onClick={() => setRenaming(true)} disabled={!team.data}>
              Rename the team
            </Button>
            <Button variant="primary" onClick={() => setInviting(true)}>
              <Icon name="plus" />
              Invite a member
            </Button>
          </>
        ) : null
      }
    >
      <div className="flex flex-col gap-12">
        <section aria-labelledby="members">
          <h2 id="members" className="mb-2 text-xl">
            Members
          </h2>
          {members.data ? (
            <MembersTable members={members.data.items} manages={manages} ownId={session?.member.id ?? ''} />
          ) : failed ? (
            <ProblemNotice
              error={failed}
              retry={() => {
                void team.refetch();
                void members.refetch();
              }}
            />
          ) : (
            <Loading what="the members" />
          )}
          {manages ? null : (
            <p className="mt-4 text-sm text-ink-soft">Members are invited, changed and removed by an administrator.</p>
          )}
        </section>
        {manages ? <InvitationsTable /> : null}
        <RightsTable />
      </div>
      {inviting ? <InviteDialog onClose={() => setInviting(false)} /> : null}
      {renaming && team.data ? <RenameTeam name={team.data.name} onClose={() => setRenaming(false)} /> : null}
    </Page>
  );
}
