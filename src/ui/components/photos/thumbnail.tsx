import { useEffect, useRef, useState } from 'preact/hooks';
import type { Photo } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';

/** Address of a photo's picture once it is wanted, null until then; empty where it is not on this device. */
export function usePicture(sha256: string, wanted: boolean): string | null {
  const { photos } = useApp();
  const [address, setAddress] = useState<string | null>(null);
  useEffect(() => {
    if (!wanted) return;
    let made: string | null = null;
    let isStale = false;
    photos.picture(sha256).then(
      (picture) => {
        if (isStale) return;
        made = picture && URL.createObjectURL(new Blob([picture.contents], { type: picture.type }));
        setAddress(made ?? '');
      },
      () => isStale || setAddress(''),
    );
    return () => {
      isStale = true;
      if (made) URL.revokeObjectURL(made);
    };
  }, [photos, sha256, wanted]);
  return address;
}

/** A small picture to touch; read from the device only once it comes into view. */
export function Thumbnail(props: {
  photo: Photo;
  label: string;
  /** Where the camera looked; null where that is not known. */
  direction: string | null;
  onOpen: () => void;
}) {
  const { photo, label, direction, onOpen } = props;
  const button = useRef<HTMLButtonElement>(null);
  const [seen, setSeen] = useState(false);
  useEffect(() => {
    if (!button.current) return;
    const observer = new IntersectionObserver((entries) => {
      if (entries.some(({ isIntersecting }) => isIntersecting)) setSeen(true);
    });
    observer.observe(button.current);
    return () => observer.disconnect();
  }, []);
  const address = usePicture(photo.sha256, seen);
  return (
    <button
      ref={button}
      type="button"
      class="thumbnail"
      aria-label={direction === null ? label : `${label}, towards ${direction}`}
      onClick={onOpen}
    >
      {address === '' ? 'not here' : address && <img src={address} alt="" />}
      {direction !== null && <span class="thumbnail-direction">{direction}</span>}
    </button>
  );
}
