import { attempt } from '../../../app/attempt.ts';
import { openSample } from '../../../app/actions/open-sample.ts';
import type { SampleSurvey } from '../../../app/app-services.ts';
import { useApp } from '../../app-context.ts';
import { navigate } from '../../router.ts';
import { surveyPath } from '../../survey-path.ts';

/** Invented surveys that ship with the app, each opened in one tap. */
export function SampleList({ open }: { open: boolean }) {
  const services = useApp();
  const show = (sample: SampleSurvey) =>
    attempt(services.state, async () => navigate(surveyPath(await openSample(services, sample))));
  return (
    <details class="fold" open={open}>
      <summary>Sample surveys</summary>
      <ul class="ledger">
        {services.samples.map((sample) => (
          <li key={sample.name}>
            <button type="button" class="ledger-button" onClick={() => void show(sample)}>
              {sample.title}
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
}
