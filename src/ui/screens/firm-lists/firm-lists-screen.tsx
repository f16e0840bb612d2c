import { useState } from 'preact/hooks';
import {
  builtInRow,
  firmChoices,
  isBuiltIn,
  isChanged,
  withChoices,
  withoutList,
  type FactLists,
} from '../../../core/survey/fact-lists.ts';
import { electricalList } from '../../../core/survey/site-fact-groups.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { ScreenHeading } from '../../components/screen-heading.tsx';
import { AddChoice } from './add-choice.tsx';
import { ChoiceRows } from './choice-rows.tsx';
import { ListFiles } from './list-files.tsx';
import { countries, isByCountry, listKey, questions } from './list-key.ts';
import { useLists, type ListsEditing } from './use-lists.ts';
import './firm-lists.css';

/** Where the device is, as far as its clock tells. */
const deviceCountry = () =>
  electricalList({ timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone }).country;

/** Which lists a firm has changed, so that they are found again. */
function Changed(props: { lists: FactLists; onOpen: (fact: string, country?: string) => void }) {
  const { lists } = props;
  if (lists.lists.length === 0)
    return <p>No list is changed: what Noonmark brings is offered. Choose one and make it yours.</p>;
  return (
    <ul class="ledger" aria-label="Changed lists">
      {lists.lists.map(({ fact, country }) => (
        <li key={`${country} ${fact}`}>
          <button
            type="button"
            class="ledger-button"
            disabled={!builtInRow({ fact, country })}
            onClick={() => props.onOpen(fact, country)}
          >
            {[
              builtInRow({ fact, country })?.label ?? `${fact}, not asked by this version`,
              country && (countries.find(({ value }) => value === country)?.label ?? country),
            ]
              .filter(Boolean)
              .join(', ')}
          </button>
        </li>
      ))}
    </ul>
  );
}

/** What was done last, and the way back. */
function Told({ editing }: { editing: ListsEditing }) {
  const { told, takeBack, isUnkept } = editing;
  return (
    <div class="row firm-told">
      <p role="status" class="grow">
        {told}
      </p>
      {isUnkept && (
        <p role="alert" class="field-fault">
          This browser did not store the change: it holds until Noonmark is closed. Export the lists, free
          some space, and import them again.
        </p>
      )}
      <button type="button" disabled={!takeBack} onClick={() => takeBack?.()}>
        Take back
      </button>
    </div>
  );
}

/** The answers that are offered for the facts of a site, as a firm wants them. */
export function FirmListsScreen() {
  const editing = useLists();
  const { lists, change } = editing;
  const [fact, setFact] = useState(questions[0].value);
  const [country, setCountry] = useState(deviceCountry);
  const key = listKey(fact, country);
  const choices = firmChoices(lists, key);
  const open = (opened: string, of?: string) => {
    setFact(opened);
    if (of !== undefined) setCountry(of);
  };
  return (
    <div class="stack firm-lists">
      <ScreenHeading title="Firm’s lists" />
      <p>
        Answers that are offered where a survey asks for the roof, the access and the electrical service. They
        spare typing and settle nothing: what holds stands on the meter and the board, in local codes and the
        grid operator’s rules, and is judged by a licensed electrician.
      </p>
      <h2>Changed lists</h2>
      <Changed lists={lists} onOpen={open} />
      <h2>A list</h2>
      <div class="form">
        <ChoiceField label="Asked is" value={fact} options={questions} onChoose={setFact} />
        {isByCountry(fact) && (
          <ChoiceField label="Country" value={country} options={countries} onChoose={setCountry} />
        )}
      </div>
      <Told editing={editing} />
      {choices.every(({ hidden }) => hidden) && (
        <p class="field-fault">No answer is offered: surveyors write their own.</p>
      )}
      <ChoiceRows
        key={JSON.stringify(key)}
        choices={choices}
        isBuiltIn={(value) => isBuiltIn(key, value)}
        onChange={(after, done) => change(withChoices(lists, key, after), done)}
      />
      <AddChoice
        key={`add ${JSON.stringify(key)}`}
        choices={choices}
        onAdd={(choice) =>
          change(withChoices(lists, key, [choice, ...choices]), `“${choice.value}” is added.`)
        }
      />
      <div>
        <button
          type="button"
          disabled={!isChanged(lists, key)}
          onClick={() => change(withoutList(lists, key), 'The list is as it comes with Noonmark.')}
        >
          Reset this list
        </button>
      </div>
      <ListFiles editing={editing} />
    </div>
  );
}
