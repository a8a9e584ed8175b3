import { revision } from '../sample-part';
import { saveWords } from './save-state';

describe('the words about saving', () => {
  it('say when it was saved, to the second', () => {
    expect(saveWords({ is: 'saved', at: new Date(2026, 0, 5, 9, 4, 7) })).toBe('saved 09:04:07');
    expect(saveWords({ is: 'saved', at: null })).toBe('saved');
  });

  it('do not say plainly saved while a typed chain is not taken', () => {
    expect(saveWords({ is: 'saved', at: new Date(2026, 0, 5, 9, 4, 7) }, true)).toBe(
      'saved 09:04:07, but not the typed chain',
    );
    expect(saveWords({ is: 'saving' }, true)).toBe('saving');
  });

  it('never say saved while it is not', () => {
    const others = [
      saveWords({ is: 'waiting' }),
      saveWords({ is: 'saving' }),
      saveWords({ is: 'held', fields: 2 }),
      saveWords({ is: 'trying', why: "The server can't be reached.", seconds: 4 }),
      saveWords({ is: 'refused', why: 'Too thick.', errors: [] }),
      saveWords({ is: 'signed-out' }),
      saveWords({ is: 'stale', theirs: revision() }),
    ];
    for (const words of others) expect(words.startsWith('saved')).withContext(words).toBeFalse();
  });

  it('count the fields to mend', () => {
    expect(saveWords({ is: 'held', fields: 1 })).toBe("can't be saved: 1 field to mend");
    expect(saveWords({ is: 'held', fields: 2 })).toBe("can't be saved: 2 fields to mend");
  });
});
