/** Roles of a person in a firm; one person may have several. */
export const ROLES = ['administrator', 'modeller', 'seniorEngineer', 'surveyor', 'client'] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_NAMES: Record<Role, string> = {
  administrator: 'Administrator',
  modeller: 'Modeller',
  seniorEngineer: 'Senior engineer',
  surveyor: 'Surveyor',
  client: 'Client',
};
