import { useState } from 'preact/hooks';
import { AppError } from '../../../app/app-error.ts';
import { attempt } from '../../../app/attempt.ts';
import { useApp } from '../../app-context.ts';
import { saveBlob } from '../../device/save-file.ts';
import { canShareFiles, shareFile } from '../../device/share-file.ts';
import type { ReportForm, WrittenReport } from './report-files.ts';
import { reportFile } from './report-files.ts';

const FORMS: { form: ReportForm; label: string }[] = [
  { form: 'pdf', label: 'Save as PDF' },
  { form: 'page', label: 'Save as web page' },
  { form: 'figures-csv', label: 'Figures as CSV' },
  { form: 'figures-json', label: 'Figures as JSON' },
];

/** The ways to hand the report over. */
export function ReportActions({ written }: { written: WrittenReport | null }) {
  const { state } = useApp();
  const [busy, setBusy] = useState<string | null>(null);
  /** A file that took longer to write than a tap lasts: the next tap shares it. */
  const [waiting, setWaiting] = useState<{ of: WrittenReport; file: File } | null>(null);
  const act = async (label: string, work: () => Promise<void>) => {
    setBusy(label);
    await attempt(state, work);
    setBusy(null);
  };
  const made = (form: ReportForm) =>
    reportFile(written!, form).catch((cause: unknown) => {
      throw new AppError('report-not-written', cause);
    });
  const save = (form: ReportForm) => async () => {
    const file = await made(form);
    saveBlob(file.name, file);
  };
  const share = async () => {
    const file = waiting && waiting.of === written ? waiting.file : await made('pdf');
    const outcome = await shareFile(file);
    setWaiting(outcome === 'tap-again' ? { of: written!, file } : null);
  };
  const isReady = waiting !== null && waiting.of === written;
  return (
    <div class="report-actions">
      {canShareFiles() && (
        <button
          type="button"
          class="main"
          disabled={!written || busy !== null}
          onClick={() => void act('share', share)}
        >
          {busy === 'share' ? 'Writing…' : isReady ? 'Ready: share now' : 'Share the PDF'}
        </button>
      )}
      {FORMS.map(({ form, label }, place) => (
        <button
          key={form}
          type="button"
          class={place === 0 && !canShareFiles() ? 'main' : undefined}
          disabled={!written || busy !== null}
          onClick={() => void act(form, save(form))}
        >
          {busy === form ? 'Writing…' : label}
        </button>
      ))}
    </div>
  );
}
