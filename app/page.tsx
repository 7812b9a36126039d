import { ButtonLink } from '@/components/ui/button';
import { Caution } from '@/components/ui/caution';
import { SheetFrame } from '@/components/ui/sheet-frame';
import { ThemeSwitch } from '@/components/ui/theme-switch';

export default function FrontPage() {
  return (
    <SheetFrame nav={<ThemeSwitch />} title="Stillground" caution={<Caution />}>
      <h1 className="text-3xl font-bold">Stillground</h1>
      <ButtonLink href="/sign-in" look="action" className="mt-6">
        Sign in
      </ButtonLink>
    </SheetFrame>
  );
}
