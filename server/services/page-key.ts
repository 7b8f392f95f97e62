/** The last row of a page: where the next one begins. */
export interface PageKey {
  at: Date;
  id: string;
}

/** A page's end as it stands in an address. */
export const printPageKey = ({ at, id }: PageKey): string => `${at.getTime().toString(36)}.${id}`;

/** Reads it back; null for what no list ever gave out. */
export function readPageKey(text: string | undefined): PageKey | null {
  const match = /^([0-9a-z]{1,11})\.([0-9a-f-]{36})$/.exec(text ?? '');
  const at = new Date(parseInt(match?.[1] ?? '', 36));
  return match?.[2] && !Number.isNaN(at.getTime()) ? { at, id: match[2] } : null;
}
