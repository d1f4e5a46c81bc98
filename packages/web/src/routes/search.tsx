import { useSearchParams } from 'react-router-dom';
import { SearchForm } from '../features/search/search-form';
import { SearchPage } from '../features/search/search-page';
import { SearchResults } from '../features/search/search-results';
import { usePageTitle } from '../lib/page-title';

export const handle = { crumbs: () => [{ label: 'Find' }] };

export function Component() {
  const [search, setSearch] = useSearchParams();
  const q = search.get('q')?.trim() ?? '';
  usePageTitle(q === '' ? 'Find' : `Find ${q}`);
  return (
    <SearchPage>
      <SearchForm key={q} q={q} onSearch={(next) => setSearch({ q: next })} />
      <SearchResults q={q} />
    </SearchPage>
  );
}
