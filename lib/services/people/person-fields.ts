import 'server-only';
import { z } from 'zod';
import { plainName } from '@/lib/domain/plain-name';
import { ROLES } from '@/lib/domain/roles';

export const personFields = {
  name: z
    .string()
    .overwrite(plainName)
    .min(1, 'Type the name as it should appear.')
    .max(80, 'At most 80 characters.'),
  email: z
    .string()
    .trim()
    .toLowerCase()
    .max(200, 'At most 200 characters.')
    .pipe(z.email('This is not an e-mail address.')),
  roles: z
    .array(z.enum(ROLES))
    .min(1, 'Choose at least one role.')
    .transform((roles) => ROLES.filter((role) => roles.includes(role))),
  version: z.number().int().min(1),
};
