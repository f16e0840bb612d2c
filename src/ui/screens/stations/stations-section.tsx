import type { SectionProps } from '../../section.ts';
import { CaptureScreen } from './capture/capture-screen.tsx';
import { MeasureScreen } from './measure/measure-screen.tsx';
import { StationEditor } from './station-editor.tsx';
import { StationList } from './station-list.tsx';
import { StationPage } from './station-page.tsx';
import { stationsPath } from './station-path.ts';
import './stations.css';

/** Stations of a survey: their list, one of them, sighting from it, and measuring a plane. */
export function StationsSection(props: SectionProps) {
  const { survey, inner } = props;
  const [kind, id, act, start] = inner;
  if (kind === undefined) return <StationList {...props} />;
  if (kind === 'new') return <StationEditor {...props} station={null} plane={id} />;
  const station = kind === 'at' ? survey.stations.find((one) => one.id === id) : undefined;
  if (station && act === 'edit') return <StationEditor {...props} station={station} />;
  if (station && act === 'capture') return <CaptureScreen {...props} station={station} start={start} />;
  if (station) return <StationPage {...props} station={station} />;
  const plane = kind === 'plane' ? survey.planes.find((one) => one.id === id) : undefined;
  if (plane) return <MeasureScreen {...props} plane={plane} />;
  return (
    <p>
      Nothing has this address. <a href={stationsPath(props.surveyId)}>Go to the stations.</a>
    </p>
  );
}
