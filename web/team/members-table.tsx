import { useState } from 'react';
import type { MemberView } from '#core/contract/people.ts';
import { roleNames } from '#core/review/role.ts';
import { Button } from '#web/ui/button.tsx';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { ChangeMember } from './change-member.tsx';
import { RemoveMember } from './remove-member.tsx';

type Props = { members: readonly MemberView[]; manages: boolean; ownId: string };

/** Members with their roles; those who left stay listed, as records name them. */
export function MembersTable({ members, manages, ownId }: Props) {
  const [changing, setChanging] = useState<MemberView | null>(null);
  const [removing, setRemoving] = useState<MemberView | null>(null);
  const head = [{ label: 'Name' }, { label: 'E-mail' }, { label: 'Roles' }, { label: 'Joined' }];
  return (
    <>
      <Table caption="Members" head={manages ? [...head, { label: 'Actions', hidden: true }] : head}>
        {members.map((member) => (
          <Row key={member.id} className={member.removedAt ? 'text-ink-soft' : undefined}>
            <Cell className="font-semibold">
              {member.name}
              {member.id === ownId ? <span className="font-normal text-ink-soft"> (you)</span> : null}
            </Cell>
            <Cell className="text-sm whitespace-nowrap">{member.email}</Cell>
            <Cell className="min-w-40">{member.roles.map((role) => roleNames[role]).join(', ')}</Cell>
            <Cell>
              <Timestamp at={member.joinedAt} dayOnly />
              {member.removedAt ? (
                <span className="block">
                  removed <Timestamp at={member.removedAt} dayOnly />
                </span>
              ) : null}
            </Cell>
            {manages ? (
              <Cell>
                {member.removedAt ? null : (
                  <span className="flex justify-end gap-2">
                    <Button size="small" onClick={() => setChanging(member)}>
                      Change <span className="sr-only">{member.name}</span>
                    </Button>
                    {member.id === ownId ? null : (
                      <Button size="small" variant="danger" onClick={() => setRemoving(member)}>
                        Remove <span className="sr-only">{member.name}</span>
                      </Button>
                    )}
                  </span>
                )}
              </Cell>
            ) : null}
          </Row>
        ))}
      </Table>
      {changing ? <ChangeMember member={changing} onClose={() => setChanging(null)} /> : null}
      {removing ? <RemoveMember member={removing} onClose={() => setRemoving(null)} /> : null}
    </>
  );
}
