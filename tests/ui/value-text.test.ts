import { describe, expect, it } from 'vitest';
import { degreesText, percentText, placeText } from '../../src/ui/value-text.ts';

describe('values in words', () => {
  it('give a place with its hemispheres', () => {
    expect(placeText(-33.8688, 151.2093)).toBe('33.8688° S, 151.2093° E');
    expect(placeText(44.91, -72.2)).toBe('44.9100° N, 72.2000° W');
  });

  it('show what is not known as a dash, never as a number', () => {
    expect(degreesText(undefined)).toBe('–');
    expect(degreesText(131.25)).toBe('131.3°');
  });

  it('keep the percent sign with its number', () => {
    expect(percentText(0.155)).toBe('16\u00a0%');
  });
});
