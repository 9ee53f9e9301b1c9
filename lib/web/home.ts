import type { Home } from '@/lib/domain/league/home';
import { paths } from './paths';

/** The address of the page a person starts on. */
export function pathOfHome(home: Home): string {
  switch (home.page) {
    case 'readiness':
      return paths.readiness(home.league, home.season);
    case 'shop':
      return paths.shop();
    case 'match':
      return paths.match();
    case 'leagues':
      return paths.leagues();
  }
}
