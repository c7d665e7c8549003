import type { Quantity } from './quantities.ts';

/** What a column of stamps or of parts of stamps holds. */
export type StampRole = 'year' | 'month' | 'day' | 'hour' | 'minute' | 'hourOfYear';

/** A quantity that a header seems to name; `extreme` for a daily or hourly minimum or maximum, never used unasked. */
export interface NamedQuantity {
  readonly quantity: Quantity;
  readonly extreme: boolean;
}

interface WordRule {
  readonly quantity: Quantity;
  /** Words, or parts of compound words, in English, German, French and a few other languages. */
  readonly words: RegExp;
  /** Abbreviations that must stand alone. */
  readonly whole: RegExp;
  /** Words that make it another quantity. */
  readonly unless: RegExp;
}

/** Columns about a value rather than of one. */
const ABOUT = /\b(?:flags?|quality|qc|qn|source|uncert\w*|code|std ?dev|stdev|sigma|unsicherheit|count|anzahl|trend)\b/;
const EXTREME =
  /\b(?:t ?min|t ?max|tn|tx|(?<!\d )min\w*|max\w*|low|high|lowest|highest|tief\w*|hochst\w*|spread|amplitude)\b/;

/** In this order: the first that fits is taken, so the wet bulb comes before temperature and humidity. */
const RULES: readonly WordRule[] = [
  {
    quantity: 'wetBulb',
    words: /wet ?bulb|feuchtkugel|feuchttemp|bulbe humide|bulbo umido|bulbo humedo|natte ?bol/,
    whole: /^(?:twb|t wb|wbt|twet|t wet)\b/,
    unless: /globe|depression/,
  },
  {
    quantity: 'dewPoint',
    words: /dew ?p|\bdew\b|tdew|taupunkt|rosee|rugiada|rocio|dauwpunt|daggpunkt|dugpunkt|duggpunkt|punkt rosy|rosny/,
    whole: /^(?:td|t d|tdp|dpt|t dp)\b/,
    unless: /depression|differen/,
  },
  {
    quantity: 'relativeHumidity',
    words: /humid|feucht|umidita|humedad|umidade|vochtigheid|fugtighed|fuktighet|wilgotnosc|vlhkost|hygrometr|rel ?hum/,
    whole: /^(?:rh|rf|hum|rhum|hurs|ur)\b/,
    unless: /absolut|specif|spezif|ratio|mixing|soil|boden|\bsol\b|wet|index|indoor|innen|interieur|room|raum/,
  },
  {
    quantity: 'globalRadiation',
    words: /global|solar|irradian|insolation|radiation|strahlung|rayonnement|radiazione|radiacion|straling|short ?wave/,
    whole: /^(?:ghi|glo|gh|g h|ssrd|swdown|rsds|sw in)\b/,
    unless:
      /direct|direkt|diffus|beam|normal|infra|thermal|long ?wave|terrestr|atmosph|gegen|tilt|inclin|geneigt|plane|\bpoa\b|clear ?sky|\buv|reflect|reflekt|\bnet\b|netto|illumin|\blux|duration|dauer|elevation|zenith|azimut|height|hohe|hour|time|angle|albedo|earth|warm/,
  },
  {
    quantity: 'pressure',
    words: /press|druck|presion|pressao|cisnienie|\btlak\b|barom/,
    whole: /^(?:sp|pres|ps|qfe|patm|p atm)\b/,
    unless: /vapo|dampf|vapeur|msl|sea ?level|\bsea\b|meer|\bmer\b|reduc|reduz|\bslp\b|\bqff\b|\bqnh\b|tendenc/,
  },
  {
    quantity: 'temperature',
    words: /temper|\btemp\b|temp$|dry ?bulb|trockenkugel|bulbe sec|bulbo sec|teplota|lampotila|homerseklet/,
    whole: /^(?:t|ta|tt|tl|te|tas|tdb|dbt|tair|tamb|tout|text|tdry|t2m|temp\w*|tavg|tmean|tm|tmin|tmax|tn|tx)\b/,
    unless:
      /soil|boden|ground|erdreich|\berd|surface|oberflach|water|wasser|\beau\b|\bsky\b|himmel|indoor|innen|interieur|room|raum|zone|supply|\bflow\b|vorlauf|return|rucklauf|apparent|feels|gefuhlt|\bfelt\b|chill|index|ressenti|panel|module|modul|\bcell\b|grass|gras|\bsea\b|potential|virtual|globe|brightness/,
  },
];

