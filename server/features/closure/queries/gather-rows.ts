import { sql, type SQL } from 'drizzle-orm';
import type { Transaction } from '../../../database/connection.ts';
import type { sealedTables } from '../../../database/sealed-tables.ts';

export type GatheredTable =
  | Exclude<(typeof sealedTables)[number], 'closures'>
  | 'audit_entries'
  | 'constants relied on'
  | 'calibrations relied on';

export type GatheredRow = Readonly<Record<string, unknown>>;

// What of a case's own row a closure leaves open or itself changes; when it closed stands in the list of the seal.
const notSealed = [
  ...['state', 'state_since', 'closed_at', 'hold_reason', 'hold_until', 'held_since', 'withdrawn_reason'],
  ...['assigned_to', 'restricted', 'hold_for_litigation', 'version', 'search'],
];

const constantsUsed = sql`
  select source_id from estimate_inputs where source_kind = 'material constant' and case_id = `;
const constantsBound = sql`
  select source_id from bound_values where source_kind = 'material constant' and case_id = `;

function rowsOf(table: GatheredTable, caseId: string): SQL {
  const id = sql`${caseId}::uuid`;
  switch (table) {
    case 'cases':
      return sql`select to_jsonb(t) as row from cases t where t.id = ${id}`;
    case 'audit_entries':
      return sql`select to_jsonb(t) as row from audit_entries t where t.chain = ${caseId}`;
    case 'constants relied on':
      return sql`select to_jsonb(t) as row from material_constants t
        where t.id in (${constantsUsed}${id} union ${constantsBound}${id})`;
    case 'calibrations relied on':
      return sql`select to_jsonb(t) as row from calibrations t where t.case_id is null
        and t.id in (select calibration_id from calibration_bindings where case_id = ${id})`;
    default:
      return sql`select to_jsonb(t) as row from ${sql.identifier(table)} t where t.case_id = ${id}`;
  }
}

/**
 * Every row that a table holds of a case, with all its columns as the database writes them in JSON, in the order of
 * their ids. Instants are written in UTC whatever the zone of the server.
 */
export async function gatherRows(tx: Transaction, table: GatheredTable, caseId: string): Promise<GatheredRow[]> {
  await tx.db.execute(sql`set local time zone 'UTC'`);
  const { rows } = await tx.db.execute<{ row: Record<string, unknown> }>(rowsOf(table, caseId));
  return rows
    .map(({ row }) => (table === 'cases' ? without(row, notSealed) : row))
    .sort((one, other) => (rowId(one) < rowId(other) ? -1 : 1));
}

/** What a row is told by: its id, or the person where a table has one row a person. */
export function rowId(row: GatheredRow): string {
  return String(row.id ?? row.person_id);
}

function without(row: GatheredRow, columns: readonly string[]): GatheredRow {
  return Object.fromEntries(Object.entries(row).filter(([column]) => !columns.includes(column)));
}
