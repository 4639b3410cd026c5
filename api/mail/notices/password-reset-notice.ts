import { type Notice, paragraphs } from '../notice.ts';

export function passwordResetNotice(publicUrl: string, { name, token }: { name: string; token: string }): Notice {
  return {
    subject: 'Set a new password',
    text: paragraphs(
      `Hello ${name},`,
      'somebody asked for a new password for your account in Dropwatt. Set it within one hour here:',
      `${publicUrl}/password-reset/${token}`,
      'If it was not you, leave it be; your password stays as it is.',
    ),
    holdsToken: true,
  };
}
