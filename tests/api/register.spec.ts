import type { PartList } from '../../shared/contracts/parts';
import type { Problem } from '../../shared/contracts/problem';
import { type Caller, CHANNEL, openTestShop, type TestShop } from '../support/test-shop';

describe('register', () => {
  let shop: TestShop;
  let reader: Caller;

  beforeAll(async () => {
    shop = await openTestShop();
    const designer = await shop.signedIn('designer');
    for (const [number, title] of [
      ['R-9', 'Rib, 100% plain'],
      ['R-10', 'Rib_cap'],
      ['r-11', 'Spännring'],
      ['R-100', "Rib 'quoted' \\ back"],
    ] as const) {
      await designer.post('/api/parts', { number, title, document: CHANNEL }).expect(201);
    }
    reader = await shop.signedIn('technician');
  });

  afterAll(() => shop.close());

  const list = async (query: string): Promise<PartList> =>
    (await reader.get(`/api/parts${query}`).expect(200)).body as PartList;
  const numbers = async (query: string): Promise<string[]> => (await list(query)).parts.map((part) => part.number);

  it('has a row for each part, newest change first', async () => {
    const { parts, total, next, materials } = await list('');
    expect(total).toBe(12);
    expect(parts.length).toBe(12);
    expect(next).toBeNull();
    expect(materials).toEqual(['2024-T3', '5052-H32', '6061-T6', 'Alclad 2024-T3']);
    const times = parts.map((part) => part.changedAt);
    expect(times).toEqual([...times].sort().reverse());
    expect(parts.at(-1)).toEqual(
      jasmine.objectContaining({
        number: 'HC-2101-1',
        revision: 'A',
        state: 'draft',
        unit: 'in',
        thickness: 0.04,
        bends: 1,
        stops: 0,
        changedBy: 'Ilka Dornbach',
      }),
    );
  });

  it('sorts numbers as a person files them', async () => {
    expect(await numbers('?sort=number&search=r-')).toEqual(['R-9', 'R-10', 'r-11', 'R-100']);
    expect(await numbers('?sort=-number&search=r-')).toEqual(['R-100', 'r-11', 'R-10', 'R-9']);
  });

  it('sorts titles without regard to case', async () => {
    const titles = (await list('?sort=title')).parts.map((part) => part.title.toLowerCase());
    expect(titles).toEqual([...titles].sort());
  });

  for (const sort of ['number', '-number', 'title', '-title', 'changed', '-changed']) {
    it(`gives every part once over its pages, by ${sort}`, async () => {
      const whole = await numbers(`?sort=${sort}`);
      const paged: string[] = [];
      let after = '';
      for (let page = 0; page < 10; page += 1) {
        const { parts, next, total } = await list(`?sort=${sort}&limit=5${after}`);
        expect(total).toBe(12);
        paged.push(...parts.map((part) => part.number));
        if (next === null) break;
        after = `&after=${next}`;
      }
      expect(paged).toEqual(whole);
      expect(new Set(paged).size).toBe(12);
    });
  }

  it('ends a page that is just full', async () => {
    expect((await list('?limit=12')).next).toBeNull();
    expect((await list('?limit=11')).next).not.toBeNull();
  });

  it('finds every word of a search, in number, title or material', async () => {
    expect(await numbers('?search=STRINGER+2103')).toEqual(['HC-2103-1']);
    expect(await numbers('?search=alclad')).toEqual(['HC-2106-1']);
    expect(await numbers('?search=spannring')).toEqual(['r-11']);
    expect((await list('?search=stringer+channel')).total).toBe(0);
    expect((await list('?search=+')).total).toBe(12);
  });

  it('takes every character of a search for itself', async () => {
    expect(await numbers('?search=%25')).toEqual(['R-9']);
    expect(await numbers('?search=_')).toEqual(['R-10']);
    expect(await numbers(`?search=${encodeURIComponent("'")}`)).toEqual(['R-100']);
    expect(await numbers(`?search=${encodeURIComponent('\\')}`)).toEqual(['R-100']);
    expect(await numbers(`?search=${encodeURIComponent("' OR 1=1 --")}`)).toEqual([]);
    expect(await numbers(`?search=${encodeURIComponent(':name $1 ?')}`)).toEqual([]);
  });

  it('filters by material and unit', async () => {
    expect((await numbers('?material=5052-H32&sort=number')).length).toBe(2);
    expect(await numbers('?material=5052-H32&unit=mm')).toEqual(['HC-2107-1']);
    expect((await list(`?material=${encodeURIComponent("x' OR ''='")}`)).total).toBe(0);
  });

  for (const [query, path] of [
    ['limit=0', 'limit'],
    ['limit=201', 'limit'],
    ['limit=x', 'limit'],
    ['sort=colour', 'sort'],
    ['unit=ft', 'unit'],
    ['colour=blue', 'colour'],
    ['search=a&search=b', 'search'],
    ['__proto__=x', '__proto__'],
    ['after=x', 'after'],
    [`after=${Buffer.from('["number","a","b"]').toString('base64url')}`, 'after'],
    [`after=${Buffer.from('["-changed","a\\u0000","b"]').toString('base64url')}`, 'after'],
    [`search=${'x'.repeat(101)}`, 'search'],
  ] as const) {
    it(`refuses ${query.slice(0, 30)} by its name`, async () => {
      const answer = await reader.get(`/api/parts?${query}`);
      expect(answer.status).toBe(422);
      expect((answer.body as Problem).errors?.map((error) => error.path)).toContain(path);
    });
  }

  it('takes 200 rows a page and a search of 100 characters', async () => {
    expect((await list('?limit=200')).parts.length).toBe(12);
    expect((await list(`?search=${'x'.repeat(100)}`)).total).toBe(0);
  });
});
