import { useState } from 'preact/hooks';
import type { JsonValue } from '../../../../core/survey/json-value.ts';
import { withFacts } from '../../../../core/survey/site-fact-groups.ts';
import type { FactGroup } from '../../../../core/survey/site-facts-general.ts';
import type { SiteFact, Survey } from '../../../../core/survey/survey.ts';
import { Form } from '../../../components/form/form.tsx';
import { useDraft } from '../../../components/form/use-draft.ts';
import { TextField } from '../../../components/form/text-field.tsx';
import { addOwnChoice } from '../../../device/own-choices.ts';
import { FactField } from './fact-field.tsx';

const listOf = (value: string | string[] | undefined): string[] =>
  value === undefined ? [] : Array.isArray(value) ? value : [value];

const cleaned = (answers: string[]): string[] => answers.map((text) => text.trim()).filter(Boolean);

/** Ids of the surveyor's own facts begin so, with the group they stand in. */
export const ownPrefix = (group: FactGroup): string => `own-${group.id}-`;

/** Name of the form of a group. */
export const factForm = (group: FactGroup): string => `facts/${group.id}`;

/** Answering the facts of one group, and adding one of one's own. */
export function FactForm(props: {
  survey: Survey;
  group: FactGroup;
  newId: () => string;
  onSave: (survey: Survey) => Promise<boolean>;
  onCancel: () => void;
}) {
  const { survey, group } = props;
  const factOf = (id: string) => survey.facts?.find((fact) => fact.id === id);
  const own = (survey.facts ?? []).filter(({ id }) => id.startsWith(ownPrefix(group)));
  const ids = new Set([...group.rows, ...own].map(({ id }) => id));
  const draft = useDraft(
    {
      survey: survey.id,
      form: factForm(group),
      label: group.label,
      over: (survey.facts ?? []).filter(({ id }) => ids.has(id)) as unknown as JsonValue,
    },
    () => ({
      answers: Object.fromEntries(group.rows.map(({ id }) => [id, listOf(factOf(id)?.value)])),
      ownAnswers: Object.fromEntries(own.map(({ id, value }) => [id, listOf(value).join(', ')])),
      label: '',
      value: '',
    }),
  );
  const { change } = draft;
  const { answers, ownAnswers, label, value } = draft.typed;
  const [asked, setAsked] = useState(false);
  const labelFault = value.trim() !== '' && label.trim() === '' ? 'Say what it is.' : null;

  const save = async () => {
    setAsked(true);
    if (labelFault) return false;
    const listed = group.rows.map(({ id, several }): SiteFact => {
      const given = cleaned(answers[id] ?? []);
      return { id, value: several ? given : (given[0] ?? '') };
    });
    const changed = own.map(({ id }): SiteFact => ({ id, value: (ownAnswers[id] ?? '').trim() }));
    const added: SiteFact[] =
      value.trim() === ''
        ? []
        : [{ id: ownPrefix(group) + props.newId(), label: label.trim(), value: value.trim() }];
    const facts = withFacts(survey.facts, [...listed, ...changed, ...added]);
    if (!(await props.onSave({ ...survey, facts }))) return false;
    for (const row of group.rows)
      for (const answer of cleaned(answers[row.id] ?? []))
        if (!row.choices.includes(answer) && !listOf(factOf(row.id)?.value).includes(answer))
          addOwnChoice(row.id, answer);
    return true;
  };
  return (
    <Form label={group.label} action="Save" onSubmit={save} onCancel={props.onCancel} draft={draft.state}>
      {group.rows.map((row) => (
        <FactField
          key={row.id}
          row={row}
          stored={listOf(factOf(row.id)?.value)}
          value={answers[row.id] ?? []}
          onChange={(given) => change({ answers: { ...answers, [row.id]: given } })}
        />
      ))}
      {own.map(({ id, label: known }) => (
        <TextField
          key={id}
          label={known ?? id}
          value={ownAnswers[id] ?? ''}
          maxLength={5000}
          onInput={(text) => change({ ownAnswers: { ...ownAnswers, [id]: text } })}
        />
      ))}
      <fieldset class="fields">
        <legend>Something the list does not ask</legend>
        <TextField
          label="What it is"
          value={label}
          maxLength={200}
          onInput={(text) => change({ label: text })}
          fault={asked ? labelFault : null}
        />
        <TextField
          label="Answer"
          value={value}
          maxLength={5000}
          lines={2}
          onInput={(text) => change({ value: text })}
        />
      </fieldset>
    </Form>
  );
}
