import { OpenVisits } from './open-visits';

describe('open visits', () => {
  let here: OpenVisits;
  let there: OpenVisits;

  beforeEach(() => {
    here = new OpenVisits();
    there = new OpenVisits();
  });

  afterEach(() => {
    here.ngOnDestroy();
    there.ngOnDestroy();
  });

  it('go on in another tab until they end there', async () => {
    const visit = there.begin();
    expect(await here.ended([visit])).toEqual([]);
    there.end(visit);
    expect(await here.ended([visit])).toEqual([visit]);
  });

  it('have ended when the tab is gone', async () => {
    const [gone, open] = [there.begin(), here.begin()];
    there.ngOnDestroy();
    expect(await here.ended([gone, open])).toEqual([gone]);
  });

  it('need no asking in their own tab', async () => {
    const post = spyOn(BroadcastChannel.prototype, 'postMessage');
    const [ended, open] = [here.begin(), here.begin()];
    here.end(ended);
    expect(await here.ended([ended, open])).toEqual([ended]);
    expect(post).not.toHaveBeenCalled();
  });
});
