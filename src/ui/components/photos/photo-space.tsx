import { useEffect, useState } from 'preact/hooks';
import type { UnusedPictures } from '../../../app/photo-store.ts';
import { attempt } from '../../../app/attempt.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';
import { sizeText } from '../../messages.ts';

const counted = (count: number) => `${count} ${count === 1 ? 'photo' : 'photos'}`;

/** How much room the photos take, and the way to have that of deleted ones back. */
export function PhotoSpace({ survey }: { survey: Survey }) {
  const { photos, state } = useApp();
  const [unused, setUnused] = useState<UnusedPictures | null>(null);
  const own = survey.photos ?? [];
  const bytes = own.reduce((sum, photo) => sum + photo.bytes, 0);
  useEffect(() => {
    photos.unused().then(setUnused, () => setUnused(null));
  }, [photos, survey]);
  const erase = () =>
    attempt(state, async () => {
      await photos.eraseUnused();
      setUnused(await photos.unused());
    });
  return (
    <div class="stack small">
      <p>
        {own.length === 0 ? 'No photo yet.' : `This survey has ${counted(own.length)}, ${sizeText(bytes)}.`}
      </p>
      {unused !== null && unused.count > 0 && (
        <>
          <p>
            {counted(unused.count)} deleted from surveys on this device still take {sizeText(unused.bytes)},
            so that a deletion can be taken back.
          </p>
          <div>
            <button type="button" onClick={() => void erase()}>
              Erase deleted photos for good
            </button>
          </div>
        </>
      )}
    </div>
  );
}
