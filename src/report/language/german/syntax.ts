/** What the parser of YAML stumbles over, by how its own messages begin. */
const faults: readonly (readonly [RegExp, string])[] = [
  [/^All (?:mapping|sequence) items must start at the same column/, 'nicht alle Einträge beginnen in derselben Spalte'],
  [/^Nested mappings are not allowed/, 'ein Abschnitt steht in der Zeile eines anderen'],
  [/^Implicit (?:keys|map keys?) need/, 'ein Schlüssel braucht einen Doppelpunkt in seiner eigenen Zeile'],
  [
    /^(?:Missing closing|Flow .* must end|Expected .* to end with|Map in flow|Sequence in flow)/,
    'ein Zeichen zum Schließen fehlt',
  ],
  [/^Missing , /, 'zwischen zwei Einträgen fehlt ein Komma'],
  [/^(?:Unexpected|Source contains)/, 'hier steht etwas, das nicht erwartet wird'],
  [/^Tabs are not allowed/, 'ein Tabulator steht in der Einrückung'],
  [/^Plain value cannot start with/, 'ein Wert beginnt mit einem Zeichen, das eine andere Bedeutung hat'],
  [/^Invalid escape/, 'ein umgekehrter Schrägstrich steht in doppelten Anführungszeichen'],
  [/^Alias/, 'ein Verweis hat keinen Namen'],
];

/** A message of the YAML parser, in German. */
export function germanSyntax(message: string): string {
  return faults.find(([english]) => english.test(message))?.[1] ?? 'die Schreibweise ist nicht die von YAML';
}
