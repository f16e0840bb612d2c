import { describe, expect, it } from 'vitest';
import { withChoice } from '../../../src/ui/screens/site/facts/several-choices.ts';

describe('answers ticked one after the other', () => {
  it('adds one to those before', () => {
    expect(withChoice(['Battery'], 'Heat pump')).toEqual(['Battery', 'Heat pump']);
  });
  it('lets none stand alone', () => {
    expect(withChoice(['Battery', 'Heat pump'], 'None')).toEqual(['None']);
  });
  it('drops none when something is there after all', () => {
    expect(withChoice(['None'], 'Generator')).toEqual(['Generator']);
  });
});
