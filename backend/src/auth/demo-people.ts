import { type Role } from './permissions.js';

export interface DemoPerson {
  email: string;
  name: string;
  role: Role;
}

/** Known accounts of demo mode: one for each role. They work nowhere else. */
export const DEMO_PASSWORD = 'stageyard-demo';

export const DEMO_PEOPLE: readonly DemoPerson[] = [
  { email: 'admin@brackenbay.example', name: 'Ada Holm', role: 'admin' },
  { email: 'designer@brackenbay.example', name: 'Dara Quill', role: 'designer' },
  { email: 'librarian@brackenbay.example', name: 'Levi Marsh', role: 'librarian' },
  { email: 'purchaser@brackenbay.example', name: 'Petra Voss', role: 'purchaser' },
  { email: 'viewer@brackenbay.example', name: 'Vic Arden', role: 'viewer' },
];
