/** One part of the work at a point: readings by their keys, a photo (null: all that are left), or an act. */
export type Part = { read: RegExp } | { shot: string | null } | { act: string };

export const act = (name: string): Part => ({ act: name });
export const read = (pattern: RegExp): Part => ({ read: pattern });
export const shot = (name: string): Part => ({ shot: name });

/**
 * The order that a definition gives, to its end: whatever it does not name is read and photographed last, in the order
 * of the form.
 */
export const wholeOrder = (order: readonly Part[] = []): readonly Part[] => [...order, read(/./), { shot: null }];
