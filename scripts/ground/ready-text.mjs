const roleNames = {
  administrator: 'administrator',
  instructor: 'instructor',
  'head-ta': 'head TA',
  ta: 'TA',
  student: 'student',
};

/**
 * What `npm start` prints when everything answers.
 *
 * @param {{ url: string, seconds: number, mailUrl: string | null, dataFolder: string | null, logFolder: string,
 *   accounts: { password: string, accounts: { role: string, name: string, email: string }[] } | null }} facts
 */
export function readyText({ url, seconds, accounts, mailUrl, dataFolder, logFolder }) {
  const lines = ['', `Halfmark is ready at ${url} (after ${seconds} s)`, ''];
  if (accounts) {
    lines.push(`Sign in with the password ${accounts.password} as`);
    const width = Math.max(...accounts.accounts.map(({ email }) => email.length));
    for (const { role, email, name } of accounts.accounts) {
      lines.push(`  ${email.padEnd(width)}  ${(roleNames[role] ?? role).padEnd(13)}  ${name}`);
    }
    lines.push('');
  }
  lines.push(
    mailUrl ? `Mail it sends is kept here and can be read at ${mailUrl}` : 'Mail goes to the server in SMTP_URL.',
  );
  if (dataFolder) lines.push(`Data: ${dataFolder}`);
  lines.push(`Logs: ${logFolder}`, 'Stop with Ctrl-C; everything is kept for the next start.');
  return lines.join('\n');
}
