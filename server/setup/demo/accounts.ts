import type { Role } from '../../../shared/model/people';

export interface DemoAccount {
  readonly role: Role;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

export const DEMO_STUDIO = 'Quern Lane Studio';

/** Invented people. Their passwords are printed at every start, so they exist in demo mode only. */
export const DEMO_ACCOUNTS: readonly DemoAccount[] = [
  { role: 'owner', name: 'Hesper Dowd', email: 'hesper@quernlane.example', password: 'steel-ruler-4064' },
  { role: 'designer', name: 'Tobin Arkwell', email: 'tobin@quernlane.example', password: 'bone-folder-127' },
  { role: 'reviewer', name: 'Ines Marlow', email: 'ines@quernlane.example', password: 'soft-pencil-160' },
  { role: 'contributor', name: 'Odile Penn', email: 'odile@quernlane.example', password: 'photo-corner-22' },
];
