/** One running MariaDB of this project. */
export interface DatabaseServer {
  port: number;
  owner: { user: string; password: string };
  app: { user: string; password: string };
  createDatabase(database: string): void;
  dropDatabase(database: string): void;
  /** Runs statements as the administrator and answers their output. */
  administer(statements: string): string;
  environment(database: string): Record<string, string>;
  ownerEnvironment(database: string): Record<string, string>;
  close(): Promise<void>;
}

export function openDatabase(name?: string): Promise<DatabaseServer>;
export function runningDatabase(name?: string): DatabaseServer;
