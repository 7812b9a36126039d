'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { ThemeSwitch } from '@/components/ui/theme-switch';
import { ROLE_WORDS, type Role } from '@/lib/access';
import { SignOut } from './sign-out';

const PLACES = [
  { href: '/sites', words: 'Sites' },
  { href: '/kits', words: 'Kits' },
  { href: '/limits', words: 'Limits' },
] as const;

export type SignedIn = { name: string; role: Role };

/** The line in the top margin of every ordinary sheet once signed in. */
export function SignedInNav({ me }: { me: SignedIn }) {
  const path = usePathname();
  return (
    <div className="flex flex-wrap items-center gap-x-5">
      <nav aria-label="Stillground" className="flex flex-wrap items-center gap-x-5">
        <Link href="/" className="inline-flex min-h-11 items-center text-lg font-bold">
          Stillground
        </Link>
        {PLACES.map(({ href, words }) => {
          const here = path === href || path.startsWith(`${href}/`);
          return (
            <Link
              key={href}
              href={href}
              aria-current={here ? 'page' : undefined}
              className={`inline-flex min-h-11 items-center underline-offset-4 ${
                here ? 'font-bold underline decoration-2' : 'hover:underline'
              }`}
            >
              {words}
            </Link>
          );
        })}
      </nav>
      <span className="grow" />
      <span className="inline-flex min-h-11 items-center">
        {me.name}, {ROLE_WORDS[me.role].toLowerCase()}
      </span>
      <ThemeSwitch />
      <SignOut />
    </div>
  );
}
