/** Prints the address, and who may sign in to the demo. */
export function sayWhere(address, signIns) {
  console.log(`\nGroundsill runs at ${address}\n`);
  if (signIns !== undefined) {
    console.log(`Sign in to the demo with the password ${signIns.password} as`);
    for (const { email, name } of signIns.people) console.log(`  ${email.padEnd(32)}${name}`);
    console.log('');
  }
  console.log('Ctrl-C stops it.');
}
