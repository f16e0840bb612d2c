/** Pictures of the letter: on a phone of 390 pixels, where they fill the width, their words are over 10 pixels high. */
export const PICTURE_WIDTH = 500;
export const PICTURE_TEXT = 13.5;
