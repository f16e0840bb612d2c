/** A gnomon on a ruled line with its noon shadow: the app's mark, in the ink of the page. */
export function NoonMark() {
  return (
    <svg viewBox="0 0 32 32" width="32" height="32" aria-hidden="true">
      <path d="M2 23H30M16 3V23" fill="none" stroke="currentColor" stroke-width="2.5" />
      <path d="M8 23v-3M24 23v-3" fill="none" stroke="currentColor" stroke-width="1.5" />
      <path d="M15 24.5 20.5 30H23.5L17.5 24.5Z" fill="currentColor" />
    </svg>
  );
}
