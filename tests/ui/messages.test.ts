import { describe, expect, it } from 'vitest';
import { APP_ERROR_CODES } from '../../src/app/app-error.ts';
import { ERROR_MESSAGES, noticeText, sizeText } from '../../src/ui/messages.ts';

describe('messages', () => {
  it.each(APP_ERROR_CODES)('say what happened and what to do: %s', (code) => {
    const { what, remedy } = ERROR_MESSAGES[code];
    expect(what).toMatch(/^[A-Z].*\.$/);
    expect(remedy).toMatch(/^[A-Z].*\.$/);
  });

  it('name the survey they are about', () => {
    expect(noticeText({ code: 'survey-deleted', title: 'Mill lane' })).toBe('“Mill lane” is deleted.');
  });

  it.each([
    [0, '0 bytes'],
    [999, '999 bytes'],
    [1500, '1.5 kB'],
    [20_000_000, '20 MB'],
    [11_400_000_000, '11 GB'],
  ])('give %d bytes in words', (bytes, text) => expect(sizeText(bytes)).toBe(text));
});
