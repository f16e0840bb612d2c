import { useState } from 'preact/hooks';
import type { SectionProps } from '../../section.ts';
import { Fault } from '../shade/fault.tsx';
import { Working } from '../shade/working.tsx';
import type { ComparedChoice } from './compared-choice.ts';
import { ComparedField } from './compared-field.tsx';
import { FirmForm } from './firm-form.tsx';
import { ReportActions } from './report-actions.tsx';
import { ReportPreview } from './report-preview.tsx';
import { ThresholdsForm } from './thresholds-form.tsx';
import { useEvidence } from './use-evidence.ts';
import { useSettings } from './use-settings.ts';
import { useWrittenReport } from './use-written-report.ts';
import { WritingChoices } from './writing-choices.tsx';
import './report.css';

/** The letter for the homeowner with its evidence: as it will be read, and the ways to hand it over. */
export function ReportSection({ survey, services }: SectionProps) {
  const [settings, change] = useSettings(services);
  const [beside, setBeside] = useState<ComparedChoice | null>(null);
  const { working, fault, made, cancel, retry } = useEvidence(services, survey, beside);
  const written = useWrittenReport(services, survey, made, settings);
  const hasPlane = survey.planes.length > 0;
  if (!hasPlane)
    return (
      <div class="stack">
        <h2>Report</h2>
        <p>A report needs a roof plane. Add one under Roof, then a station that looks out from it.</p>
      </div>
    );
  return (
    <div class="report">
      <h2 class="visually-hidden">Report</h2>
      <ReportActions written={written} />
      <Working working={working} onCancel={cancel} />
      {fault && <Fault fault={fault} onRetry={retry} />}
      {settings && (
        <details class="report-settings">
          <summary>Language, letterhead, comparison</summary>
          <div class="stack">
            <WritingChoices settings={settings} onChange={change} />
            <ComparedField survey={survey} services={services} choice={beside} onChoose={setBeside} />
            <FirmForm firm={settings.firm} onSave={(firm) => change({ ...settings, firm })} />
            <ThresholdsForm
              thresholds={settings.thresholds}
              onSave={(thresholds) => change({ ...settings, thresholds })}
            />
          </div>
        </details>
      )}
      {written && <ReportPreview contents={written.contents} title="The report as it will be read" />}
      {!written && !fault && <p role="status">Writing the report…</p>}
    </div>
  );
}
