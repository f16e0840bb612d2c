/** What is missing before there is any shade to show. */
export function EmptyShade(props: { reason: 'no-plane' } | { reason: 'no-station'; planeName: string }) {
  if (props.reason === 'no-plane')
    return (
      <div class="stack">
        <h2>No roof plane yet</h2>
        <p>Shade falls on a plane: its tilt and the way it faces. Add a roof plane to the survey first.</p>
      </div>
    );
  return (
    <div class="stack">
      <h2>No station for {props.planeName}</h2>
      <p>
        No station speaks for this plane, so nothing is known of what stands around it. Take sightings from a
        station on it, or name this plane among those a station speaks for.
      </p>
    </div>
  );
}
