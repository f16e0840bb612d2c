import type { RoofPlane, Station } from '../../../core/survey/survey.ts';

interface Named {
  id: string;
  name: string;
}

function Choice(props: {
  label: string;
  from: readonly Named[];
  value: string;
  onChoose: (id: string) => void;
}) {
  const { label, from, value, onChoose } = props;
  return (
    <label class="choice">
      <span>{label}</span>
      <select value={value} onChange={({ currentTarget }) => onChoose(currentTarget.value)}>
        {from.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </select>
    </label>
  );
}

interface Props {
  planes: readonly RoofPlane[];
  stations: readonly Station[];
  plane: string;
  station: string | null;
  onPlane: (id: string) => void;
  onStation: (id: string) => void;
}

/** Which plane, seen from which station. */
export function Choices({ planes, stations, plane, station, onPlane, onStation }: Props) {
  return (
    <div class="choices">
      <Choice label="Roof plane" from={planes} value={plane} onChoose={onPlane} />
      {station !== null && <Choice label="Station" from={stations} value={station} onChoose={onStation} />}
    </div>
  );
}
