import { Markup, markup } from './markup.ts';

/** What a chart is called and what it shows, for those who do not see it. */
export interface ChartText {
  /** Letters, digits and hyphens; unlike any other of the page. */
  readonly id: string;
  readonly title: string;
  readonly description: string;
}

/** Every chart is drawn this wide: as wide as a phone, two beside each other on paper. */
export const CHART_WIDTH = 360;

/** Room around the drawing for axes and labels. */
export interface Margins {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/**
 * A drawing with its title and description, which a screen reader reads in its stead.
 *
 * @param text what it is called and shows
 * @param height in the units of `CHART_WIDTH`
 * @param parts of the drawing, the first below the others
 */
export function chartFrame(text: ChartText, height: number, parts: readonly Markup[]): Markup {
  const { id, title, description } = text;
  return markup`<svg class="chart" viewBox="0 0 ${CHART_WIDTH} ${height}" role="img" aria-labelledby="${id}-title ${id}-says"><title id="${id}-title">${title}</title><desc id="${id}-says">${description}</desc>${parts}</svg>`;
}

/** Markup one after the other. */
export function together(parts: readonly Markup[]): Markup {
  return new Markup(parts.map(({ text }) => text).join(''));
}
