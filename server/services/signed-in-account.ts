import type { DataSource } from 'typeorm';
import type { Preferences } from '../../shared/contracts/session';
import type { Actor, Role } from '../../shared/permissions';

/** Who a session belongs to, with everything that `can` and the account's own screens ask. */
export interface SignedInAccount extends Actor {
  roles: Role[];
  operatorIds: string[];
  email: string;
  preferences: Preferences;
  hasPin: boolean;
}

interface Row {
  id: string;
  email: string;
  name: string;
  language: Preferences['language'];
  units: Preferences['units'];
  theme: Preferences['theme'];
  has_pin: string | number;
  roles: string | null;
  operators: string | null;
}

const listed = (words: string | null) => (words === null || words === '' ? [] : words.split(','));

/** Reads an account with its roles and grants; null when there is none or it was deactivated. */
export async function loadAccount(db: DataSource, accountId: string): Promise<SignedInAccount | null> {
  const [row] = await db.query<Row[]>(
    `SELECT a.id, a.email, a.name, a.language, a.units, a.theme, a.pin_hash IS NOT NULL AS has_pin,
            (SELECT GROUP_CONCAT(r.role ORDER BY r.role) FROM account_roles r WHERE r.account_id = a.id) AS roles,
            (SELECT GROUP_CONCAT(g.operator_id) FROM operator_grants g WHERE g.account_id = a.id) AS operators
       FROM accounts a WHERE a.id = ? AND a.deactivated_at IS NULL`,
    [accountId],
  );
  if (!row) return null;
  return {
    accountId: row.id,
    name: row.name,
    email: row.email,
    roles: listed(row.roles) as Role[],
    operatorIds: listed(row.operators),
    preferences: { language: row.language, units: row.units, theme: row.theme },
    hasPin: Number(row.has_pin) === 1,
  };
}
