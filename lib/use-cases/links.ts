import { getEnv } from '@/lib/platform/env';

/** A page's address as it stands in a letter: with the host this installation is reached by. */
const link = (path: string): string => `${getEnv().RAGLAN_BASE_URL.replace(/\/+$/, '')}${path}`;

/** The addresses letters point to; each is also in lib/web/paths.ts, which pages use. */
export const links = {
  signIn: () => link('/sign-in'),
  confirmSignUp: (token: string) => link(`/sign-up/${token}`),
  askReset: () => link('/reset'),
  reset: (token: string) => link(`/reset/${token}`),
  join: (token: string) => link(`/join/${token}`),
  league: (slug: string) => link(`/${slug}`),
  roster: (league: string, season: string, team: string) => link(`/${league}/${season}/rosters/${team}`),
  shopBatch: (league: string, code: string) => link(`/shop/${league}/${code.toLowerCase()}`),
};
