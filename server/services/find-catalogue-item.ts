import { IsNull } from 'typeorm';
import type { EntityManager } from 'typeorm';
import { CatalogueItem } from '../entities/catalogue-item';
import type { CatalogueKind } from '../entities/catalogue-item';

/** A head, procedure or instrument in its present form; null when there is none of that id or it was retired. */
export async function findCatalogueItem<T>(manager: EntityManager, kind: CatalogueKind, id: string): Promise<T | null> {
  const item = await manager.findOneBy(CatalogueItem, { id, kind, retiredAt: IsNull() });
  return item ? (JSON.parse(item.body) as T) : null;
}
