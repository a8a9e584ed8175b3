import { readCursor, writeCursor } from './register-cursor';

describe('register cursor', () => {
  const cursor = { key: 'spännring', id: 'a-b' };

  it('reads what it wrote', () => {
    expect(readCursor('title', writeCursor('title', cursor))).toEqual(cursor);
  });

  it('belongs to the order it was made for', () => {
    expect(readCursor('-title', writeCursor('title', cursor))).toBeNull();
  });

  for (const text of [
    '',
    'x',
    'bnVsbA',
    Buffer.from('["title",1,"b"]').toString('base64url'),
    writeCursor('x', cursor),
  ]) {
    it(`is not ${JSON.stringify(text).slice(0, 30)}`, () => {
      expect(readCursor('title', text)).toBeNull();
    });
  }
});
