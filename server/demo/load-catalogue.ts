import { CatalogueItem } from '../entities/catalogue-item';
import type { CatalogueKind } from '../entities/catalogue-item';
import { Operator } from '../entities/operator';
import { Rig } from '../entities/rig';
import type { AppDeps } from '../services/deps';
import { demoHeads } from './heads';
import { demoInstruments } from './instruments';
import { demoOperators } from './operators';
import { demoProcedures } from './procedures';

/** Operators with their rigs, heads, procedures and instruments of the invented scenario. */
export async function loadDemoCatalogue({ dataSource, clock }: Pick<AppDeps, 'dataSource' | 'clock'>): Promise<void> {
  const item = (kind: CatalogueKind, name: string, body: { id: string }) => ({
    id: body.id,
    kind,
    name,
    body: JSON.stringify(body),
    retiredAt: null,
  });
  await dataSource.transaction(async (manager) => {
    await manager.insert(
      Operator,
      demoOperators.map(({ id, name }) => ({ id, name })),
    );
    const rigs = demoOperators.flatMap((operator) => operator.rigs.map((rig) => ({ ...rig, operatorId: operator.id })));
    await manager.insert(Rig, rigs);
    await manager.insert(CatalogueItem, [
      ...demoHeads.map((head) => item('head', head.name, head)),
      ...demoProcedures.map((each) => item('procedure', `${each.number} ${each.revision}`, each)),
      ...demoInstruments(clock()).map((each) => item('instrument', `${each.name} (${each.serial})`, each)),
    ]);
  });
}
