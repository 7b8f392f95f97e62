/** The last row of a page: where the next one begins. */
export interface PageKey {
  at: Date;
  id: string;
}

/** A page's end as it stands in an address. */
export const printPageKey = ({ at, id }: PageKey): string => `${at.getTime().toString(36)}.${id}`;

/** Reads it back; null for what no list ever gave out. */
export function readPageKey(text: string | undefined): PageKey | null {
  const [, at, id] = /^([0-9a-z]{1,9})\.([0-9a-f-]{36})$/.exec(text ?? '') ?? [];
  return at && id ? { at: new Date(parseInt(at, 36)), id } : null;
}
