// @ts-check

/**
 * The last thing a start says: where to go and who to be.
 * @param {string} address
 * @param {readonly import('./prepare-data.mjs').SignIn[]} signIns
 */
export function welcome(address, signIns) {
  const lines = ['', `Stillground is ready at ${address}`];
  if (signIns.length > 0) {
    /** @param {(of: import('./prepare-data.mjs').SignIn) => string} field */
    const width = (field) => Math.max(...signIns.map((of) => field(of).length));
    const role = width((of) => of.role);
    const email = width((of) => of.email);
    lines.push(
      '',
      'Demo sign-ins (an invented team; kept in .data/demo-sign-ins.json):',
      ...signIns.map(
        (of) => `  ${of.role.padEnd(role)}  ${of.email.padEnd(email)}  ${of.password}`,
      ),
    );
  }
  lines.push('', 'Ctrl-C stops it.', '');
  return lines.join('\n');
}
