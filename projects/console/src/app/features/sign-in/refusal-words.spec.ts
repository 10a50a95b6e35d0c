import { Problem } from '../../core/api/problem';
import { refusalWords } from './refusal-words';

const refused = (status: number, detail: string, wait: number | null = null) =>
  refusalWords(new Problem(status, 'code', 'Title', detail, [], null, wait));

describe('what the sign-in says when it refuses', () => {
  it('is the same whatever was wrong', () => {
    expect(refused(401, 'No such person.')).toBe(refused(422, 'Must be an e-mail address.'));
  });

  it('says how long to wait', () => {
    expect(refused(429, '', 40)).toContain('in 40 seconds');
    expect(refused(429, '', 412)).toContain('in 7 minutes');
    expect(refused(429, '')).toContain('a few minutes');
  });
});
