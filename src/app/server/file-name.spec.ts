import { fileNameOf } from './file-name';

describe('fileNameOf', () => {
  it('reads the name that the server gives', () => {
    expect(fileNameOf('attachment; filename="T-1-A-blank.pdf"')).toBe('T-1-A-blank.pdf');
  });

  it('reads none where none is, and no way through folders', () => {
    for (const header of [null, '', 'attachment', 'attachment; filename=""', 'attachment; filename="../a.pdf"']) {
      expect(fileNameOf(header)).withContext(String(header)).toBeNull();
    }
  });
});
