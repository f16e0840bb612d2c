import type { CaptureSession } from '../../../../app/capture/capture-session.ts';

/** The one large button under the thumb. While a hold is at work it says so and takes no second tap. */
export function Thumb(props: {
  session: CaptureSession;
  label: string;
  onPress: () => void;
  disabled?: boolean;
  /** Another button beside it is the way on. */
  minor?: boolean;
}) {
  const phase = props.session.phase.value;
  const busy = phase === 'holding' || phase === 'storing';
  return (
    <button
      type="button"
      class={props.minor ? 'thumb' : 'thumb main'}
      aria-busy={busy}
      disabled={props.disabled}
      onClick={() => !busy && props.onPress()}
    >
      {phase === 'holding' ? 'Hold still…' : props.label}
    </button>
  );
}

/** One of a few, all in sight; the chosen one is filled. */
export function Switches<T extends string>(props: {
  label: string;
  value: T;
  options: readonly { value: T; label: string }[];
  disabled?: boolean;
  onChoose: (value: T) => void;
}) {
  return (
    <div class="switches" role="group" aria-label={props.label}>
      {props.options.map(({ value, label }) => (
        <button
          key={value}
          type="button"
          aria-pressed={value === props.value}
          disabled={props.disabled}
          onClick={() => props.onChoose(value)}
        >
          {label}
        </button>
      ))}
    </div>
  );
}
