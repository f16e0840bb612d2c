import { useRef, useState } from 'preact/hooks';
import { addPhotos, photosOf, type TakenPicture } from '../../../app/actions/photos.ts';
import { attempt } from '../../../app/attempt.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { Photo, PhotoSubject, Survey } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';
import { PICTURE_FAULTS, pictureOf } from '../../device/picture-of.ts';
import { photoDirection } from './photo-direction.ts';
import { PhotoDialog } from './photo-dialog.tsx';
import { Thumbnail } from './thumbnail.tsx';
import './photos.css';

const directionOf = (photo: Photo, survey: Survey): string | null => {
  const direction = photoDirection(photo, survey);
  return direction && `${Math.round(direction.azimuth) % 360}°`;
};

/** The photos of one thing, and the camera to take another. */
export function PhotoStrip(props: {
  survey: Survey;
  subject: PhotoSubject;
  /** What the photos are of, in words. */
  name: string;
  /** In a list of many: the words on the button are left to its label. */
  small?: boolean;
}) {
  const services = useApp();
  const { survey, subject, name } = props;
  const input = useRef<HTMLInputElement>(null);
  const [open, setOpen] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const [faults, setFaults] = useState<string[]>([]);
  const photos = ordered(photosOf(survey, subject));
  const shown = photos.find(({ id }) => id === open);

  const take = async (files: File[]) => {
    setBusy(true);
    const pictures: TakenPicture[] = [];
    const refused: string[] = [];
    for (const file of files) {
      const outcome = await pictureOf(file, services.now());
      if (outcome.ok) pictures.push(outcome.picture);
      else refused.push(`${file.name} ${PICTURE_FAULTS[outcome.why]}`);
    }
    setFaults(refused);
    if (pictures.length > 0)
      await attempt(services.state, () => addPhotos(services, survey, subject, name, pictures));
    setBusy(false);
  };
  return (
    <div class="photo-strip" role="group" aria-label={`Photos of ${name}`}>
      {photos.map((photo, place) => (
        <Thumbnail
          key={photo.id}
          photo={photo}
          label={`Photo ${place + 1} of ${name}`}
          direction={directionOf(photo, survey)}
          onOpen={() => setOpen(photo.id)}
        />
      ))}
      <input
        ref={input}
        type="file"
        accept="image/*"
        capture="environment"
        multiple
        hidden
        onChange={({ currentTarget }) => {
          const files = [...(currentTarget.files ?? [])];
          // So that picking the same file again is a change too.
          currentTarget.value = '';
          if (files.length > 0) void take(files);
        }}
      />
      <button
        type="button"
        aria-label={`Add a photo of ${name}`}
        disabled={busy}
        onClick={() => input.current?.click()}
      >
        {busy ? 'Keeping…' : props.small ? '+ photo' : 'Add a photo'}
      </button>
      <div role="status">
        {faults.map((fault) => (
          <p key={fault} class="field-fault small">
            {fault}
          </p>
        ))}
      </div>
      {shown && <PhotoDialog survey={survey} photo={shown} name={name} onDone={() => setOpen(null)} />}
    </div>
  );
}
