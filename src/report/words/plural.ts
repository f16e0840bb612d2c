/** Picks a word by number, as the language counts: `one`, `few`, `many`, `other`, … */
export type Plural = (
  count: number,
  forms: { other: string } & Partial<Record<Intl.LDMLPluralRule, string>>,
) => string;
