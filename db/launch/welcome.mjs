/** A few of the demo's people, one for each part. */
const demoPeople = [
  ['ref-1', 'referrer'],
  ['sp-rheum', 'specialist'],
  ['chair-1', 'chair'],
  ['lia-1', 'liaison'],
  ['adm-1', 'administrator'],
];

/**
 * What is printed when the product is ready: one address, and who may sign in.
 *
 * @param {import('./environment.mjs').Settings} settings
 * @returns {string}
 */
export function welcome({ publicUrl, demo, ownMail, dataDirectory }) {
  const people = demoPeople.map(([id, part]) => `  ${`${id}@lantern.example`.padEnd(28)}${part}`);
  const lines = ['', `Weighhouse is ready at ${publicUrl}`, ''];
  if (demo) {
    lines.push('Demo sign-ins, all with the password lantern-coast-demo:', ...people);
    lines.push('The administrator finds the rest of the network under People.', '');
  } else {
    lines.push('The first administrator is made by: npm run admin:create -- --email … --name …', '');
  }
  if (ownMail) lines.push(`Mail goes nowhere: it is kept in ${dataDirectory}/mail.`);
  lines.push('Ctrl-C stops everything.', '');
  return lines.join('\n');
}
