import { describe, expect, test } from 'vitest';
import { allowedRevisionActions, allowedTeamActions, refusal, revisionRules } from '#core/review/permissions.ts';
import { revisionState, transitions } from '#core/review/revision-state.ts';
import { role, type Role } from '#core/review/role.ts';

/**
 * The whole table, written out a second time from the description of the roles: who may do what in which state, when
 * they are not an author. L layout designer, T thermal reviewer, Q quality engineer, H hardware lead, E test engineer.
 */
const table: Record<keyof typeof revisionRules, Record<string, string>> = {
  edit: { sketch: 'LH', 'sent back': 'LH' },
  solve: { sketch: 'LTQHE', 'in review': 'LTQHE', 'sent back': 'LTQHE', cleared: 'LTQHE' },
  comment: { sketch: 'LTQHE', 'in review': 'LTQHE', 'sent back': 'LTQHE', cleared: 'LTQHE' },
  submit: { sketch: 'LH', 'sent back': 'LH' },
  'send-back': { 'in review': 'T' },
  clear: { 'in review': 'T' },
  issue: { cleared: 'Q' },
  withdraw: { sketch: 'QH', 'in review': 'QH', 'sent back': 'QH', cleared: 'QH' },
  'open-next': { cleared: 'LH', issued: 'LH', withdrawn: 'LH' },
};
const letters: Record<Role, string> = {
  'layout-designer': 'L',
  'thermal-reviewer': 'T',
  'quality-engineer': 'Q',
  'hardware-lead': 'H',
  'test-engineer': 'E',
  administrator: 'A',
};

describe.each(Object.keys(table) as (keyof typeof table)[])('%s', (action) => {
  test.each(revisionState.options)('in state %s – every role – is allowed or refused as written', (state) => {
    const allowed = role.options.filter((one) => refusal(action, [one], state, false) === null);
    const expected = role.options.filter((one) => (table[action][state] ?? '').includes(letters[one]));
    expect(allowed).toEqual(expected);
  });
});

test('an author – with every role – neither clears nor issues, but does all else', () => {
  for (const state of revisionState.options) {
    const asStranger = allowedRevisionActions(role.options, state, false);
    const asAuthor = allowedRevisionActions(role.options, state, true);
    expect(asAuthor).toEqual(asStranger.filter((action) => action !== 'clear' && action !== 'issue'));
  }
});

test('a refusal – names the role before the state, the state before the authorship', () => {
  expect(refusal('clear', ['layout-designer'], 'sketch', true)).toBe('role');
  expect(refusal('clear', ['thermal-reviewer'], 'sketch', true)).toBe('state');
  expect(refusal('clear', ['thermal-reviewer'], 'in review', true)).toBe('author');
});

test('every change of state – is allowed exactly where it can start', () => {
  for (const action of ['submit', 'send-back', 'clear', 'issue', 'withdraw'] as const)
    expect(revisionRules[action].states).toEqual(transitions[action].from);
});

test.each<[Role, string[]]>([
  ['layout-designer', ['create-assembly']],
  ['hardware-lead', ['create-assembly', 'read-audit']],
  ['quality-engineer', ['read-audit']],
  ['administrator', ['read-audit', 'manage-members', 'read-mail']],
  ['thermal-reviewer', []],
  ['test-engineer', []],
])('team rights – of a %s – are as written', (one, rights) => {
  expect(allowedTeamActions([one])).toEqual(rights);
});
