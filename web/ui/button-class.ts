import { classes } from './classes.ts';

export type ButtonLook = { variant?: 'primary' | 'plain' | 'quiet' | 'danger'; size?: 'normal' | 'small' };

const variants = {
  primary: 'border-copper bg-copper text-on-copper hover:border-ink hover:bg-ink hover:text-paper',
  plain: 'border-line-strong bg-panel text-ink hover:border-ink hover:bg-paper',
  quiet: 'border-transparent bg-transparent text-ink underline-offset-4 hover:bg-copper-soft',
  danger: 'border-over bg-panel text-over hover:bg-over hover:text-paper',
};

/** Look of a button, also for a link that leads on like one. */
export function buttonClass({ variant = 'plain', size = 'normal' }: ButtonLook = {}): string {
  return classes(
    'inline-flex items-center justify-center gap-2 rounded-sm border font-semibold whitespace-nowrap transition-colors',
    'disabled:cursor-not-allowed disabled:border-line disabled:bg-transparent disabled:text-unknown',
    size === 'small' ? 'min-h-8 px-2.5 text-sm' : 'min-h-10 px-4 text-base',
    variants[variant],
  );
}
