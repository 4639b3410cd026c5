import { Link } from 'react-router-dom';
import { paths } from '#web/paths.ts';
import { buttonClass } from '#web/ui/button-class.ts';
import { Page } from '#web/ui/page.tsx';

/** An address that leads nowhere. */
export function Component() {
  return (
    <Page title="There is no page here">
      <p className="max-w-prose">
        The address is wrong, or what it led to belongs to another team. Check the link for a missing part, or start
        from the assemblies.
      </p>
      <Link to={paths.assemblies()} className={`mt-6 ${buttonClass({ variant: 'primary' })}`}>
        All assemblies
      </Link>
    </Page>
  );
}
