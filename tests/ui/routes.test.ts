import { describe, expect, it } from 'vitest';
import { placeOf, PLAIN_SCREENS, SURVEY_SECTIONS } from '../../src/ui/routes.ts';
import { surveyPath } from '../../src/ui/survey-path.ts';

describe('addresses', () => {
  it.each(SURVEY_SECTIONS.map(({ path }) => path))(
    'lead to the section "%s" of a survey and back',
    (path) => {
      for (const id of ['plain', 'with space', 'a/b', '50%', 'dächer']) {
        const place = placeOf(surveyPath(id, path));
        expect(place).toMatchObject({ screen: 'survey', id, section: { path } });
      }
    },
  );

  it.each(PLAIN_SCREENS.map(({ path }) => path))('lead to the screen %s', (path) => {
    expect(placeOf(path)).toMatchObject({ screen: 'plain', plain: { path } });
  });

  it('lead to the list', () => {
    expect(placeOf('/')).toEqual({ screen: 'list' });
    expect(placeOf('/index.html')).toEqual({ screen: 'list' });
  });

  it.each(['/survey', '/survey/', '/survey/a/b/c', '/survey/a/nothing', '/survey/%E0%A4%A', '/other'])(
    'that name nothing lead nowhere: %s',
    (path) => expect(placeOf(path)).toEqual({ screen: 'nowhere' }),
  );
});
