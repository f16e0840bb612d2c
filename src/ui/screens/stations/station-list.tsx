import { ordered } from '../../../core/survey/order.ts';
import type { Station, Survey } from '../../../core/survey/survey.ts';
import { AllStations } from '../../components/field-book/all-stations.tsx';
import { UnfinishedForms } from '../../components/form/unfinished-forms.tsx';
import { navigate } from '../../router.ts';
import type { SectionProps } from '../../section.ts';
import { percentText } from '../../value-text.ts';
import { startPractice } from './practice.ts';
import { counted, hasParts, placeWords, servedNames } from './station-facts.ts';
import { editStationPath, measurePath, newStationPath, stationForm, stationPath } from './station-path.ts';
import { useAssessment } from './use-assessment.ts';

type Figures = ReturnType<typeof useAssessment>;

function accessWords(figures: Figures, station: Station, survey: Survey): string {
  const parts = survey.planes.flatMap(({ id, name }) => {
    const found = figures?.planes
      .find((plane) => plane.id === id)
      ?.stations.find((one) => one.id === station.id);
    if (!found) return [];
    return [
      `${name}: access ${percentText(found.solarAccess.annual)}, covered ${percentText(found.coverage)}`,
    ];
  });
  return parts.join('; ');
}

function Row(props: { station: Station; survey: Survey; surveyId: string; figures: Figures }) {
  const { station, survey, surveyId, figures } = props;
  const has = hasParts(station);
  const access = accessWords(figures, station, survey);
  return (
    <li>
      <a class="station-row" href={stationPath(surveyId, station.id)}>
        <strong>{station.name}</strong>
        <span>{has.length > 0 ? `${has.join(', ')}.` : 'Nothing sighted from here yet.'}</span>
        {access && <span class="small">{access}.</span>}
        <span class="faint small">{placeWords(station, survey)}.</span>
      </a>
    </li>
  );
}

/** The stations, what each has, and the ways to add to them. */
export function StationList({ surveyId, survey, services }: SectionProps) {
  const figures = useAssessment(services, survey);
  const stations = ordered(survey.stations);
  /** What goes on with a form that was typed into and not saved. */
  const opens = (form: string): (() => void) | null => {
    if (form === stationForm(null)) return () => navigate(newStationPath(surveyId));
    const station = stations.find((one) => stationForm(one) === form);
    return station ? () => navigate(editStationPath(surveyId, station.id)) : null;
  };
  return (
    <div class="stack">
      <UnfinishedForms survey={surveyId} opens={opens} />
      <h2>Stations</h2>
      {stations.length === 0 ? (
        <p>
          A station is a point of the roof from which the phone sights what stands around it. One in the
          middle of each roof plane is the least; the lower corners tell more.
        </p>
      ) : (
        <ul class="station-rows">
          {stations.map((station) => (
            <Row key={station.id} station={station} survey={survey} surveyId={surveyId} figures={figures} />
          ))}
        </ul>
      )}
      <div class="row">
        <a class="button main" href={newStationPath(surveyId)}>
          Add a station
        </a>
        <button type="button" class="tall" onClick={() => void startPractice(services)}>
          Practise with a recording
        </button>
      </div>
      {survey.planes.length > 0 && <PlaneLinks surveyId={surveyId} survey={survey} />}
      {stations.some((station) => servedNames(station, survey).length === 0) && (
        <p>A station that speaks for no plane changes no result: open it, and say which planes it serves.</p>
      )}
      <AllStations survey={survey} />
    </div>
  );
}

function PlaneLinks({ surveyId, survey }: { surveyId: string; survey: Survey }) {
  return (
    <>
      <h2>Measure a plane</h2>
      <ul class="station-rows">
        {ordered(survey.planes).map(
          ({ id, name, surfaceTilt, surfaceAzimuth, tiltPlacings, azimuthSightings }) => (
            <li key={id}>
              <a class="station-row" href={measurePath(surveyId, id)}>
                <strong>{name}</strong>
                <span>
                  Tilt {surfaceTilt.toFixed(1)}°, facing {surfaceAzimuth.toFixed(1)}°.
                </span>
                <span class="faint small">
                  {counted((tiltPlacings ?? []).length, 'placing')},{' '}
                  {counted((azimuthSightings ?? []).length, 'sighting')} along edges.
                </span>
              </a>
            </li>
          ),
        )}
      </ul>
    </>
  );
}
