import { useEffect, useRef } from 'preact/hooks';
import type { ComponentChildren } from 'preact';
import { takeArrival } from '../router.ts';

/** Gives the focus to the heading, where the thing that had it has gone from the screen. */
export function focusHeading(): void {
  document.querySelector<HTMLElement>('#screen h1')?.focus();
}

/** The heading of a screen; takes the focus when somebody has just come here, so that a screen reader starts here. */
export function ScreenHeading({ title, children }: { title: string; children?: ComponentChildren }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    document.title = title === 'Noonmark' ? title : `${title} · Noonmark`;
  }, [title]);
  useEffect(() => {
    // Going back keeps the place on the page; going on has scrolled to the top already.
    if (takeArrival()) heading.current?.focus({ preventScroll: true });
  }, []);
  return (
    <h1 ref={heading} tabIndex={-1}>
      {children ?? title}
    </h1>
  );
}
