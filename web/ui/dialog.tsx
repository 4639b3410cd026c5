import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { Icon } from './icon.tsx';

type Props = {
  title: string;
  open: boolean;
  onOpenChange: (open: boolean) => void;
  children: ReactNode;
  /** Buttons at the lower edge, the one that acts last. */
  footer?: ReactNode;
};

/** Modal dialog: focus goes in and stays, Escape and the cross close it, focus returns to what opened it. */
export function Dialog({ title, open, onOpenChange, children, footer }: Props) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-veil" />
        <Radix.Content
          aria-describedby={undefined}
          className="fixed top-1/2 left-1/2 z-50 flex max-h-[calc(100dvh-2rem)] w-[min(34rem,calc(100vw-2rem))] -translate-x-1/2 -translate-y-1/2 flex-col rounded-md border border-line-strong bg-panel text-ink"
        >
          <div className="flex items-start justify-between gap-4 px-6 pt-5 pb-1">
            <Radix.Title className="text-xl font-semibold">{title}</Radix.Title>
            <Radix.Close
              aria-label="Close"
              className="-mr-2 inline-flex size-9 items-center justify-center rounded-sm text-ink-soft hover:bg-copper-soft hover:text-ink"
            >
              <Icon name="close" />
            </Radix.Close>
          </div>
          <div className="min-h-0 overflow-y-auto px-6 pt-2 pb-6">{children}</div>
          {footer ? (
            <div className="flex flex-wrap justify-end gap-3 border-t border-line px-6 py-4">{footer}</div>
          ) : null}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
