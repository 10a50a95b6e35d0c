import type { Check, CheckAnswer, Detail } from '../../engine/checks/check';
import type { RefusalItem } from '../../engine/refusal';
import type { Call } from '../../middleware/call';
import { Problem } from '../../middleware/problem';
import type { Borrower } from '../profiles/borrower';
import type { ProfileService } from '../profiles/profiles.service';
import type { RunApart } from './check-runner';

export type Validate = (schemaName: string, body: unknown) => readonly RefusalItem[];

interface CheckDeps {
  readonly profiles: ProfileService;
  readonly validate: Validate;
  readonly run: RunApart;
}

interface Request {
  readonly profile?: string;
}

/** One check from its request to its answer. */
export class CheckService {
  constructor(private readonly deps: CheckDeps) {}

  async answer(
    check: Check,
    {
      body,
      detail,
      borrower,
      call,
    }: { body: unknown; detail: Detail; borrower: Borrower; call: Call },
  ): Promise<CheckAnswer> {
    const { profiles, validate, run } = this.deps;
    const errors = validate(check.requestSchema, body);
    if (errors.length > 0)
      throw new Problem('not-valid', 'Some of the body is not what the check takes.', { errors });
    const profile = await profiles.resolve((body as Request).profile, borrower);
    call.note({ profile: profile.slug, profileRevision: profile.revision });
    const answer = await run(check, body, { profile, detail });
    const { status, utilisation, governing } = answer;
    call.note({ answer: status, utilisation, governing });
    return answer;
  }
}
