/** Pixels: low enough to leave the section its room on a phone. */
export const STRIP_HEIGHT = 72
