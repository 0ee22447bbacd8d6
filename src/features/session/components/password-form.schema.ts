import {
  acceptInvitationSchema,
  changePasswordSchema,
  setPasswordSchema,
} from '@shared/schemas/person.schema';
import { z } from 'zod';

const repeat = { repeat: z.string() };
const SAME = { path: ['repeat'], message: 'is not the same as above' };
const isSame = (form: { password: string; repeat: string }) => form.password === form.repeat;

export const invitationFormSchema = acceptInvitationSchema.extend(repeat).refine(isSame, SAME);
export const resetFormSchema = setPasswordSchema.extend(repeat).refine(isSame, SAME);
export const changeFormSchema = changePasswordSchema.extend(repeat).refine(isSame, SAME);
