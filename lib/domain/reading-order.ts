const RIGHT_TO_LEFT = /[\p{Script=Arabic}\p{Script=Hebrew}\p{Script=Syriac}\p{Script=Thaana}\p{Script=Nko}]/u;

/**
 * A name as it stands before a figure in an English heading. A name in a script written from right to left is
 * followed by a left-to-right mark, so that its figure is not drawn on the other side of it; others stay as they are.
 *
 * @example
 * beforeFigure('Alder'); // => 'Alder'
 * beforeFigure('\u05d0\u05dc\u05d5\u05df'); // => '\u05d0\u05dc\u05d5\u05df\u200e'
 */
export function beforeFigure(name: string): string {
  return RIGHT_TO_LEFT.test(name) ? `${name}\u200e` : name;
}
