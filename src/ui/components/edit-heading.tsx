import type { ComponentChildren } from 'preact';
import { useEffect, useRef } from 'preact/hooks';

/** Heading of a form that has taken the place of a list; takes the focus, so that eyes and readers start there. */
export function EditHeading({ children }: { children: ComponentChildren }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  return (
    <h2 ref={heading} tabIndex={-1} class="edit-heading">
      {children}
    </h2>
  );
}
