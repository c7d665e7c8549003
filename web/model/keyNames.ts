/**
 * Keys of the files, and the words that choices are made of, as people say them.
 *
 * @param known those whose name in the language is not just the key taken apart
 * @example keyNames({})('heatLoss') // 'Heat loss'
 */
export function keyNames(known: Readonly<Record<string, string>>): (word: string) => string {
  return (word) => (Object.hasOwn(known, word) ? known[word] : apart(word));
}

/** The parts of a key as words; what has a sign or stroke in it stands as it is. */
function apart(word: string): string {
  if (!/^[a-z][A-Za-z0-9]*$/.test(word)) return word;
  const words = word.replace(
    /([a-z0-9])([A-Z])/g,
    (_, before: string, after: string) => `${before} ${after.toLowerCase()}`,
  );
  return words.charAt(0).toUpperCase() + words.slice(1);
}
