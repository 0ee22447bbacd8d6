import { useMemo } from 'react';
import { useTheme } from '@/lib/theme';

export interface Tokens {
  paper: string;
  ink: string;
  deep: string;
  shallow: string;
  hairline: string;
  stone: string;
  kingfisher: string;
  brass: string;
}

/** The palette in force as colour values, for drawing that cannot use CSS variables. */
export function useTokens(): Tokens {
  const theme = useTheme();
  return useMemo(() => {
    const style = getComputedStyle(document.documentElement);
    // The theme is named so that another choice reads the variables anew.
    const read = (name: string) =>
      style.getPropertyValue(`--${name}`).trim() || (theme === 'dark' ? '#fff' : '#000');
    return {
      paper: read('paper'),
      ink: read('ink'),
      deep: read('deep'),
      shallow: read('shallow'),
      hairline: read('hairline'),
      stone: read('stone'),
      kingfisher: read('kingfisher'),
      brass: read('brass'),
    };
  }, [theme]);
}
