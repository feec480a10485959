import { paths } from '@/lib/paths';
import { changeOwnName } from '@/lib/services/change-own-name';
import { changeOwnPassword } from '@/lib/services/change-own-password';
import { endOwnOtherSessions, endOwnSession } from '@/lib/services/end-own-session';
import { type Row } from '../matrix/row';

const account = '(account)/account/actions.ts';
const token = 'no.token';
const link = 'Who holds the mailed link may set the password; without it the page says only that it does not work.';

/** Own account, and what is open to everybody. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: 'page.tsx',
    path: paths.home,
    expect: ['sign-in', 'elsewhere', 'elsewhere', 'elsewhere', 'elsewhere', 'elsewhere', 'elsewhere'],
  },
  {
    kind: 'page',
    file: '(account)/account/page.tsx',
    path: paths.account,
    expect: ['sign-in', 'allow', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'action',
    file: account,
    action: 'saveName',
    services: ['changeOwnName'],
    run: (context) => changeOwnName(context, { name: 'Another Name' }),
    expect: ['sign-in', 'allow', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'action',
    file: account,
    action: 'savePassword',
    services: ['changeOwnPassword'],
    run: (context) =>
      changeOwnPassword(context, { currentPassword: 'x', newPassword: 'fast neutron, hot beam', sessionId: '' }),
    expect: ['sign-in', 'allow', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'action',
    file: account,
    action: 'endSession',
    services: ['endOwnSession'],
    // A session that is nobody's here: for everyone it is not there, as another person's would be.
    run: (context) => endOwnSession(context, { reference: '0123456789ab' }),
    expect: ['sign-in', 'hide', 'hide', 'hide', 'hide', 'hide', 'hide'],
  },
  {
    kind: 'action',
    file: account,
    action: 'endOtherSessions',
    services: ['endOwnOtherSessions'],
    run: (context) => endOwnOtherSessions(context, { sessionId: '' }),
    expect: ['sign-in', 'allow', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  { kind: 'open', file: '(public)/sign-in/page.tsx', path: () => paths.signIn(), why: 'Signing in.' },
  {
    kind: 'open',
    file: '(public)/password/forgot/page.tsx',
    path: paths.forgottenPassword,
    why: 'For people who cannot sign in.',
  },
  { kind: 'open', file: '(public)/password/[token]/page.tsx', path: () => paths.newPassword(token), why: link },
  { kind: 'open', file: '(public)/invitation/[token]/page.tsx', path: () => paths.invitation(token), why: link },
  {
    kind: 'open',
    file: '(public)/actions.ts',
    name: 'askForNewPassword',
    why: 'Its answer is the same for everybody.',
  },
  { kind: 'open', file: '(public)/actions.ts', name: 'setPassword', why: link },
  {
    kind: 'open',
    file: 'api/auth/[...nextauth]/route.ts',
    name: 'GET',
    path: () => '/api/auth/session',
    why: 'Signing in; it tells a browser about its own session only.',
  },
  {
    kind: 'open',
    file: 'api/auth/[...nextauth]/route.ts',
    name: 'POST',
    why: 'Signing in and out, with an anti-forgery token of its own.',
  },
  {
    kind: 'open',
    file: 'api/health/route.ts',
    name: 'GET',
    path: () => '/api/health',
    why: 'For whoever watches the service; it says that it lives and nothing else.',
  },
  {
    kind: 'open',
    file: 'api/ready/route.ts',
    name: 'GET',
    path: () => '/api/ready',
    why: 'For whoever watches the service; it says whether it is ready and nothing of its data.',
  },
];
