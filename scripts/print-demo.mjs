/** Lists the demo accounts, as the server itself answers them. */
export async function printDemoAccounts(address) {
  const response = await fetch(`${address}/api/demo-accounts`);
  const { accounts } = await response.json();
  if (accounts.length === 0) return;
  const columns = ['roles', 'name', 'email', 'password', 'pin'];
  const rows = accounts.map((each) => ({ ...each, roles: each.roles.join(', ') }));
  const width = (column) => Math.max(column.length, ...rows.map((row) => row[column].length));
  const line = (cells) => columns.map((column) => cells[column].padEnd(width(column))).join('   ');
  console.log('\nDemo accounts of an invented scenario (on this machine only):\n');
  console.log(`  ${line(Object.fromEntries(columns.map((column) => [column, column])))}`);
  for (const row of rows) console.log(`  ${line(row)}`);
}