/** A bare letter is believed only with its unit: `p` and `g` also stand for other things. */
const LETTERS: readonly (readonly [Quantity, RegExp])[] = [
  ['pressure', /^\s*p\s*[^a-z\d]*\s*(?:[hk]?pa|mbar)/i],
  ['globalRadiation', /^\s*g\s*[^a-z\d]*\s*(?:k?wh?|kj)\s*[/ ]/i],
];

/**
 * A header without case, accents and signs: words divided by single blanks.
 *
 * @example plainWords('relHum_2m [%]') // 'rel hum 2m'
 */
export function plainWords(header: string): string {
  return header
    .replace(/([a-z])([A-Z][a-z])/g, '$1 $2')
    .toLowerCase()
    .replace(/ß/g, 'ss')
    .normalize('NFD')
    .replace(/[\u0300-\u036f]/g, '')
    .replace(/^g\s*\(h\)/, 'ghi')
    .replace(/[[({][^\])}]*[\])}]?/g, ' ')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

/**
 * The quantity that a header names.
 *
 * @param header text of a header cell
 * @returns nothing where it names none of those of use here
 * @example quantityOf('Außentemperatur [°C]')?.quantity // 'temperature'
 */
export function quantityOf(header: string): NamedQuantity | undefined {
  const plain = plainWords(header.slice(0, 200));
  if (ABOUT.test(plain)) return undefined;
  const letter = LETTERS.find(([, words]) => words.test(header));
  if (letter) return { quantity: letter[0], extreme: false };
  for (const { quantity, words, whole, unless } of RULES) {
    if ((words.test(plain) || whole.test(plain)) && !unless.test(plain)) {
      return { quantity, extreme: EXTREME.test(plain) };
    }
  }
  return undefined;
}

const STAMP_ROLES: readonly (readonly [StampRole, RegExp])[] = [
  ['hourOfYear', /^(?:hour ?of ?(?:the )?year|hoy|stunde des jahres|jahresstunde|heure de l annee|ora dell anno)$/],
  ['year', /^(?:year|yr|yyyy|jahr|annee|an|anno|ano|jaar|ar|rok)$/],
  ['month', /^(?:month|mon|mo|mm|monat|mois|mese|mes|maand|manad|maned|miesiac)$/],
  ['day', /^(?:day|dd|day of month|tag|jour|giorno|dia|dag|dzien)$/],
  ['hour', /^(?:hour|hours|hr|hh|h|stunde|std|heure|ora|hora|uur|time|hour of day|zeit|uhrzeit|tid|timme|godzina)$/],
  ['minute', /^(?:minute|minutes|min|mn|mi|minuten|minuto|minuut)$/],
];

/** The part of a stamp that a header names, where its column holds numbers. */
export function stampRoleOf(header: string): StampRole | undefined {
  const plain = plainWords(header.slice(0, 200));
  return STAMP_ROLES.find(([, words]) => words.test(plain))?.[0];
}

/** Whether a header names the stamp of a row. */
export function namesStamp(header: string): boolean {
  return /\b(?:time|date|datetime|timestamp|stamp|datum|zeit|uhrzeit|zeitstempel|horodatage|heure|fecha|hora|data|ora|tijd|tid|dato)\b|datum$/.test(
    plainWords(header.slice(0, 200)),
  );
}

/** Whether a header names the station of a row. */
export function namesStation(header: string): boolean {
  return /^(?:stations?|stations? ?(?:id|no|nr|name|number|nummer|code)|site|wmo|wmo ?id|usaf|location|standort|ort)$/.test(
    plainWords(header.slice(0, 200)),
  );
}

/**
 * Offset from UTC that the header of the stamps names, such as `time(UTC)` or `Zeit UTC+1`.
 *
 * @returns minutes, or nothing
 * @example offsetOfHeader('time (UTC+05:30)') // 330
 */
export function offsetOfHeader(header: string): number | undefined {
  const match = /(?:^|[^a-z])(?:utc|gmt)\s*(?:([+\-−])\s*(\d{1,2})(?::?(\d{2}))?)?(?![a-z\d])/i.exec(
    header.slice(0, 200),
  );
  if (!match) return undefined;
  const minutes = Number(match[2] ?? 0) * 60 + Number(match[3] ?? 0);
  if (minutes > 840) return undefined;
  return match[1] === undefined || match[1] === '+' ? minutes : -minutes;
}
