import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

export type CatalogueKind = 'head' | 'procedure' | 'instrument';

/**
 * A head, procedure or instrument as a job takes it over: whole, into its first event. The body is the JSON of the
 * shape in `shared/job/plan`; a later change of it touches no job.
 */
@Entity('catalogue_items')
@Index('catalogue_items_name', ['kind', 'name'], { unique: true })
export class CatalogueItem {
  @PrimaryColumn({ type: 'char', length: 36 })
  id: string;

  @Column({ type: 'varchar', length: 20 })
  kind: CatalogueKind;

  @Column({ type: 'varchar', length: 160 })
  name: string;

  @Column({ type: 'mediumtext' })
  body: string;

  @Column({ name: 'retired_at', type: 'datetime', precision: 3, nullable: true })
  retiredAt: Date | null;
}
