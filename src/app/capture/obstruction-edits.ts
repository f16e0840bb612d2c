import { obstructionKind } from '../../core/survey/obstruction-kinds.ts';
import type { Obstruction, ObstructionKind, Survey } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { nextOrder } from './station-edits.ts';

/** The kind's name, with a number where there are others of that name. */
export function freeName(survey: Survey, kind: ObstructionKind): string {
  const taken = new Set(survey.obstructions.map(({ name }) => name));
  const { name } = obstructionKind(kind);
  for (let number = 1; ; number++) {
    const wanted = number === 1 ? name : `${name} ${number}`;
    if (!taken.has(wanted)) return wanted;
  }
}

/** Adds an obstruction, named after its kind where no name is given; null where it could not be stored. */
export async function addObstruction(
  session: CaptureSession,
  kind: ObstructionKind,
  name: string,
): Promise<Obstruction | null> {
  const { survey } = session.record;
  const obstruction: Obstruction = {
    id: session.services.newId(),
    name: name.trim() || freeName(survey, kind),
    order: nextOrder(survey.obstructions),
    kind,
  };
  const stored = await session.record.act(
    (one) => ({ ...one, obstructions: [...one.obstructions, obstruction] }),
    { code: 'entry-added', title: obstruction.name },
  );
  return stored ? obstruction : null;
}
