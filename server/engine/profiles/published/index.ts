import type { Departure } from '../profile';
import type { ProfileTree } from '../tree';
import { enRecommended } from './en-recommended';
import { ukNa } from './uk-na';

/** A published set of factors as the service ships it. */
export interface PublishedProfile {
  readonly slug: string;
  readonly title: string;
  readonly owner: string;
  readonly tree: ProfileTree;
  readonly departures: readonly Departure[];
}

export const publishedProfiles: readonly PublishedProfile[] = [
  {
    slug: 'en-recommended',
    title: 'Eurocodes, recommended values',
    owner: 'Published set',
    tree: enRecommended,
    departures: [],
  },
  {
    slug: 'uk-na',
    title: 'United Kingdom National Annexes',
    owner: 'Published set',
    tree: ukNa,
    departures: [],
  },
];
