import { fieldPlaces } from '../fieldPlaces.ts';
import { fieldsOfFiles } from './fieldsOfFiles.ts';
import { fieldsOfHouse } from './fieldsOfHouse.ts';
import { fieldsOfPlant } from './fieldsOfPlant.ts';

/** What every entry means, in German, by its place. */
export const germanFields: Readonly<Record<string, string>> = { ...fieldsOfHouse, ...fieldsOfPlant, ...fieldsOfFiles };

/** The sentence of a field in German; a sentence of no known field stays as it is. */
export function germanField(says: string): string {
  const place = fieldPlaces().get(says);
  return place === undefined || !Object.hasOwn(germanFields, place) ? says : germanFields[place];
}
