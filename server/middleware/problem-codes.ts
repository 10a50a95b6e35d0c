/** What a code means: the machine's part, and the words of its page at `/problems/{code}`. */
export interface ProblemKind {
  readonly status: number;
  readonly title: string;
  /** Whether the same request may succeed later without a change. */
  readonly retryable: boolean;
  /** Why it happens, for the page. */
  readonly why: string;
  /** What to do about it, for the page. */
  readonly remedy: string;
}

const kind = (
  status: number,
  title: string,
  why: string,
  remedy: string,
  retryable = false,
): ProblemKind => ({ status, title, retryable, why, remedy });

const askAgain = 'Send the same request again after the seconds that Retry-After names.';

/** Every code that an answer can carry at its top. A new one has its page by standing here. */
export const problemKinds = {
  'not-json': kind(
    400,
    'The body is not JSON',
    'The body could not be read as JSON text: it is empty, cut short or not in UTF-8.',
    'Check for a missing bracket, a trailing comma or a value that was never filled in. Numbers have a decimal point, never a comma.',
  ),
  'key-required': kind(
    401,
    'A key is required',
    'The request carries no key. A key counts only in the Authorization header; one in the query or in the body is ignored, because addresses end up in logs.',
    'Send "Authorization: Bearer YOUR-KEY".',
  ),
  'key-mistyped': kind(
    401,
    'The key is mistyped',
    'The last six characters of a key are a checksum, and they do not fit the rest.',
    'Copy the key again, whole and without spaces. It has 67 characters and begins with htk_, htp_ or htc_.',
  ),
  'key-unknown': kind(
    401,
    'No such key',
    'The key is well formed but is not one of ours.',
    'Ask the administrator of this service for a key. A key is shown once, when it is made, and cannot be shown again.',
  ),
  'key-revoked': kind(
    401,
    'The key was revoked',
    'An administrator has taken the key, or the client it belongs to, out of use.',
    'Ask the administrator for a new key.',
  ),
  'key-expired': kind(
    401,
    'The key has expired',
    'The key was issued for a limited time, which is over.',
    'Ask the administrator for a new key. Rotating a key before it expires lets both work for a while.',
  ),
  'sign-in-required': kind(
    401,
    'Nobody is signed in',
    'This is done by people who are signed in at the console; no key does it. A session ends eight hours after its last request.',
    'Sign in at the console.',
  ),
  'sign-in-refused': kind(
    401,
    'The sign-in is refused',
    'The email and the password do not belong together, or the person is out of use: the answer is the same.',
    'Type both again. The administrator of this service gives a new password.',
  ),
  'permission-missing': kind(
    403,
    'Your roles do not allow it',
    'Each role allows certain things, and none of yours allows this.',
    'Ask an administrator to do it, or to give you the role.',
  ),
  'csrf-token-missing': kind(
    403,
    'The request does not come from our own page',
    'A browser sends the cookie of a session whoever makes it ask. So every change carries a token that only our own pages can read.',
    'Send the csrfToken of GET /v1/session in the header X-CSRF-Token. Reload the page when the session has changed.',
  ),
  'scope-missing': kind(
    403,
    'The key lacks a scope',
    'Each key carries a list of what it may do, and this request needs more.',
    'Use a key with the scope that the answer names, or ask the administrator to add it.',
  ),
  'key-kind': kind(
    403,
    'The wrong kind of key',
    'Secret keys (htk_) are for servers and scripts, page keys (htp_) for pages in a browser, cell keys (htc_) for spreadsheet cells.',
    'Use a key of a kind that the answer names.',
  ),
  'origin-not-allowed': kind(
    403,
    'The key may not be used from this page',
    'A page key works only from the origins on its list: scheme, host and port, compared exactly. A secret key is refused from any page of another site, since whoever opens the page could read it.',
    'Use a page key, and have the exact origin of the page put on its list.',
  ),
  'profile-not-allowed': kind(
    403,
    'The key may not use this factor profile',
    'The key is limited to certain factor profiles, and this is not one of them.',
    'Use one of the profiles that GET /v1/profiles lists for the key.',
  ),
  'not-found': kind(
    404,
    'There is nothing here',
    'No such path, or nothing of that name that the key may know of.',
    'Look the path up in /docs. A path is written without a slash at its end.',
  ),
  'name-taken': kind(
    409,
    'The name is taken',
    'Another client has this name; capitals do not tell them apart.',
    'Choose a name that tells the tools apart in the log.',
  ),
  'client-disabled': kind(
    409,
    'The client is out of use',
    'A client that is out of use gets no new keys.',
    'Take the client into use again, or issue the key for another.',
  ),
  'too-large': kind(
    413,
    'The body is too large',
    'A body may have 1 MB.',
    'Send fewer items at a time.',
  ),
  'media-type': kind(
    415,
    'The body is not declared as JSON',
    'The request does not say that its body is JSON, or names a character set or an encoding that cannot be read.',
    'Send "Content-Type: application/json" and the text in UTF-8.',
  ),
  'not-valid': kind(
    422,
    'The request is not valid',
    'The body is JSON, but some of it is not what the contract asks for. Each place is listed with a JSON pointer.',
    'Mend every place that the list names. /v1/checks/{check}/schema holds the schema of a check.',
  ),
  'query-not-valid': kind(
    422,
    'The query is not valid',
    'A query parameter is unknown, stands twice or has a value that it cannot have. None is ever ignored, so that a misspelt one is not taken for done.',
    'Mend the parameters that the list names.',
  ),
  'outside-scope': kind(
    422,
    'Outside what the check covers',
    'The request is understood, but the check does not cover the case. It is refused, with the clause where there is one, and never answered as a pass.',
    'Read the detail: it says what is not covered. The case needs a calculation by other means.',
  ),
  'profile-required': kind(
    422,
    'A factor profile is required',
    'The request names no factor profile and the client of the key has no default. There is no silent national choice.',
    'Add "profile", for example "uk-na", or have a default set for the client.',
  ),
  'unknown-profile': kind(
    422,
    'No such factor profile',
    'No factor profile, or no revision of it, has this name.',
    'GET /v1/profiles lists the profiles. A revision is pinned as slug@number.',
  ),
  'profile-not-in-effect': kind(
    422,
    'No revision of the profile is in effect',
    'The profile has no approved revision in effect today: they are drafts, withdrawn, expired or begin later.',
    'Pin a revision as slug@number: the answer is then provisional. Or ask for one to be approved.',
  ),
  'profile-value-missing': kind(
    422,
    'The profile lacks a value',
    'The check needs a value that the factor profile does not hold. None is ever assumed.',
    'Use a profile that holds it, or have a revision drafted that does.',
  ),
  'profile-value-unusable': kind(
    422,
    'A value of the profile cannot be used',
    'The factor profile holds a value that is not of the kind that the check needs.',
    'Have a revision drafted that puts it right; the detail names the value.',
  ),
  'rate-limited': kind(
    429,
    'Too many requests',
    'The limit of calls a minute is used up. RateLimit-Policy names the limit, RateLimit what is left of it.',
    'Wait for the seconds that Retry-After names. Many members at a time belong in one batch.',
    true,
  ),
  unexpected: kind(
    500,
    'Something went wrong here',
    'A defect of this service, not of the request.',
    'Tell the administrator the requestId.',
    true,
  ),
  'log-unavailable': kind(
    503,
    'The call could not be logged',
    'Every answer goes out after its row in the usage log is written. The log cannot be written now, so no answer goes out.',
    askAgain,
    true,
  ),
  'database-unavailable': kind(
    503,
    'The database is away',
    'The key, its limit or the factor profile could not be looked up.',
    askAgain,
    true,
  ),
  busy: kind(
    503,
    'Too much to do',
    'More large checks are waiting than can be done soon.',
    askAgain,
    true,
  ),
  'elements-not-built': kind(
    503,
    'The elements are not built',
    'The script of the elements, its fonts and its manifest are made from this repository by the start command, and they are not there.',
    'Tell the administrator of this service: "npm start" builds them and says why when it cannot.',
    true,
  ),
} as const satisfies Readonly<Record<string, ProblemKind>>;

export type ProblemCode = keyof typeof problemKinds;

export const isProblemCode = (code: string): code is ProblemCode =>
  Object.hasOwn(problemKinds, code);
