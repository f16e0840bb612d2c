import { ELECTRICAL_LISTS } from '../../../../core/survey/site-facts-electrical.ts';
import { electricalList, factText } from '../../../../core/survey/site-fact-groups.ts';
import type { FactGroup, FactRow } from '../../../../core/survey/site-facts-general.ts';
import type { Survey } from '../../../../core/survey/survey.ts';
import { ChoiceField } from '../../../components/form/choice-field.tsx';
import { PhotoStrip } from '../../../components/photos/photo-strip.tsx';
import { ownPrefix } from './fact-form.tsx';
import { firmGroups } from './firm-groups.ts';

/** An answer as the firm's list shows it; without the list, as it is recorded. */
function shownText({ facts }: Survey, id: string, labels: FactRow['labels'] = {}): string {
  const value = facts?.find((fact) => fact.id === id)?.value;
  if (value === undefined) return '';
  return (Array.isArray(value) ? value : [value]).map((one) => labels[one] ?? one).join(', ');
}

function Answers({ survey, group }: { survey: Survey; group: FactGroup }) {
  const own = (survey.facts ?? []).filter(({ id }) => id.startsWith(ownPrefix(group)));
  const rows: Pick<FactRow, 'id' | 'label' | 'labels'>[] = [
    ...group.rows,
    ...own.map(({ id, label }) => ({ id, label: label ?? id })),
  ];
  return (
    <dl class="facts">
      {rows.map(({ id, label, labels }) => (
        <div key={id}>
          <dt>{label}</dt>
          <dd>
            {shownText(survey, id, labels) || <span class="faint">not looked at</span>}
            <PhotoStrip survey={survey} subject={{ kind: 'fact', id }} name={label} small />
          </dd>
        </div>
      ))}
    </dl>
  );
}

/** What the office needs to know for an order, group by group. */
export function FactGroups(props: {
  survey: Survey;
  onEdit: (group: FactGroup) => void;
  onCountry: (country: string) => void;
}) {
  const { survey } = props;
  const groups = firmGroups(survey.site);
  return (
    <>
      {groups.map((group) => {
        const answered = group.rows.filter(({ id }) => factText(survey.facts, id) !== '').length;
        return (
          <details key={group.id} class="fold">
            <summary>
              {group.label} ({answered}&nbsp;of&nbsp;{group.rows.length})
            </summary>
            <div class="stack">
              {group.id === 'electrical' && (
                <ChoiceField
                  label="Lists as usual in"
                  value={electricalList(survey.site).country}
                  options={ELECTRICAL_LISTS.map(({ country, name }) => ({ value: country, label: name }))}
                  onChoose={props.onCountry}
                />
              )}
              <p class="small">
                What is offered can be changed: <a href="/firm-lists">Firm’s lists</a>.
              </p>
              <div class="form-actions">
                <button
                  type="button"
                  aria-label={`Answer: ${group.label}`}
                  onClick={() => props.onEdit(group)}
                >
                  Answer
                </button>
              </div>
              <Answers survey={survey} group={group} />
            </div>
          </details>
        );
      })}
    </>
  );
}
