import { IsNull } from 'typeorm';
import type { Head } from '../../shared/job/plan';
import { CatalogueItem } from '../entities/catalogue-item';
import type { AppDeps } from './deps';

/** The casing heads that are not retired, by name. */
export async function readHeads({ dataSource }: AppDeps): Promise<{ heads: Head[] }> {
  const where = { kind: 'head' as const, retiredAt: IsNull() };
  const items = await dataSource.getRepository(CatalogueItem).find({ where, order: { name: 'ASC' } });
  return { heads: items.map((item) => JSON.parse(item.body) as Head) };
}
