/**
 * A phrase of a problem: its English form, and the German one. In the German form `$1` is a part as it stands, `#1` a
 * number with a decimal comma, `%1` a part that is a phrase itself, `&1` a list whose last word is joined in German, `@1`
 * the sentence of a field.
 */
export type Phrase = readonly [english: RegExp, german: string];

/** How entries are written, and cures; whole sentences stand before the patterns that would match a part of them. */
export const writtenPhrases: readonly Phrase[] = [
  // cures of entries
  [/^add it: (.+)$/s, 'ergänzen Sie es: @1'],
  [/^add it$/, 'ergänzen Sie es'],
  [/^perhaps (.+) is meant$/s, 'vielleicht ist $1 gemeint'],
  [/^(.+) goes with (\S+): (.+)$/s, '$1 gehört zu $2: &3'],
  [
    /^write a list: \[a, b\], or each entry on a line of its own behind “- ”$/,
    'schreiben Sie eine Liste: [a, b], oder jeden Eintrag in eine eigene Zeile hinter „- “',
  ],
  [/^write its keys on the lines below, indented$/, 'schreiben Sie seine Schlüssel eingerückt in die Zeilen darunter'],
  [/^write one number$/, 'schreiben Sie eine Zahl'],
  [/^write a number$/, 'schreiben Sie eine Zahl'],
  [/^write a number; the unit is (.+)$/, 'schreiben Sie eine Zahl; die Einheit ist %1'],
  [/^write (\S+), without a unit; the unit is (.+)$/, 'schreiben Sie $1 ohne Einheit; die Einheit ist %2'],
  [/^write (\S+), without a unit$/, 'schreiben Sie $1 ohne Einheit'],
  [/^write (\S+), with a decimal point$/, 'schreiben Sie in der Datei $1, mit einem Dezimalpunkt'],
  [/^write (\S+), as a plain number$/, 'schreiben Sie $1, als einfache Zahl'],
  [/^write (\S+) for (.+)$/s, 'schreiben Sie $1 für $2'],
  [/^the table is in kW: write (\S+) for (.+)$/, 'die Tabelle ist in kW: Schreiben Sie $1 für $2'],
  [/^heat given per electricity taken: write 4 for 400 %$/, 'Wärme je aufgenommenem Strom: Schreiben Sie 4 für 400 %'],
  [/^write ('?[\d:-]+'?)$/, 'schreiben Sie $1'],
  [/^put it in quotes: (.+)$/s, 'setzen Sie es in Anführungszeichen: $1'],
  [/^put it in quotes$/, 'setzen Sie es in Anführungszeichen'],
  [/^named in (.+) under (.+)$/s, 'genannt in $1 unter $2'],
  [/^name a file that holds the one table alone$/, 'nennen Sie eine Datei, die nur diese eine Tabelle enthält'],
  [
    /^its own run takes electricity as free by the hour: read its cost with care$/,
    'seine eigene Rechnung nimmt Strom in der Stunde als kostenlos: Lesen Sie seine Kosten mit Vorsicht',
  ],
  [
    /^choose one, such as '(.+)', or leave them out with '(.+)'$/,
    'wählen Sie eine, etwa „$1“, oder lassen Sie sie mit „$2“ weg',
  ],
  [/^take a larger step, or a shorter range$/, 'nehmen Sie einen größeren Schritt oder eine kürzere Spanne'],
  [
    /^for weather, name the column by '(.+)'; for other tables .+$/,
    'nennen Sie bei Wetter die Spalte mit „$1“; bei anderen Tabellen schreiben Sie die Einheit in ihren Namen: EUR/kWh ein Preis, g/kWh Kohlendioxid, kWh ein Zähler',
  ],
  [/^choose one, such as '(.+)'$/, 'wählen Sie eine, etwa „$1“'],

  // cures of the writing
  [
    /^indent with spaces; a tab may not stand in front of a key$/,
    'rücken Sie mit Leerzeichen ein; ein Tabulator darf nicht vor einem Schlüssel stehen',
  ],
  [
    /^give each key its own line, .+$/,
    'geben Sie jedem Schlüssel eine eigene Zeile, alle Schlüssel eines Abschnitts gleich weit eingerückt; setzen Sie einen Text, der einen Doppelpunkt enthält, in Anführungszeichen',
  ],
  [
    /^write a colon and a space after the key$/,
    'schreiben Sie hinter den Schlüssel einen Doppelpunkt und ein Leerzeichen',
  ],
  [
    /^look for a quote, bracket or colon .+$/,
    'suchen Sie ein Anführungszeichen, eine Klammer oder einen Doppelpunkt, der hier oder in einer Zeile darüber fehlt',
  ],
  [
    /^look for a stray character, .+$/,
    'suchen Sie ein überzähliges Zeichen, oder setzen Sie den ganzen Text in doppelte Anführungszeichen',
  ],
  [
    /^indent the lines of one section alike, .+$/,
    'rücken Sie die Zeilen eines Abschnitts gleich weit ein, und schließen Sie jede Klammer',
  ],
  [/^put the text in double quotes$/, 'setzen Sie den Text in doppelte Anführungszeichen'],
  [
    /^use single quotes for a text with a backslash$/,
    'nehmen Sie einfache Anführungszeichen für einen Text mit umgekehrtem Schrägstrich',
  ],
  [
    /^put a text that begins with \* or & in double quotes$/,
    'setzen Sie einen Text, der mit * oder & beginnt, in doppelte Anführungszeichen',
  ],
  [
    /^no row of a table may be indented less .+$/,
    'keine Zeile einer Tabelle darf weniger eingerückt sein als ihre erste: Schreiben Sie ein Wort wie „outdoor“ in ihre Ecke',
  ],

  // what may stand at an entry
  [/^it is true or false$/, 'es ist true (ja) oder false (nein)'],
  [/^it is a (whole )?number$/, 'es ist eine Zahl%1'],
  [/^whole $/, ' ohne Nachkommastellen'],
  [/^it is a number from 0 with a decimal (point|comma)$/, 'es ist eine Zahl ab 0 mit Dezimal%1'],
  [/^a number with a decimal (point|comma), (.+)$/, 'eine Zahl mit Dezimal%1, %2'],
  [/^point$/, 'punkt'],
  [/^comma$/, 'komma'],
  [/^up to a million per kWh$/, 'bis eine Million je kWh'],
  [/^from (\S+) to (\S+) (\S+) a step$/, 'von #1 bis #2 $3 je Zeitschritt'],
  [/^from (\S+) to (\S+) (\S+)$/, 'von #1 bis #2 $3'],
  [/^it is x, or empty$/, 'es ist x oder leer'],
  [/^it is one of (.+)$/s, 'es ist eines von &1'],
  [
    /^(it is a (?:text|list|section|number).*?|it is written .+?|it is the name of a file|.+? lies between \S+ and [^,]+), or (.+)$/s,
    '%1, oder %2',
  ],
  [/^it is a list of (\d+) numbers, such as (.+)$/, 'es ist eine Liste von $1 Zahlen, etwa $2'],
  [/^it is a list of at most (\d+) entries$/, 'es ist eine Liste mit höchstens $1 Einträgen'],
  [/^it is a list of at least (\d+) entries$/, 'es ist eine Liste mit mindestens $1 Einträgen'],
  [/^it is a list of (\d+) to (\d+) entries$/, 'es ist eine Liste mit $1 bis $2 Einträgen'],
  [/^it is a list of (\d+) entries$/, 'es ist eine Liste mit $1 Einträgen'],
  [/^it is a section whose (\S+) is one of (.+)$/, 'es ist ein Abschnitt, dessen Angabe $1 eines von &2 ist'],
  [/^it is a section with (.+)$/, 'es ist ein Abschnitt mit &1'],
  [/^it is the name of a file$/, 'es ist der Name einer Datei'],
  [/^it is a text of at most (\d+) letters$/, 'es ist ein Text von höchstens $1 Zeichen'],
  [/^it is written as three capital letters, such as EUR$/, 'es sind drei Großbuchstaben, etwa EUR'],
  [/^it is written as a table behind “\|”$/, 'es ist eine Tabelle hinter „|“'],
  [
    /^it is written as keys joined by points, .+$/,
    'es sind Schlüssel mit Punkten dazwischen, Plätze in Listen in Klammern ab 0',
  ],
  [/^it is written (.+)$/, 'man schreibt es &1'],
  [/^it must lie above (.+) \((.+)\)$/, 'es muss über %1 liegen (#2)'],
  [/^it must lie below (.+) \((.+)\)$/, 'es muss unter %1 liegen (#2)'],
  [/^it must not lie below (.+) \((.+)\)$/, 'es darf nicht unter %1 liegen (#2)'],
  [/^(.+) is a whole number between (\S+) and (.+)$/, '%1 ist eine ganze Zahl zwischen #2 und %3'],
  [/^(.+) lies between (\S+) and (.+)$/, '%1 liegt zwischen #2 und %3'],
  [/^(\S+) per (.+)$/, '#1 je $2'],
  [/^per (.+)$/, 'je $1'],
  [/^it is ([^ ]+(?: or [^ ]+)*)$/, 'es ist &1'],
];
