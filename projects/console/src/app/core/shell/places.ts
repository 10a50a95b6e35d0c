import type { Permission } from '../session/permission';

export interface Place {
  readonly name: string;
  readonly path: string;
  /** Without one, anybody who is signed in may go there. */
  readonly permission?: Permission;
  /** Leaves the application: a page of the service itself. */
  readonly outside?: true;
}

export interface PlaceGroup {
  readonly name: string;
  readonly places: readonly Place[];
}

/** The navigation, in the order of the work. */
export const placeGroups: readonly PlaceGroup[] = [
  {
    name: 'Checks',
    places: [
      { name: 'Waler', path: '/checks/waler', permission: 'checks:run' },
      { name: 'Cross-section', path: '/checks/section', permission: 'checks:run' },
      { name: 'Stress', path: '/checks/stress', permission: 'checks:run' },
    ],
  },
  {
    name: 'Factors',
    places: [{ name: 'Profiles', path: '/profiles', permission: 'profiles:read' }],
  },
  {
    name: 'Service',
    places: [
      { name: 'Clients and keys', path: '/clients', permission: 'clients:read' },
      { name: 'Usage', path: '/usage', permission: 'usage:read' },
    ],
  },
  {
    name: 'For developers',
    places: [
      { name: 'API reference', path: '/docs/', outside: true },
      { name: 'Problems', path: '/problems', outside: true },
    ],
  },
];

/** What is left of the groups for one who may only some of it. */
export const placesFor = (may: (permission: Permission) => boolean): PlaceGroup[] =>
  placeGroups
    .map(({ name, places }) => ({
      name,
      places: places.filter(({ permission }) => permission === undefined || may(permission)),
    }))
    .filter(({ places }) => places.length > 0);
