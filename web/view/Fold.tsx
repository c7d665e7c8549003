import type { ComponentChildren } from 'preact';
import { useEffect, useState } from 'preact/hooks';

interface FoldOf {
  readonly name: string;
  /** Something in it has to be put right; it then opens, and stays open when that is done. */
  readonly wrong?: boolean;
  readonly class?: string;
  readonly children: ComponentChildren;
}

/** Entries behind their name, which open by themselves where something is wrong in them. */
export function Fold({ name, wrong = false, class: look, children }: FoldOf) {
  const [open, setOpen] = useState(wrong);
  useEffect(() => {
    if (wrong) setOpen(true);
  }, [wrong]);
  return (
    <details class={look} open={open || wrong} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary>
        <bdi>{name}</bdi>
      </summary>
      {children}
    </details>
  );
}
