import { Dialog as Radix } from 'radix-ui';
import { type ReactNode, useRef, useState } from 'react';
import { Icon } from './icon.tsx';

type Props = {
  title: string;
  open: boolean;
  onOpenChange: (open: boolean) => void;
  children: ReactNode;
  /** Buttons at the lower edge, the one that acts last. */
  footer?: ReactNode;
};

/**
 * Modal dialog: focus goes to its first field (or to what asks for it by `autoFocus`) and stays inside; Escape and
 * the cross close it; focus returns to where it was before.
 */
export function Dialog({ open, onOpenChange, ...content }: Props) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-veil" />
        <OpenDialog {...content} />
      </Radix.Portal>
    </Radix.Root>
  );
}

function OpenDialog({ title, children, footer }: Pick<Props, 'title' | 'children' | 'footer'>) {
  const [before] = useState(() => document.activeElement);
  const body = useRef<HTMLDivElement>(null);
  return (
    <Radix.Content
      aria-describedby={undefined}
      onOpenAutoFocus={(event) => {
        const field = body.current?.querySelector<HTMLElement>('input:not([type=hidden]), select, textarea');
        if (!field) return;
        event.preventDefault();
        field.focus();
      }}
      onCloseAutoFocus={(event) => {
        event.preventDefault();
        const there = before instanceof HTMLElement && before.isConnected && before !== document.body;
        (there ? before : document.getElementById('content'))?.focus();
      }}
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
      <div ref={body} className="min-h-0 overflow-y-auto px-6 pt-2 pb-6">
        {children}
      </div>
      {footer ? <div className="flex flex-wrap justify-end gap-3 border-t border-line px-6 py-4">{footer}</div> : null}
    </Radix.Content>
  );
}
