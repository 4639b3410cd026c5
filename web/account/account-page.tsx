import { useQuery } from '@tanstack/react-query';
import { roleNames } from '#core/review/role.ts';
import { ThemeSwitch } from '#web/layout/theme-switch.tsx';
import { sessionQuery } from '#web/session/session-query.ts';
import { Page } from '#web/ui/page.tsx';
import { ChangePassword } from './change-password.tsx';

export function Component() {
  const { data: session } = useQuery(sessionQuery);
  if (!session) return null;
  const { member, team } = session;
  return (
    <Page title="Account">
      <div className="grid gap-x-20 gap-y-12 md:grid-cols-2">
        <div className="flex flex-col gap-12">
          <section aria-labelledby="person">
            <h2 id="person" className="text-xl">
              {member.name}
            </h2>
            <dl className="mt-4 grid grid-cols-[8rem_1fr] gap-y-2 border-t border-line pt-4">
              <dt className="text-ink-soft">E-mail</dt>
              <dd className="break-all">{member.email}</dd>
              <dt className="text-ink-soft">Team</dt>
              <dd>{team.name}</dd>
              <dt className="text-ink-soft">Roles</dt>
              <dd>{member.roles.map((role) => roleNames[role]).join(', ')}</dd>
            </dl>
            <p className="mt-4 text-sm text-ink-soft">
              Name and roles are changed by an administrator of the team, as they stand in records.
            </p>
          </section>
          <section aria-labelledby="theme">
            <h2 id="theme" className="text-xl">
              Theme
            </h2>
            <p className="mt-1 mb-4 text-ink-soft">
              Kept on this device. “System” follows the device; print is always light.
            </p>
            <ThemeSwitch name="account-theme" words />
          </section>
        </div>
        <ChangePassword email={member.email} />
      </div>
    </Page>
  );
}
