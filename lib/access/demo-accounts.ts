import type { Role } from './roles';

export interface DemoAccount {
  name: string;
  email: string;
  role: Role;
  password: string;
}

/**
 * The people of the invented group. Their passwords are no secret: the rows carry `demo`, and sign-in
 * refuses such rows outside demo mode. The seed creates them, the sign-in page and the launcher announce them.
 */
export const demoAccounts: readonly DemoAccount[] = [
  { name: 'Hanne Oduya', email: 'hanne@fennick.example', role: 'PI', password: 'demo-hanne-2026' },
  {
    name: 'Ilse Brandvold',
    email: 'ilse@fennick.example',
    role: 'computational chemist',
    password: 'demo-ilse-2026',
  },
  {
    name: 'Tomas Quill',
    email: 'tomas@fennick.example',
    role: 'experimentalist',
    password: 'demo-tomas-2026',
  },
  { name: 'Mirela Abt', email: 'mirela@fennick.example', role: 'guest', password: 'demo-mirela-2026' },
];
