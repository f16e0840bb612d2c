import { useState } from 'preact/hooks';
import { aimPhoto, deletePhoto } from '../../../app/actions/photos.ts';
import { attempt } from '../../../app/attempt.ts';
import type { Photo, Survey } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';
import { sizeText } from '../../messages.ts';
import { faultOf, typedNumber } from '../../typed.ts';
import { Dialog } from '../dialog.tsx';
import { Form } from '../form/form.tsx';
import { TextField } from '../form/text-field.tsx';
import { AimWithPhone } from './aim-with-phone.tsx';
import { directionText, photoDirection } from './photo-direction.ts';
import { usePicture } from './thumbnail.tsx';

function takenText(takenAt: string, timeZone: string): string {
  return new Date(takenAt).toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'short', timeZone });
}

/** A photo at its size, when it was taken, where the camera looked, and the way to delete it. */
export function PhotoDialog(props: { survey: Survey; photo: Photo; name: string; onDone: () => void }) {
  const services = useApp();
  const { survey, photo, name, onDone } = props;
  const address = usePicture(photo.sha256, true);
  const before = photo.azimuth === undefined ? '' : String(photo.azimuth);
  const [azimuth, setAzimuth] = useState(before);
  const direction = photoDirection(photo, survey);
  const typed = typedNumber(azimuth, { least: 0, most: 360, unit: '°', optional: true });
  const act = async (work: () => Promise<void>) => {
    const done = await attempt(services.state, work);
    onDone();
    return done;
  };
  const save = () => {
    if ('fault' in typed) return false;
    if (azimuth === before) {
      onDone();
      return true;
    }
    return act(() => aimPhoto(services, survey, photo, name, typed.value));
  };
  return (
    <Dialog title={`Photo of ${name}`} onCancel={onDone}>
      {address === '' && (
        <p>The picture is not on this device. Restore it from a backup, or take it again.</p>
      )}
      {address && (
        <img class="photo" src={address} alt={`Photo of ${name}`} width={photo.width} height={photo.height} />
      )}
      <p class="small">
        Taken {takenText(photo.takenAt, survey.site.timeZone)}. {photo.width} × {photo.height} dots,{' '}
        {sizeText(photo.bytes)}.
      </p>
      {direction && (
        <p>
          The camera looked towards <strong>{directionText(direction)}</strong>
          {photo.azimuth === undefined ? ', read with the phone.' : ', as typed.'}
        </p>
      )}
      {!direction && photo.reading !== undefined && (
        <p class="small">
          Where the camera looked was read, but nothing ties that reading to north yet. One heading check in
          that sitting does.
        </p>
      )}
      <AimWithPhone survey={survey} photo={photo} name={name} onDone={onDone} />
      <Form label="Photo" action="Done" onSubmit={save}>
        <TextField
          label="The camera looked towards"
          unit="degrees from true north"
          keys="numbers"
          value={azimuth}
          onInput={setAzimuth}
          fault={faultOf(typed)}
          hint="Optional. What is typed stands over what the phone read."
        />
      </Form>
      <div class="form-actions">
        <button type="button" onClick={() => void act(() => deletePhoto(services, survey, photo, name))}>
          Delete this photo
        </button>
      </div>
    </Dialog>
  );
}
