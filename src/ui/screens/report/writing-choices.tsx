import type { ReportSettings } from '../../../app/report-settings.ts';
import { LANGUAGES } from '../../../report/words/languages.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { languageOf } from './use-written-report.ts';

const UNITS = [
  { value: 'metric', label: 'Metres' },
  { value: 'us', label: 'Feet and inches' },
] as const;
const PAPERS = [
  { value: 'a4', label: 'A4' },
  { value: 'letter', label: 'Letter' },
] as const;

/** How the report is written: its language, its units, its paper. */
export function WritingChoices(props: {
  settings: ReportSettings;
  onChange: (settings: ReportSettings) => void;
}) {
  const { settings, onChange } = props;
  return (
    <div class="report-choices">
      <ChoiceField
        label="Language"
        value={languageOf(settings.language)}
        options={LANGUAGES.map(({ id, name }) => ({ value: id, label: name }))}
        onChoose={(language) => onChange({ ...settings, language })}
      />
      <ChoiceField
        label="Lengths in"
        value={settings.units}
        options={UNITS}
        onChoose={(units) => onChange({ ...settings, units })}
      />
      <ChoiceField
        label="Paper"
        value={settings.paper}
        options={PAPERS}
        onChoose={(paper) => onChange({ ...settings, paper })}
      />
    </div>
  );
}
