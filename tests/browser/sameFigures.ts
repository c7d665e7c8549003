const NUMBER = /-?\d+(?:\.\d+)?(?:e[-+]?\d+)?/g;

/**
 * Engines of JavaScript may differ in the last digits of powers and exponentials, which the language leaves open; so what a
 * browser and node write of the same files may differ by so much, and in nothing else.
 */
const TOLERANCE = 1e-11;

/** First difference of two texts beside the last digits of their numbers; undefined where there is none. */
export function difference(text: string, expected: string): string | undefined {
  const [words, expectedWords] = [text.split(NUMBER), expected.split(NUMBER)];
  const word = words.findIndex((each, i) => each !== expectedWords[i]);
  if (word >= 0 || words.length !== expectedWords.length) return `'${words[word]}' is not '${expectedWords[word]}'`;
  const [numbers, expectedNumbers] = [text.match(NUMBER) ?? [], expected.match(NUMBER) ?? []];
  const at = numbers.findIndex((each, i) => {
    const other = expectedNumbers[i];
    const size = Math.max(1, Math.abs(Number(other)));
    return each !== other && !(Math.abs(Number(each) - Number(other)) <= TOLERANCE * size);
  });
  return at < 0 ? undefined : `${numbers[at]} is not ${expectedNumbers[at]}`;
}
