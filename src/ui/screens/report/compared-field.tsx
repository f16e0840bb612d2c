import { useEffect, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import type { SurveySummary } from '../../../app/survey-store.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import type { ComparedChoice } from './compared-choice.ts';

const NOTHING = '';

/** What the report is set beside: nothing, this survey without one obstruction, or another survey on this device. */
export function ComparedField(props: {
  survey: Survey;
  services: AppServices;
  choice: ComparedChoice | null;
  onChoose: (choice: ComparedChoice | null) => void;
}) {
  const { survey, services, choice, onChoose } = props;
  const [others, setOthers] = useState<SurveySummary[]>([]);
  useEffect(() => {
    services.store.list().then(
      (list) => setOthers(list.filter(({ id, deletedAt }) => id !== survey.id && deletedAt === null)),
      () => setOthers([]),
    );
  }, [services, survey.id]);
  const options = [
    { value: NOTHING, label: 'Nothing' },
    ...ordered(survey.obstructions).map(({ id, name }) => ({
      value: `without ${id}`,
      label: `This survey without: ${name}`,
    })),
    ...others.map(({ id, title }) => ({ value: `survey ${id}`, label: `Survey: ${title}` })),
  ];
  return (
    <ChoiceField
      label="Set beside"
      value={valueOf(choice)}
      options={options}
      onChoose={(value) => onChoose(choiceOf(value))}
      hint="An earlier visit of the same site, or this one with something gone."
    />
  );
}

const valueOf = (choice: ComparedChoice | null): string =>
  choice === null
    ? NOTHING
    : choice.kind === 'without'
      ? `without ${choice.obstruction}`
      : `survey ${choice.id}`;

function choiceOf(value: string): ComparedChoice | null {
  const [, kind, id] = /^(without|survey) (.*)$/s.exec(value) ?? [];
  if (id === undefined) return null;
  return kind === 'without' ? { kind, obstruction: id } : { kind: 'survey', id };
}
