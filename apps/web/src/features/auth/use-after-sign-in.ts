import { useSearchParams } from 'react-router-dom';

/** Where to go once signed in: back to the page that was asked for, if it is one of ours. */
export function useAfterSignIn(): string {
  const [search] = useSearchParams();
  const back = search.get('back') ?? '/';
  return back.startsWith('/') && !back.startsWith('//') ? back : '/';
}
