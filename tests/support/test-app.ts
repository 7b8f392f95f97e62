import type { Express } from 'express';
import { pino } from 'pino';
import request from 'supertest';
import { v7 } from 'uuid';
import { createApp } from '../../server/app';
import { loadDemoCatalogue } from '../../server/demo/load-catalogue';
import { loadDemoPeople } from '../../server/demo/load-people';
import { demoPeopleByKey } from '../../server/demo/people';
import type { DemoKey, DemoPerson } from '../../server/demo/people';
import type { AppDeps } from '../../server/services/deps';
import { readKeys } from '../../server/services/keys';
import { aClock } from './test-clock';
import type { TestClock } from './test-clock';
import { aDatabase } from './test-database';
import type { TestDatabase } from './test-database';

export type Agent = ReturnType<typeof request.agent>;

export interface TestApp {
  app: Express;
  deps: AppDeps;
  database: TestDatabase;
  clock: TestClock;
  /** lines of the structured log, as they were written */
  logged: string[];
  /** a demo person with password and PIN */
  person(key: DemoKey): DemoPerson;
  /** somebody without a session */
  guest(): Agent;
  /** a browser in which a demo person has signed in */
  agentFor(key: DemoKey): Promise<Agent>;
  stop(): Promise<void>;
}

/**
 * The whole server on a database of its own with the demo's people and catalogue; its clock is moved by hand.
 * @param databasePort another way to the same database, such as a relay that a test cuts
 */
export async function startTestApp(settings: Record<string, string> = {}, databasePort?: number): Promise<TestApp> {
  const database = await aDatabase(settings, databasePort);
  const clock = aClock();
  const logged: string[] = [];
  const deps: AppDeps = {
    config: database.config,
    keys: readKeys(database.config.keysDir),
    dataSource: database.app,
    clock,
    ids: () => v7(),
    log: pino({ level: 'info' }, { write: (line: string) => void logged.push(line) }),
  };
  await loadDemoCatalogue(deps);
  await loadDemoPeople(deps);
  const app = createApp(deps);
  const person = (key: DemoKey): DemoPerson => demoPeopleByKey[key];
  return {
    app,
    deps,
    database,
    clock,
    logged,
    person,
    guest: () => request.agent(app),
    agentFor: async (key) => {
      const agent = request.agent(app);
      const { email, password } = person(key);
      await agent.post('/api/session').send({ email, password }).expect(200);
      return agent;
    },
    stop: () => database.drop(),
  };
}
