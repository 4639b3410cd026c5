import { invalid, Refusal } from './refusal.ts';

/**
 * Version that a change is made over.
 * @throws Refusal 428 where the header is missing, 422 where it is not one quoted version
 */
export function versionOf(header: string | undefined): number {
  if (header === undefined)
    throw new Refusal(
      428,
      'version-missing',
      'Version missing',
      'Send If-Match with the version that the change is made from, as read in ETag.',
    );
  const [, version] = /^\s*(?:W\/)?"(\d{1,9})"\s*$/.exec(header) ?? [];
  if (version === undefined)
    throw invalid([{ path: 'If-Match', message: 'must be one version in double quotes, such as "3"' }]);
  return Number(version);
}
