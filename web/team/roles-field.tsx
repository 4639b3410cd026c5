import { useId } from 'react';
import { type Role, role as roleSchema, roleNames } from '#core/review/role.ts';
import { CheckField } from '#web/ui/check-field.tsx';

/** What each role is there for, in a few words. */
const purposes: Record<Role, string> = {
  'layout-designer': 'Draws the sketch, runs the check, submits',
  'thermal-reviewer': 'Comments, sends back, clears; never clears an own sketch',
  'quality-engineer': 'Issues the revision, reads the audit trail',
  'hardware-lead': 'Draws and submits, withdraws, reads the audit trail',
  'test-engineer': 'Runs the check and comments',
  administrator: 'Invites, changes and removes members',
};

type Props = { value: readonly Role[]; onChange: (value: Role[]) => void; error?: string | undefined };

/** One or more roles of a member. */
export function RolesField({ value, onChange, error }: Props) {
  const id = useId();
  return (
    <fieldset aria-describedby={error ? `${id}-error` : undefined}>
      <legend className="mb-1 text-sm font-semibold">Roles</legend>
      {roleSchema.options.map((role) => (
        <CheckField
          key={role}
          label={roleNames[role]}
          hint={purposes[role]}
          checked={value.includes(role)}
          onChange={(event) =>
            onChange(
              roleSchema.options.filter((option) => (option === role ? event.target.checked : value.includes(option))),
            )
          }
        />
      ))}
      {error ? (
        <p id={`${id}-error`} className="text-sm font-semibold text-over">
          {error}
        </p>
      ) : null}
    </fieldset>
  );
}
