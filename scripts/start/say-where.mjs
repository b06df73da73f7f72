/** Prints the address, and who may sign in to the demo or has yet to choose a password. */
export function sayWhere(address, { signIns, invitation }) {
  console.log(`\nGroundsill runs at ${address}\n`);
  if (signIns !== undefined) {
    console.log(`Sign in to the demo with the password ${signIns.password} as`);
    for (const { email, name } of signIns.people) console.log(`  ${email.padEnd(32)}${name}`);
    console.log('');
  }
  if (invitation !== undefined) {
    console.log(`${invitation.email} chooses a password, once and within a week, at`);
    console.log(`  ${invitation.url}\n`);
  }
  console.log('Ctrl-C stops it.');
}
