import { LinkPage } from '../../_components/link-page';

export const metadata = { title: 'New password', referrer: 'no-referrer' };

/** Where the link of a reset mail leads. */
export default async function NewPasswordPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  return (
    <LinkPage purpose="reset" token={token} place="New password" greeting={(name) => `A new password for ${name}`} />
  );
}
