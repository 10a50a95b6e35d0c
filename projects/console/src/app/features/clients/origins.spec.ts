import { FormControl } from '@angular/forms';
import { originFault, originsIn, originsValidator } from './origins';

describe('origins of a page key', () => {
  it.each(['https://intranet.example', 'http://tools.example:8080', 'http://localhost:4200'])(
    'takes %s',
    (origin) => expect(originFault(origin)).toBeUndefined(),
  );

  it.each([
    ['intranet.example', 'Did you mean “https://intranet.example”?'],
    ['https://intranet.example/', 'Did you mean “https://intranet.example”?'],
    ['https://Intranet.Example/walers?x=1', 'Did you mean “https://intranet.example”?'],
    ['https://intranet.example:443', 'Did you mean “https://intranet.example”?'],
    ['https://*.example', 'names no single origin'],
    ['*', 'names no single origin'],
    ['ftp://files.example', 'begins with https:// or http://'],
    ['https://me:pw@intranet.example', 'carries a user name'],
  ])('says what is wrong with %s', (origin, words) => expect(originFault(origin)).toContain(words));

  it('reads one origin to a line', () => {
    expect(originsIn(' https://a.example \n\nhttps://b.example\n')).toEqual([
      'https://a.example',
      'https://b.example',
    ]);
  });

  it('wants at least one, and names every fault', () => {
    const control = new FormControl('', { nonNullable: true });
    expect(originsValidator(control)?.origins).toHaveLength(1);
    control.setValue('a.example\nb.example\nhttps://c.example');
    expect(originsValidator(control)?.origins).toHaveLength(2);
    control.setValue('https://c.example');
    expect(originsValidator(control)).toBeNull();
  });
});
