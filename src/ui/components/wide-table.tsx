import type { ComponentChildren } from 'preact';

/** A ruled table that scrolls sideways by itself where the screen is narrow, by keyboard too. */
export function WideTable({ label, children }: { label: string; children: ComponentChildren }) {
  return (
    <div class="scroll-x" role="region" aria-label={label} tabIndex={0}>
      <table>{children}</table>
    </div>
  );
}
