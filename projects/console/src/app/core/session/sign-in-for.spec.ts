import { isInside } from './sign-in-for';

describe('where the sign-in may lead', () => {
  it.each(['/usage', '/usage?answer=fail', '/checks/waler#r=abc'])('goes to %s', (to) =>
    expect(isInside(to)).toBe(true),
  );

  it.each(['//evil.example', '/\\evil.example', 'https://evil.example', '', '/sign-in', undefined])(
    'does not go to %s',
    (to) => expect(isInside(to)).toBe(false),
  );
});
