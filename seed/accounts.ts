import type { Role } from '../shared/accounts/roles';

/** Invented firms and people. Addresses end in `.example`, which no mail reaches (RFC 2606). */
export interface DemoAccount {
  firm: string;
  name: string;
  email: string;
  roles: Role[];
  qualification?: string;
  registrationNumber?: string;
}

export const DEMO_FIRM = 'Pyke Morrow Hydraulics';
/** Another firm, to see that neither sees anything of the other. */
export const OTHER_FIRM = 'Ostrand Vale Water';

/** One for all demo accounts; change it, or deactivate them, before the server is open to others. */
export const DEMO_PASSWORD = 'high water at tornick';

export const DEMO_ACCOUNTS: readonly DemoAccount[] = [
  {
    firm: DEMO_FIRM,
    name: 'Ines Corrow',
    email: 'ines.corrow@pykemorrow.example',
    roles: ['modeller'],
    qualification: 'MSc Civil Engineering',
  },
  {
    firm: DEMO_FIRM,
    name: 'Rurik Tesk',
    email: 'rurik.tesk@pykemorrow.example',
    roles: ['seniorEngineer'],
    qualification: 'Chartered Engineer',
    registrationNumber: 'DEMO-20417',
  },
  {
    firm: DEMO_FIRM,
    name: 'Dov Hallam',
    email: 'dov.hallam@pykemorrow.example',
    roles: ['surveyor'],
  },
  {
    firm: DEMO_FIRM,
    name: 'Maud Ferrin',
    email: 'maud.ferrin@tornick.example',
    roles: ['client'],
  },
  {
    firm: DEMO_FIRM,
    name: 'Ada Pyke',
    email: 'ada.pyke@pykemorrow.example',
    roles: ['administrator'],
  },
  {
    firm: OTHER_FIRM,
    name: 'Lena Ostrand',
    email: 'lena@ostrandvale.example',
    roles: ['administrator', 'modeller'],
  },
];
