import { LinkPage } from '../../_components/link-page';

export const metadata = { title: 'Your account', referrer: 'no-referrer' };

/** Where the link of an invitation leads. */
export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  return (
    <LinkPage
      purpose="invitation"
      token={token}
      place="Your account"
      greeting={(name) => `Welcome, ${name}. Choose a password.`}
    />
  );
}
