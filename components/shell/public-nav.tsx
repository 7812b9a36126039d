import Link from 'next/link';
import { ThemeSwitch } from '@/components/ui/theme-switch';

/** The line in the top margin before anyone has signed in. */
export function PublicNav({ signIn = true }: { signIn?: boolean }) {
  return (
    <nav aria-label="Stillground" className="flex flex-wrap items-center gap-x-6">
      <Link href="/" className="inline-flex min-h-11 items-center text-lg font-bold">
        Stillground
      </Link>
      <Link
        href="/blank-readings"
        className="inline-flex min-h-11 items-center underline-offset-4 hover:underline"
      >
        Blank readings page
      </Link>
      <span className="grow" />
      <ThemeSwitch />
      {signIn && (
        <Link
          href="/sign-in"
          className="inline-flex min-h-11 items-center underline underline-offset-4"
        >
          Sign in
        </Link>
      )}
    </nav>
  );
}
