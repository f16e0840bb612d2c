import { useEffect, useState } from 'preact/hooks';
import type { CheckFacts } from '../../../../app/capture/heading-takes.ts';
import { takeCheck } from '../../../../app/capture/heading-takes.ts';
import { undoLast } from '../../../../app/capture/undo-last.ts';
import { headingMethod } from '../../../../core/pointing/heading-methods.ts';
import type { HeadingMethodId } from '../../../../core/survey/survey.ts';
import { useApp } from '../../../app-context.ts';
import { faultOf, typedNumber, valueOf } from '../../../typed.ts';
import { checkWords } from '../heading-words.ts';
import { utmZone } from '../../../../core/pointing/utm.ts';
import { FacesPanel } from './faces-panel.tsx';
import { KnownMarks } from './known-marks.tsx';
import { ShadowHours } from './shadow-hours.tsx';
import type { CheckWay, Sitting } from './sitting.ts';
import { Switches, Thumb } from './thumb.tsx';

const WAYS: { value: CheckWay; label: string }[] = [
  { value: 'sun-shadow', label: 'Shadow' },
  { value: 'known-mark', label: 'Mark' },
  { value: 'plan-bearing', label: 'Plan' },
  { value: 'two-face', label: 'Two faces' },
];

const FRAMES = [
  { value: 'true', label: 'True north' },
  { value: 'magnetic', label: 'Magnetic' },
  { value: 'grid', label: 'Map grid' },
] as const;

/** Tying the sitting to north, and testing the phone's own inclination. */
export function CheckPanel({ sitting }: { sitting: Sitting }) {
  const { session } = sitting;
  const way = sitting.checkWay.value;
  useEffect(() => {
    // a shadow is laid along the phone's edge: nobody needs to look towards the sun, nor the camera
    if (way !== 'sun-shadow') return;
    const before = session.axis.value;
    sitting.sightingAxis = before;
    session.axis.value = 'top-edge';
    return () => {
      session.axis.value = before;
    };
  }, [way, session, sitting]);
  return (
    <>
      <Switches
        label="Way of checking"
        value={way}
        options={WAYS}
        onChoose={(wanted) => (sitting.checkWay.value = wanted)}
      />
      <CheckResult sitting={sitting} />
      {way === 'two-face' ? <FacesPanel sitting={sitting} /> : <MethodPanel sitting={sitting} method={way} />}
    </>
  );
}

function MethodPanel({ sitting, method }: { sitting: Sitting; method: HeadingMethodId }) {
  const { session, stationId } = sitting;
  const { howTo, caution, needsBearing } = headingMethod(method);
  const [mark, setMark] = useState('');
  const [bearing, setBearing] = useState('');
  const [frame, setFrame] = useState<(typeof FRAMES)[number]['value']>('true');
  const [height, setHeight] = useState('');
  const [length, setLength] = useState('');
  const metres = { least: 0.01, most: 1000, unit: ' m', optional: true };
  const [tall, long] = [typedNumber(height, metres), typedNumber(length, metres)];
  const typed = typedNumber(bearing, { least: 0, most: 360, unit: '°', optional: method !== 'known-mark' });
  const isUnnamed = method !== 'sun-shadow' && mark.trim() === '';
  const missing = isUnnamed ? 'mark-unnamed' : faultOf(typed) !== null ? 'no-bearing' : null;
  const take = async () => {
    const facts: CheckFacts = {
      method,
      ...(mark.trim() && { mark: mark.trim() }),
      ...(valueOf(typed) !== undefined && { bearing: valueOf(typed), frame }),
      ...(method === 'sun-shadow' &&
        valueOf(tall) !== undefined &&
        valueOf(long) !== undefined && { shadowHeight: valueOf(tall), shadowLength: valueOf(long) }),
      ...(frame === 'grid' && { gridZone: utmZone(session.record.survey.site) }),
    };
    const taken = await takeCheck(session, stationId, facts);
    if (taken) sitting.checked(taken, facts.mark ?? '');
  };
  return (
    <>
      {caution && (
        <p class="banner">
          <strong>{caution}</strong>
        </p>
      )}
      <p>{howTo}</p>
      {method === 'sun-shadow' && <ShadowHours session={session} />}
      {method === 'sun-shadow' && (
        <details class="clock-test">
          <summary>Test the clock by the shadow’s length</summary>
          <div class="check-fields">
            <Measured label="Height of the upright, m" value={height} onInput={setHeight} />
            <Measured label="Shadow on level ground, m" value={length} onInput={setLength} />
          </div>
        </details>
      )}
      {needsBearing && (
        <div class="check-fields">
          <label>
            Mark
            <input
              type="text"
              value={mark}
              maxLength={200}
              autocomplete="off"
              onInput={({ currentTarget }) => setMark(currentTarget.value)}
            />
          </label>
          {method === 'known-mark' && (
            <Measured label="Bearing, degrees" value={bearing} onInput={setBearing} />
          )}
        </div>
      )}
      {needsBearing && (
        <KnownMarks
          sitting={sitting}
          mark={mark.trim()}
          onMark={setMark}
          onBearing={
            method === 'known-mark'
              ? (known) => {
                  setBearing(String(known.bearing));
                  setFrame(known.frame);
                }
              : undefined
          }
        />
      )}
      {method === 'known-mark' && (
        <Switches label="North of the bearing" value={frame} options={FRAMES} onChoose={setFrame} />
      )}
      {frame === 'grid' && method === 'known-mark' && (
        <p class="small">Taken to be of UTM zone {utmZone(session.record.survey.site)}.</p>
      )}
      <Thumb
        session={session}
        label={method === 'sun-shadow' ? 'Take the shadow' : 'Sight the mark'}
        disabled={[tall, long].some((one) => faultOf(one) !== null)}
        onPress={() => (missing ? session.refuse(missing) : void take())}
      />
    </>
  );
}

function Measured(props: { label: string; value: string; onInput: (value: string) => void }) {
  return (
    <label>
      {props.label}
      <input
        type="text"
        inputMode="decimal"
        autocomplete="off"
        value={props.value}
        onInput={({ currentTarget }) => props.onInput(currentTarget.value)}
      />
    </label>
  );
}

/** What the last check found, and what speaks against it. */
function CheckResult({ sitting }: { sitting: Sitting }) {
  const services = useApp();
  const id = sitting.lastCheck.value;
  const pointed = sitting.session.pointed.value;
  const found = pointed?.runs.flatMap(({ checks }) => checks).find(({ check }) => check === id);
  if (!pointed || !found) return null;
  const warning = pointed.warnings.find(({ path }) => path.startsWith(found.path))?.message;
  return (
    <div class="banner row" role="status">
      <p>
        {checkWords(found)} {warning !== found.refused && warning}
      </p>
      <button
        type="button"
        onClick={() => void undoLast(services, sitting.session)}
        aria-label="Undo the last"
      >
        Undo
      </button>
    </div>
  );
}
