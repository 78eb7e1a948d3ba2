import type { Role } from '@/shared/accounts/roles';

interface StudiesWords {
  title: string;
  lead: string;
  mayCreate: boolean;
}

/** The first page speaks to what a person comes to do. */
export function studiesWords(roles: readonly Role[]): StudiesWords {
  if (roles.includes('modeller') || roles.includes('seniorEngineer')) {
    return { title: 'Studies', lead: 'Newest work first.', mayCreate: true };
  }
  if (roles.includes('surveyor')) {
    return {
      title: 'Your reaches',
      lead: 'Open one to hand in its cross-sections and to see what became of earlier files.',
      mayCreate: false,
    };
  }
  return {
    title: 'Shared with you',
    lead: 'Open one to read what has been issued.',
    mayCreate: false,
  };
}
