import { addressOfFilter, filterOfAddress, narrowings } from './filter-of-address';

const SECTION = '0190a0b0-0000-7000-8000-000000005001';
const read = (search: string) => filterOfAddress(new URLSearchParams(search));

describe('the filters in the address', () => {
  it.each([
    { search: '', filter: {} },
    { search: 'state=open', filter: { state: 'open' } },
    { search: `sectionId=${SECTION}&mine=true`, filter: { sectionId: SECTION, mine: 'true' } },
    { search: 'q=%20%2330%20', filter: { q: '#30' } },
    { search: 'discipline=riveting&sort=waiting', filter: { discipline: 'riveting', sort: 'waiting' } },
  ])('reads $search', ({ search, filter }) => expect(read(search)).toEqual(filter));

  it.each(['state=solved', 'sectionId=STB', 'discipline=', 'q=%20', 'mine=1', 'sort=popular', 'page=2'])(
    'leaves %s out, for no list is meant by it',
    (search) => expect(read(search)).toEqual({}),
  );

  it('writes what it reads, and nothing that changes nothing', () => {
    const filter = { q: 'edge 0.25 AD3', state: 'endorsed', mine: 'true', sort: 'newest' } as const;
    expect(filterOfAddress(addressOfFilter(filter))).toEqual(filter);
    expect(addressOfFilter({ mine: 'false', sort: 'activity', state: undefined }).toString()).toBe('');
  });

  it('counts what narrows the list, not its order', () => {
    expect(narrowings({ q: 'x', sort: 'waiting' })).toBe(1);
    expect(narrowings({ sort: 'waiting', mine: 'false' })).toBe(0);
    expect(narrowings({ state: 'open', mine: 'true' })).toBe(2);
  });
});
