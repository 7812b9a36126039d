import type { ComponentProps } from 'react';
import { SignedInNav } from '@/components/shell/signed-in-nav';
import { SheetFrame } from '@/components/ui/sheet-frame';
import type { SignedIn } from '@/lib/server/session';

type Props = Omit<ComponentProps<typeof SheetFrame>, 'nav'> & { person: SignedIn };

/** The ordinary sheet of someone signed in: the ways about above, the agency in the title block. */
export function SignedInSheet({ person, cells = [], ...rest }: Props) {
  return (
    <SheetFrame
      nav={<SignedInNav me={{ name: person.name, role: person.role }} />}
      cells={[{ label: 'Agency', value: person.agencyName }, ...cells]}
      {...rest}
    />
  );
}
