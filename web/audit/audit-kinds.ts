/** Kinds offered in the filter before the first of them has happened. */
export const auditKinds = [
  'assembly.created',
  'revision.submitted',
  'revision.sent-back',
  'revision.cleared',
  'revision.issued',
  'revision.withdrawn',
  'member.invited',
  'member.removed',
];
