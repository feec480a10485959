'use client';

import { signOut } from 'next-auth/react';
import Link from 'next/link';
import { useTransition } from 'react';
import { Button } from '@/components/ui/button';
import { paths } from '@/lib/paths';

/** Who is signed in, and the way out; stands at the right end of the running head. */
export function AccountLine({ name }: { name: string }) {
  const [leaving, leave] = useTransition();
  return (
    <span className="flex flex-wrap items-baseline gap-x-4">
      <Link href={paths.account()} className="text-grey hover:text-blue">
        {name}
      </Link>
      <Button look="plain" pending={leaving} onClick={() => leave(() => signOut({ callbackUrl: paths.signIn() }))}>
        Sign out
      </Button>
    </span>
  );
}
