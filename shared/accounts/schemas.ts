import { array, boolean, number, object, string, type InferType } from 'yup';
import { LIMITS } from '../limits';
import { ROLES } from './roles';

const email = string()
  .trim()
  .lowercase()
  .email('Write an e-mail address, like name@firm.example.')
  .max(254)
  .required('Write the e-mail address.');

/** A new password. Length counts; no recipe of letters and signs is asked for (NIST SP 800-63B, 5.1.1). */
const newPassword = string()
  .min(LIMITS.password.min, `At least ${LIMITS.password.min} characters.`)
  .max(LIMITS.password.max, `At most ${LIMITS.password.max} characters.`)
  .required('Choose a password.');

const token = string().min(20).max(200).required();
const personName = string().trim().max(LIMITS.textShort).required('Write the name.');
const roles = array()
  .of(string().oneOf(ROLES).required())
  .min(1, 'Choose at least one role.')
  .max(LIMITS.roles)
  .required();

export const signInSchema = object({
  email,
  password: string().max(LIMITS.password.max).required('Write the password.'),
}).noUnknown();

export const passwordResetRequestSchema = object({ email }).noUnknown();
export const passwordResetConfirmSchema = object({ token, password: newPassword }).noUnknown();
export const passwordChangeSchema = object({
  current: string().max(LIMITS.password.max).required('Write the password you have now.'),
  next: newPassword,
}).noUnknown();

export const invitationSchema = object({
  email,
  roles,
  /** Surveyors and clients are invited to one study. */
  studyId: number().integer().positive().nullable().default(null),
}).noUnknown();
export const invitationLookSchema = object({ token }).noUnknown();
export const invitationAcceptSchema = object({
  token,
  name: personName,
  password: newPassword,
}).noUnknown();

export const userChangeSchema = object({
  roles: roles.optional(),
  active: boolean().optional(),
}).noUnknown();

export const profileSchema = object({
  name: personName,
  qualification: string().trim().max(LIMITS.textShort).nullable().default(null),
  registrationNumber: string().trim().max(LIMITS.textShort).nullable().default(null),
}).noUnknown();

export type SignInBody = InferType<typeof signInSchema>;
export type InvitationBody = InferType<typeof invitationSchema>;
export type InvitationAcceptBody = InferType<typeof invitationAcceptSchema>;
export type PasswordChangeBody = InferType<typeof passwordChangeSchema>;
export type PasswordResetConfirmBody = InferType<typeof passwordResetConfirmSchema>;
export type UserChangeBody = InferType<typeof userChangeSchema>;
export type ProfileBody = InferType<typeof profileSchema>;
