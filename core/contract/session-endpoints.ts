import { endpoint } from './endpoint.ts';
import { changePasswordBody, completeResetBody, requestResetBody, sessionView, signInBody } from './people.ts';

/** Signing in and out, passwords. */
export const sessionEndpoints = {
  readSession: endpoint({
    method: 'get',
    path: '/session',
    summary: 'Who is signed in; null when nobody is',
    access: 'public',
    status: 200,
    answer: sessionView.nullable(),
  }),
  signIn: endpoint({
    method: 'post',
    path: '/session',
    summary: 'Sign in',
    access: 'public',
    body: signInBody,
    status: 200,
    answer: sessionView,
  }),
  signOut: endpoint({
    method: 'delete',
    path: '/session',
    summary: 'Sign out',
    access: 'public',
    status: 204,
    answer: null,
  }),
  changePassword: endpoint({
    method: 'put',
    path: '/session/password',
    summary: 'Change the own password; ends every other session',
    access: 'member',
    body: changePasswordBody,
    status: 204,
    answer: null,
  }),
  requestReset: endpoint({
    method: 'post',
    path: '/password-resets',
    summary: 'Send a reset link, if the address is known',
    access: 'public',
    body: requestResetBody,
    status: 202,
    answer: null,
  }),
  completeReset: endpoint({
    method: 'post',
    path: '/password-resets/complete',
    summary: 'Set a new password with the link',
    access: 'public',
    body: completeResetBody,
    status: 204,
    answer: null,
  }),
} as const;
