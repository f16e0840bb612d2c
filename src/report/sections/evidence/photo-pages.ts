import { photoAzimuth } from '../../../core/pointing/photo-azimuth.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { Photo, Survey } from '../../../core/survey/survey.ts';
import type { ContentsPhoto } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';

/** The photos with what they show, where the camera looked, and when. */
export const photoPages: SectionKind = {
  id: 'photos',
  part: 'evidence',
  write: (report, speech) => {
    const photos = ordered(report.survey.photos ?? []);
    if (photos.length === 0) return null;
    return {
      heading: speech.words['photos.heading'],
      blocks: [{ kind: 'photos', photos: photos.map((photo) => photoOf(photo, report, speech)) }],
    };
  },
};

function photoOf(photo: Photo, { survey, pointed, photos }: ReportInput, speech: Speech): ContentsPhoto {
  const { words } = speech;
  const subject = subjectName(photo, survey, speech);
  const image = photos.get(photo.sha256) ?? null;
  const toward = photoAzimuth(photo, survey, pointed);
  const direction = toward
    ? [words['photos.toward'](`${speech.compass(toward.azimuth)}, ${speech.azimuth(toward.azimuth)}`)]
    : [];
  const taken = speech.instant(Date.parse(photo.takenAt), survey.site.timeZone);
  const caption = [subject, ...direction, taken, ...(image ? [] : [words['photos.missing']])].join('; ');
  return { image, caption, alternative: [subject, ...direction].join(', ') };
}

function subjectName({ of }: Photo, survey: Survey, speech: Speech): string {
  const lists = { station: survey.stations, plane: survey.planes, obstruction: survey.obstructions };
  if (of.kind === 'site') return speech.words['photos.of-site'];
  if (of.kind === 'fact')
    return shownText(survey.facts?.find(({ id }) => id === of.id)?.label ?? of.id ?? '');
  const list: { id: string; name: string }[] = lists[of.kind];
  return shownText(list.find(({ id }) => id === of.id)?.name ?? of.id ?? '');
}
