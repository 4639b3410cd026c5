import { type RevisionAction, revisionRules, type TeamAction, teamRules } from '#core/review/permissions.ts';
import { role as roleSchema, roleNames } from '#core/review/role.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';

const revisionWords: Record<RevisionAction, string> = {
  edit: 'Draw the sketch',
  solve: 'Run the check',
  comment: 'Comment',
  submit: 'Submit for review',
  'send-back': 'Send back',
  clear: 'Clear',
  issue: 'Issue',
  withdraw: 'Withdraw',
  'open-next': 'Open the next revision',
};
const teamWords: Record<TeamAction, string> = {
  'create-assembly': 'Create an assembly',
  'read-audit': 'Read the audit trail',
  'manage-members': 'Manage members',
  'read-mail': 'Read the caught mail',
};
type Line = { words: string; roles: readonly string[]; states: string; notAuthor: boolean };

const lines: Line[] = [
  ...Object.entries(revisionRules).map(([action, rule]) => ({
    words: revisionWords[action as RevisionAction],
    roles: rule.roles,
    states: rule.states.join(', '),
    notAuthor: rule.notAuthor ?? false,
  })),
  ...Object.entries(teamRules).map(([action, roles]) => ({
    words: teamWords[action as TeamAction],
    roles,
    states: '',
    notAuthor: false,
  })),
];

/** Who may do what, read from the table that the server enforces. */
export function RightsTable() {
  const head = [
    { label: 'Right' },
    ...roleSchema.options.map((role) => ({ label: roleNames[role] })),
    { label: 'In the states' },
  ];
  return (
    <details className="border-y border-line py-3">
      <summary className="min-h-8 py-1 text-xl font-semibold">Who may do what</summary>
      <div className="mt-3">
        <Table caption="Rights by role" head={head}>
          {lines.map(({ words, roles, states, notAuthor }) => (
            <Row key={words}>
              <Cell className="font-semibold whitespace-nowrap">{words}</Cell>
              {roleSchema.options.map((role) => (
                <Cell key={role}>
                  {roles.includes(role) ? (
                    <>
                      <span aria-hidden="true">●</span>
                      <span className="sr-only">yes</span>
                      {notAuthor ? <span className="text-sm text-ink-soft"> not an author</span> : null}
                    </>
                  ) : (
                    <span className="sr-only">no</span>
                  )}
                </Cell>
              ))}
              <Cell className="text-sm text-ink-soft">{states}</Cell>
            </Row>
          ))}
        </Table>
      </div>
    </details>
  );
}
