import type { Role } from '@/shared/domain/people';

export const ROLE_WORDS: Record<Role, string> = {
  lead: 'Lead',
  machinist: 'Machinist',
  apprentice: 'Apprentice',
};
