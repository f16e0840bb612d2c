import { useMemo, useState } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { deleteStation } from '../../../app/capture/edit-station.ts';
import { pointSurvey } from '../../../core/pointing/point-survey.ts';
import type { CheckResult, PointedRun, PointedSurvey } from '../../../core/pointing/pointed-survey.ts';
import type { Station } from '../../../core/survey/survey.ts';
import { Dialog } from '../../components/dialog.tsx';
import { FieldBook } from '../../components/field-book/field-book.tsx';
import { navigate } from '../../router.ts';
import type { SectionProps } from '../../section.ts';
import { BearingForm } from './bearing-form.tsx';
import { deviceName } from './device-words.ts';
import { hasParts, placeWords, servedNames, sweptLoose, withoutNorth } from './station-facts.ts';
import { capturePath, editStationPath, stationsPath } from './station-path.ts';
import { checkWords, closureWords, headingWords } from './heading-words.ts';

/** One station: what it has, how far its directions can be trusted, and the way to sight from it. */
export function StationPage(props: SectionProps & { station: Station }) {
  const { station, survey, surveyId, services } = props;
  const [asking, setAsking] = useState(false);
  const pointed = useMemo(() => pointSurvey(survey), [survey]);
  const has = hasParts(station);
  const lost = withoutNorth(station, pointed);
  const remove = async () => {
    if (await attempt(services.state, () => deleteStation(services, survey, station)))
      navigate(stationsPath(surveyId));
  };
  return (
    <div class="stack">
      <p>
        <a href={stationsPath(surveyId)}>All stations</a>
      </p>
      <h2>{station.name}</h2>
      <p>
        {placeWords(station, survey)}. Speaks for {servedNames(station, survey).join(', ') || 'no plane'}.
      </p>
      <p>{has.length > 0 ? `Has ${has.join(', ')}.` : 'Nothing sighted from here yet.'}</p>
      {sweptLoose(station).length > 0 && <p class="caution">A sweep was interrupted: say what it was.</p>}
      {lost > 0 && (
        <p class="caution">
          {lost === 1 ? 'One sighting points' : `${lost} sightings point`} nowhere yet: the phone had no
          compass. One heading check from the same sitting, or a mark of known bearing, gives them their
          north.
        </p>
      )}
      <div class="row">
        <a class="button main" href={capturePath(surveyId, station.id)}>
          Sight from here
        </a>
        <a class="button tall" href={editStationPath(surveyId, station.id)}>
          Change the station
        </a>
        <button type="button" class="plain tall" onClick={() => setAsking(true)}>
          Delete
        </button>
      </div>
      <Headings station={station} pointed={pointed} runs={survey.runs} />
      {(station.headingChecks ?? [])
        .filter(({ method, bearing }) => method !== 'sun-shadow' && bearing === undefined)
        .map((check) => (
          <BearingForm key={check.id} {...props} station={station} check={check} />
        ))}
      <FieldBook station={station} survey={survey} open />
      {asking && (
        <Dialog title={`Delete ${station.name}?`} onCancel={() => setAsking(false)}>
          <p>Its traces, marks and checks go with it. It can be taken back with Undo.</p>
          <div class="row">
            <button type="button" class="main" onClick={() => void remove()}>
              Delete
            </button>
            <button type="button" onClick={() => setAsking(false)}>
              Keep it
            </button>
          </div>
        </Dialog>
      )}
    </div>
  );
}

/** Runs that sighted from this station, in the order they were taken. */
function runsOf(station: Station, pointed: PointedSurvey): PointedRun[] {
  const used = new Set(
    [...pointed.sightings.values()].flatMap(({ station: id, run }) =>
      id === station.id && run ? [run] : [],
    ),
  );
  const checked = (run: PointedRun) => run.checks.some((check) => check.station === station.id);
  return pointed.runs.filter((run) => used.has(run.id) || checked(run));
}

function Headings({
  station,
  pointed,
  runs,
}: {
  station: Station;
  pointed: PointedSurvey;
  runs: SectionProps['survey']['runs'];
}) {
  const mine = runsOf(station, pointed);
  if (mine.length === 0) return null;
  const deviceOf = (id: string) => deviceName(runs.find((run) => run.id === id)?.device, navigator.userAgent);
  return (
    <>
      <h3>Heading</h3>
      <ul class="heading-list">
        {mine.map((run, place) => (
          <li key={run.id}>
            <strong>Sitting {place + 1}</strong> <span class="faint small">{deviceOf(run.id)}</span>
            <br />
            {headingWords(run)}
            {run.closure && <> {closureWords(run.closure)}</>}
            {run.checks
              .filter((check: CheckResult) => check.station === station.id)
              .map((check) => (
                <p key={check.check} class="small">
                  {checkWords(check)}
                </p>
              ))}
          </li>
        ))}
      </ul>
    </>
  );
}
