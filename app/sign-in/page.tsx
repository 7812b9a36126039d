import type { Metadata } from 'next';
import { SignInForm } from '@/components/sign-in/sign-in-form';
import { PublicNav } from '@/components/shell/public-nav';
import { Notice } from '@/components/ui/notice';
import { SheetFrame } from '@/components/ui/sheet-frame';

export const metadata: Metadata = { title: 'Sign in', robots: { index: false } };

type Search = Promise<Record<string, string | string[] | undefined>>;

const one = (value: string | string[] | undefined): string | null =>
  (Array.isArray(value) ? value[0] : value) ?? null;

export default async function SignInPage({ searchParams }: { searchParams: Search }) {
  const { callbackUrl, after, error } = await searchParams;
  const back = one(callbackUrl);
  return (
    <SheetFrame nav={<PublicNav signIn={false} />} title="Sign in">
      <h1 className="text-2xl font-bold">Sign in</h1>
      {one(after) === 'sign-out' && (
        <Notice title="You are signed out." className="mt-4 max-w-md" />
      )}
      {back && (
        <p className="mt-2 max-w-md text-ink-soft">Then you go on to the page you asked for.</p>
      )}
      <div className="mt-6">
        <SignInForm back={back} refused={one(error)} />
      </div>
      <section aria-labelledby="forgotten" className="mt-10 max-w-md border-t border-rule pt-4">
        <h2 id="forgotten" className="font-bold">
          You can’t sign in?
        </h2>
        <p className="mt-1">
          Forgotten your password, or no account yet: ask your agency’s administrator. Handouts
          already printed, and the blank readings page, need no sign-in.
        </p>
      </section>
    </SheetFrame>
  );
}
