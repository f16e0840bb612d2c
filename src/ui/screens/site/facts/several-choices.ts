/** The answer of a list that nothing else can stand beside. */
export const NONE = 'None';

/** The answers after one more was ticked: “None” takes the place of all others, and any other that of “None”. */
export const withChoice = (ticked: readonly string[], choice: string): string[] =>
  choice === NONE ? [NONE] : [...ticked.filter((one) => one !== NONE), choice];
