import type { Client } from '../../../db/models';

/** `{ "uk-na": 1 }` as the API writes it: `["uk-na@1"]`. */
const pinList = (pins: Readonly<Record<string, number>>): string[] =>
  Object.entries(pins).map(([slug, revision]) => `${slug}@${revision}`);

/** A client as the API gives it. */
export function toClient(row: Client, liveKeys: number) {
  const { id, name, defaultProfile, pins, createdAt, disabledAt } = row;
  return { id, name, defaultProfile, pins: pinList(pins), createdAt, disabledAt, liveKeys };
}

export type ClientBody = ReturnType<typeof toClient>;

export const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;
