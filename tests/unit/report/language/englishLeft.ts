/** Words that English prose can hardly do without and that no German sentence, key of a file or name holds. */
const ENGLISH =
  /\b(the|is|of|and|or|to|it|with|this|that|not|by|for|are|than|least|most|between|lies|rows?|columns?|lines?|hours?|minutes?|write|entries|letters|missing|perhaps|meant|known|number|which|where|when|whose|its|has|have|heat|house|water)\b/;

/** The first English word of a text, without what it quotes and without the keys of files and words between blanks that it names. */
export function englishLeft(text: string): string | undefined {
  const prose = text
    .replace(/'[^']*'|“[^”]*”|„[^“]*“|<[^>]*>/g, ' ')
    .replace(/[\w[\]]+(?:[.:][\w[\]]+)+|--\w+|\w+:(?= )/g, ' ');
  return ENGLISH.exec(prose)?.[0];
}
