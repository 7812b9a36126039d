import type { Role } from '@/lib/access';

/** Who is asking. Every verb takes it and looks only inside its agency. */
export type SignedIn = {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly agencyId: string;
  readonly agencyName: string;
  readonly sessionId: string;
};
