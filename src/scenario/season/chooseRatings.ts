import type { Label } from '../labelSchema.ts';
import { APPLICATIONS, CLIMATES } from './outletsOf.ts';
import type { Rating } from './seasonAnswer.ts';

/** What the user asked for; what was left open is undefined. */
export interface Wanted {
  readonly climate: Rating['climate'] | undefined;
  readonly application: Rating['application'] | undefined;
}

/** Where nothing is declared: the climate and the applications that every label shows. */
const USUAL_CLIMATE = 'average';
const USUAL_APPLICATIONS: readonly Rating['application'][] = [35, 55];

/**
 * The climates and applications to rate.
 *
 * @param label the label section of the unit file, if it has one
 * @param wanted what was chosen
 * @returns the declared ones that fit the choice; where none fits, the choice itself, completed by the average climate and
 *   the applications 35 and 55 °C. In the order of climates and applications
 */
export function chooseRatings(label: Label | undefined, { climate, application }: Wanted): Rating[] {
  const fits = (rating: Rating) =>
    (climate === undefined || rating.climate === climate) &&
    (application === undefined || rating.application === application);
  const declared = (label?.seasons ?? []).filter(fits);
  if (declared.length > 0) {
    return declared.map((season) => ({ climate: season.climate, application: season.application })).sort(inOrder);
  }
  const applications = application === undefined ? USUAL_APPLICATIONS : [application];
  return applications.map((each) => ({ climate: climate ?? USUAL_CLIMATE, application: each }));
}

function inOrder(a: Rating, b: Rating): number {
  const place = ({ climate, application }: Rating) =>
    CLIMATES.indexOf(climate) * APPLICATIONS.length + APPLICATIONS.indexOf(application);
  return place(a) - place(b);
}
