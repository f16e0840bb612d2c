import { fullCircle } from '../../core/angles/angles.ts';
import { pointSurvey } from '../../core/pointing/point-survey.ts';
import type { AzimuthSighting, RoofPlane, Survey, TiltPlacing } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { nextOrder } from './station-edits.ts';

const withPlane = (survey: Survey, id: string, change: (plane: RoofPlane) => RoofPlane): Survey => ({
  ...survey,
  planes: survey.planes.map((plane) => (plane.id === id ? change(plane) : plane)),
});

/** Takes over what the plane's own readings say of its tilt or facing; as it was where they say nothing. */
function settled(survey: Survey, id: string, what: 'tilt' | 'azimuth'): Survey {
  const found = pointSurvey(survey).planes.find((plane) => plane.id === id)?.[what];
  if (!found) return survey;
  const value = Math.round(found.value * 10) / 10;
  const fields = what === 'tilt' ? { surfaceTilt: value } : { surfaceAzimuth: fullCircle(value) };
  return withPlane(survey, id, (plane) => ({ ...plane, ...fields }));
}

/** The phone put to a plane once: evidence, and the tilt that all placings together tell. */
export async function takePlacing(
  session: CaptureSession,
  { id, name }: RoofPlane,
  held: NonNullable<TiltPlacing['held']>,
): Promise<void> {
  await session.takeHeld((reading) => ({
    edit: (survey) => {
      const placed = withPlane(survey, id, (plane) => ({
        ...plane,
        tiltPlacings: [
          ...(plane.tiltPlacings ?? []),
          { id: session.services.newId(), order: nextOrder(plane.tiltPlacings), reading: reading.id, held },
        ],
      }));
      return settled(placed, id, 'tilt');
    },
    code: 'entry-changed',
    title: name,
    news: { what: 'placing', name },
  }));
}

/** A sighting along an edge of a plane: evidence, and the facing that all of them together tell. */
export async function takeEdge(
  session: CaptureSession,
  { id, name }: RoofPlane,
  along: AzimuthSighting['along'],
): Promise<void> {
  await session.takeHeld((reading) => {
    if (!session.runNow?.heading) return 'no-north';
    return {
      edit: (survey) => {
        const sighted = withPlane(survey, id, (plane) => ({
          ...plane,
          azimuthSightings: [
            ...(plane.azimuthSightings ?? []),
            {
              id: session.services.newId(),
              order: nextOrder(plane.azimuthSightings),
              reading: reading.id,
              along,
            },
          ],
        }));
        return settled(sighted, id, 'azimuth');
      },
      code: 'entry-changed',
      title: name,
      news: { what: 'edge', name },
    };
  });
}
