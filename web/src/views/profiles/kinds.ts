import type { JsonObject } from '../../api/profiles';
import type { ProfileKind } from '../../api/planner';
import type { Field } from '../../forms/fields';
import { newSpacecraft, spacecraftFields } from '../../forms/spacecraftFields';
import { newStation, stationFields } from '../../forms/stationFields';

/** What differs between the pages of stations and of spacecraft. */
export interface ProfileWords {
  readonly path: string;
  readonly title: string;
  readonly one: string;
  readonly none: string;
  readonly about: string;
  readonly fields: readonly Field[];
  readonly make: () => JsonObject;
}

export const profileWords: Record<ProfileKind, ProfileWords> = {
  stations: {
    path: '/stations', title: 'Stations', one: 'station', none: 'No stations yet',
    about: 'A station is a place with its horizon and one antenna or more.', fields: stationFields, make: newStation,
  },
  spacecraft: {
    path: '/spacecraft', title: 'Spacecraft', one: 'spacecraft', none: 'No spacecraft yet',
    about: 'A spacecraft has radios, an attitude, and element sets that say where it is.', fields: spacecraftFields, make: newSpacecraft,
  },
};
