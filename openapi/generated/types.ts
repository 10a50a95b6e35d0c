/* Generated from openapi/ by `npm run contract`. Do not change by hand. */
export interface paths {
    readonly "/v1/checks": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the checks
         * @description The checks that this service makes.
         */
        readonly get: operations["listChecks"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/waler": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check a waler
         * @description A member over props: bending, shear, transverse force at every prop, lateral torsional buckling, buckling under thrust, deflection, and loss of a prop where it is asked. Owed, so that the answer is incomplete without them: transverse force or bearing across the grain at every support, lateral torsional buckling, buckling under thrust, deflection. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkWaler"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/beam": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check a beam
         * @description A bearer, a joist, any continuous beam. Owed: as for a waler. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkBeam"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/prop": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check a prop
         * @description A compression member between a waler and its reaction. Owed: buckling about both axes, and an eccentricity. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkProp"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/adjustable-prop": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check an adjustable prop
         * @description A telescopic steel prop of EN 1065, vertical within the tolerance of the standard. Owed: a resistance. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkAdjustableProp"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/member": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check a member
         * @description A member whose design effects are known. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkMember"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/section": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check a cross-section
         * @description Design effects that act together at one cross-section. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkSection"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/stress": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check states of stress
         * @description States of stress, or effects at the named points of a section; each point is answered with id, y, z, sigma, tau and sigma_v. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkStress"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/bearing": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check a bearing
         * @description Timber across the grain, a transverse force on a steel web, or a sole plate on ground. What it does not cover stands in `notCovered`.
         */
        readonly post: operations["checkBearing"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/checks/{check}/schema": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a check's request schema
         * @description The request of one check as JSON Schema, with all that it refers to.
         */
        readonly get: operations["readCheckSchema"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/formulas/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a formula
         * @description The symbolic formula behind a step, as text and as MathML. The same id always answers the same.
         */
        readonly get: operations["readFormula"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/profiles": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the factor profiles
         * @description The factor profiles that the key may use, each with its revisions.
         */
        readonly get: operations["listProfiles"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/profiles/{slug}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a factor profile
         * @description One revision with all its values, each with its clause and where it comes from.
         */
        readonly get: operations["readProfile"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/sections": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the sections
         * @description Those that begin as searched, in any spelling, then those that hold it. A family's name is the trade's: `RHS`, `SHS` and `CHS` are hot-finished, `CF RHS`, `CF SHS` and `CF CHS` cold-formed. An answer that has not changed is a 304 and counts against no limit.
         */
        readonly get: operations["listSections"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/sections/{designation}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a section
         * @description Its dimensions, and its properties as computed from them. Any spelling will do.
         */
        readonly get: operations["readSection"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/batch": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Make many checks at a time
         * @description Up to 1,000 items, answered in order. Each has its own status; one item's fault leaves its neighbours alone. `keep` is refused.
         */
        readonly post: operations["runBatch"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/batch/{check}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Make many checks from a table
         * @description A header of dotted field names (`section,material.grade,spans,loads.0.value`), constants in the query (`material.type=steel`). A list is numbers separated by space or `+`, with one optional unit at the end, repeats as `3x2.4`. Columns `ref` and `note.*` pass through; any other unknown column is refused. Rows come back in order with `row,status,utilisation,governing,error` and the asked `columns`; the last line is `#end,ROWS`. `decimal=comma` and `sep` say how numbers are written.
         */
        readonly post: operations["runCsvBatch"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/select/waler": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find the lightest section of a waler
         * @description Candidates are ranked by mass; the first that passes is chosen; one that cannot be checked is skipped with its problem. Mass is for the set.
         */
        readonly post: operations["selectWaler"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/select/beam": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find the lightest section of a beam
         * @description Candidates are ranked by mass; the first that passes is chosen; one that cannot be checked is skipped with its problem. Mass is for the set.
         */
        readonly post: operations["selectBeam"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/select/prop": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find the lightest section of a prop
         * @description Candidates are ranked by mass; the first that passes is chosen; one that cannot be checked is skipped with its problem. Mass is for the set.
         */
        readonly post: operations["selectProp"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/select/member": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find the lightest section of a member
         * @description Candidates are ranked by mass; the first that passes is chosen; one that cannot be checked is skipped with its problem. Mass is for the set.
         */
        readonly post: operations["selectMember"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/compare/waler": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Compare a waler under several profiles
         * @description The same member under each profile; the first is what others are compared with.
         */
        readonly post: operations["compareWaler"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/compare/beam": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Compare a beam under several profiles
         * @description The same member under each profile; the first is what others are compared with.
         */
        readonly post: operations["compareBeam"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/compare/prop": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Compare a prop under several profiles
         * @description The same member under each profile; the first is what others are compared with.
         */
        readonly post: operations["compareProp"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/compare/member": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Compare a member under several profiles
         * @description The same member under each profile; the first is what others are compared with.
         */
        readonly post: operations["compareMember"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/limits/waler": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find the greatest load or span of a waler
         * @description The greatest value with which it passes, rounded towards pass; or why there is none.
         */
        readonly post: operations["limitsWaler"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/limits/beam": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find the greatest load or span of a beam
         * @description The greatest value with which it passes, rounded towards pass; or why there is none.
         */
        readonly post: operations["limitsBeam"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/limits/prop": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find the greatest load or span of a prop
         * @description The greatest value with which it passes, rounded towards pass; or why there is none.
         */
        readonly post: operations["limitsProp"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/usage": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read the log
         * @description Calls of all keys, newest first. Needs the scope `admin`.
         */
        readonly get: operations["listUsage"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/usage/{requestId}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read one call
         * @description The call whose answer carried this X-Request-Id. Needs the scope `admin`.
         */
        readonly get: operations["readUsage"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/session": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Ask who is signed in
         * @description Also what they may do, and the token that every change carries. Nobody signed in is an answer, too.
         */
        readonly get: operations["readSession"];
        readonly put?: never;
        /**
         * Sign in
         * @description Sets the cookie of a session. Unknown people and wrong passwords get the same answer after the same time; ten failures in a quarter of an hour are all that one address has at one account.
         */
        readonly post: operations["signIn"];
        /**
         * Sign out
         * @description Ends the session, here and in the database. Done twice it answers the same.
         */
        readonly delete: operations["signOut"];
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/clients": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the clients
         * @description The tools that call the service, by name. Needs the permission `clients:read`.
         */
        readonly get: operations["listClients"];
        readonly put?: never;
        /**
         * Make a client
         * @description Needs the permission `clients:write`.
         */
        readonly post: operations["makeClient"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/clients/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a client
         * @description Needs the permission `clients:read`.
         */
        readonly get: operations["readClient"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        /**
         * Change a client
         * @description Needs the permission `clients:write`. Out of use, none of its keys opens, within moments.
         */
        readonly patch: operations["changeClient"];
        readonly trace?: never;
    };
    readonly "/v1/clients/{id}/keys": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the keys of a client
         * @description Never more than the public part of each. Needs the permission `keys:read`.
         */
        readonly get: operations["listKeys"];
        readonly put?: never;
        /**
         * Issue a key
         * @description The answer holds the text of the key: this once, never again. Needs the permission `keys:write`.
         */
        readonly post: operations["issueKey"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/keys/{selector}/revoke": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Revoke a key
         * @description For good. No call with it begins more than two seconds later, and as a rule none after milliseconds. Needs the permission `keys:write`.
         */
        readonly post: operations["revokeKey"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/openapi.json": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read this contract
         * @description What is answered today, as OpenAPI 3.1.
         */
        readonly get: operations["readContract"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/healthz": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Ask whether the process answers
         * @description For a supervisor.
         */
        readonly get: operations["isAlive"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/readyz": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Ask whether the service is ready
         * @description For a load balancer. A missing partition of the log is a warning, not a reason to be taken out.
         */
        readonly get: operations["isReady"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/problems": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List every problem
         * @description Every code that an answer can carry: a page for people, JSON for programs that ask for it.
         */
        readonly get: operations["listProblems"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/problems/{code}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read what a problem means
         * @description Why it happens and what to do: a page for people, JSON for programs that ask for it.
         */
        readonly get: operations["readProblem"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
}
export type webhooks = Record<string, never>;
export interface components {
    schemas: {
        /**
         * @description The last part of a check's path.
         * @enum {string}
         */
        readonly CheckId: "waler" | "beam" | "prop" | "adjustable-prop" | "member" | "section" | "stress" | "bearing";
        /** One check */
        readonly CheckSummary: {
            readonly id: components["schemas"]["CheckId"];
            readonly title: string;
            /** @description Where it is asked. */
            readonly path: string;
            /** @description Where its request is described. */
            readonly schema: string;
        };
        /** @description Token of the next page, `null` after the last. */
        readonly NextPageToken: string | null;
        /** The checks there are */
        readonly CheckList: {
            readonly items: readonly components["schemas"]["CheckSummary"][];
            readonly nextPageToken: components["schemas"]["NextPageToken"];
        };
        /** One thing the caller can mend */
        readonly ProblemItem: {
            /**
             * @description JSON pointer into the request.
             * @example /spans/0
             */
            readonly pointer: string;
            /**
             * @description Stable word for programs.
             * @example must-be-positive
             */
            readonly code: string;
            /** @description What is wrong. */
            readonly message: string;
            /** @description What to do, where it is known. */
            readonly fix?: string;
            /** @description Publication and clause that sets the limit. */
            readonly clause?: string;
        };
        /**
         * Problem
         * @description RFC 9457 problem details.
         */
        readonly Problem: {
            /**
             * Format: uri-reference
             * @description A path under `/problems/`, which answers with a page that explains it.
             */
            readonly type: string;
            /** @description What kind of problem. */
            readonly title: string;
            /** @description The HTTP status. */
            readonly status: number;
            /** @description What happened here. */
            readonly detail: string;
            /**
             * Format: uri-reference
             * @description The path that was asked.
             */
            readonly instance: string;
            /**
             * @description Stable word for programs.
             * @example not-valid
             */
            readonly code: string;
            /** @description The log's own id of the request. */
            readonly requestId: string;
            /** @description Whether the same request may succeed later. */
            readonly retryable: boolean;
            /** @description What is at fault, most specific first. */
            readonly errors: readonly components["schemas"]["ProblemItem"][];
        };
        /**
         * @description A factor profile: `uk-na` is the newest approved revision in effect, `uk-na@2` pins one. Required unless the key's client has a default; there is no silent national choice.
         * @example uk-na
         * @example uk-na@2
         */
        readonly ProfileName: string;
        /**
         * @description Designation in the catalogue.
         * @example UB 457x191x67
         * @example IPE200
         * @example SHS 150x150x8
         */
        readonly SectionName: string;
        /**
         * @description Members that share the load side by side. Loads, thrust, self-weight and reactions are for the set; every effect and resistance is for one member. No built-up action is taken.
         * @default 1
         */
        readonly MemberCount: number;
        /**
         * @description The members are joined so that they share equally; silences `unequal-sharing`.
         * @default false
         */
        readonly MembersConnected: boolean;
        /** @description Part of the load on the member that is verified. Default 1/count. A ratio. */
        readonly MemberShare: number;
        /**
         * A quantity
         * @description A number in the field's default unit, or text `number space unit` such as `2400 mm` or `8 ft`. The field's own `x-quantity` names its unit, its sign and its limit. A wrong dimension is refused; text is parsed against a closed list of units and never evaluated.
         * @example 2.4
         * @example 2400 mm
         * @example 8 ft
         */
        readonly QuantityInput: number | string;
        /**
         * Properties that override computed ones
         * @description Of one member. Each override is named in the working.
         */
        readonly SectionOverrides: {
            /** @description Area. */
            readonly A?: components["schemas"]["QuantityInput"];
            /** @description Second moment of area about y-y. */
            readonly Iy?: components["schemas"]["QuantityInput"];
            /** @description Second moment of area about z-z. */
            readonly Iz?: components["schemas"]["QuantityInput"];
            /** @description Elastic modulus about y-y. */
            readonly Wely?: components["schemas"]["QuantityInput"];
            /** @description Elastic modulus about z-z. */
            readonly Welz?: components["schemas"]["QuantityInput"];
            /** @description Plastic modulus about y-y. */
            readonly Wply?: components["schemas"]["QuantityInput"];
            /** @description Plastic modulus about z-z. */
            readonly Wplz?: components["schemas"]["QuantityInput"];
            /** @description Radius of gyration about y-y. */
            readonly iy?: components["schemas"]["QuantityInput"];
            /** @description Radius of gyration about z-z. */
            readonly iz?: components["schemas"]["QuantityInput"];
            /** @description St Venant torsion constant. */
            readonly It?: components["schemas"]["QuantityInput"];
            /** @description Warping constant. */
            readonly Iw?: components["schemas"]["QuantityInput"];
            /** @description Shear area along z-z. */
            readonly Avz?: components["schemas"]["QuantityInput"];
            /** @description Shear area along y-y. */
            readonly Avy?: components["schemas"]["QuantityInput"];
        };
        /** Section of the catalogue, with overrides */
        readonly SectionByDesignation: {
            readonly designation: components["schemas"]["SectionName"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /**
         * @description Rolled or welded; it sets the buckling curves and the shear area.
         * @default rolled
         * @enum {string}
         */
        readonly Fabrication: "rolled" | "welded";
        /** I or H section by dimensions */
        readonly SectionI: {
            /** @constant */
            readonly shape: "I";
            /** @description Depth. */
            readonly h: components["schemas"]["QuantityInput"];
            /** @description Width of the flanges. */
            readonly b: components["schemas"]["QuantityInput"];
            /** @description Thickness of the web. */
            readonly tw: components["schemas"]["QuantityInput"];
            /** @description Thickness of the flanges. */
            readonly tf: components["schemas"]["QuantityInput"];
            /** @description Root radius of a rolled section, leg of the weld of a welded one. Default 0. */
            readonly r?: components["schemas"]["QuantityInput"];
            readonly fabrication?: components["schemas"]["Fabrication"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /** Channel by dimensions */
        readonly SectionChannel: {
            /** @constant */
            readonly shape: "channel";
            /** @description Depth. */
            readonly h: components["schemas"]["QuantityInput"];
            /** @description Width of the flanges. */
            readonly b: components["schemas"]["QuantityInput"];
            /** @description Thickness of the web. */
            readonly tw: components["schemas"]["QuantityInput"];
            /** @description Thickness of the flanges. */
            readonly tf: components["schemas"]["QuantityInput"];
            /** @description Root radius. Default 0. */
            readonly r?: components["schemas"]["QuantityInput"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /**
         * @description How a hollow section was formed; it sets the buckling curve and the corner radii.
         * @enum {string}
         */
        readonly Forming: "hot-finished" | "cold-formed";
        /** Rectangular hollow section by dimensions */
        readonly SectionRhs: {
            /** @constant */
            readonly shape: "RHS";
            /** @description Depth. */
            readonly h: components["schemas"]["QuantityInput"];
            /** @description Width. */
            readonly b: components["schemas"]["QuantityInput"];
            /** @description Thickness of the walls. */
            readonly t: components["schemas"]["QuantityInput"];
            readonly forming: components["schemas"]["Forming"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /** Square hollow section by dimensions */
        readonly SectionShs: {
            /** @constant */
            readonly shape: "SHS";
            /** @description Depth and width. */
            readonly h: components["schemas"]["QuantityInput"];
            /** @description Thickness of the walls. */
            readonly t: components["schemas"]["QuantityInput"];
            readonly forming: components["schemas"]["Forming"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /** Circular hollow section by dimensions */
        readonly SectionChs: {
            /** @constant */
            readonly shape: "CHS";
            /** @description Outer diameter. */
            readonly d: components["schemas"]["QuantityInput"];
            /** @description Thickness of the wall. */
            readonly t: components["schemas"]["QuantityInput"];
            readonly forming: components["schemas"]["Forming"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /**
         * Angle by dimensions
         * @description It buckles about u-u and v-v. Bending only with the load through the shear centre.
         */
        readonly SectionAngle: {
            /** @constant */
            readonly shape: "angle";
            /** @description Length of the leg along z-z. */
            readonly h: components["schemas"]["QuantityInput"];
            /** @description Length of the leg along y-y. */
            readonly b: components["schemas"]["QuantityInput"];
            /** @description Thickness of the legs. */
            readonly t: components["schemas"]["QuantityInput"];
            /** @description Root radius. Default 0. */
            readonly r1?: components["schemas"]["QuantityInput"];
            /** @description Toe radius. Default 0. */
            readonly r2?: components["schemas"]["QuantityInput"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /** Solid rectangle */
        readonly SectionRectangle: {
            /** @constant */
            readonly shape: "rectangle";
            /** @description Width, along y-y. */
            readonly b: components["schemas"]["QuantityInput"];
            /** @description Depth, along z-z. */
            readonly h: components["schemas"]["QuantityInput"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /** Solid round */
        readonly SectionRound: {
            /** @constant */
            readonly shape: "round";
            /** @description Diameter. */
            readonly d: components["schemas"]["QuantityInput"];
            readonly count?: components["schemas"]["MemberCount"];
            readonly connected?: components["schemas"]["MembersConnected"];
            readonly share?: components["schemas"]["MemberShare"];
            readonly properties?: components["schemas"]["SectionOverrides"];
        };
        /**
         * Section
         * @description A catalogue designation as text (spacing, case and word order are forgiven), a designation with overrides, or a shape with its dimensions in mm.
         */
        readonly SectionInput: components["schemas"]["SectionName"] | components["schemas"]["SectionByDesignation"] | components["schemas"]["SectionI"] | components["schemas"]["SectionChannel"] | components["schemas"]["SectionRhs"] | components["schemas"]["SectionShs"] | components["schemas"]["SectionChs"] | components["schemas"]["SectionAngle"] | components["schemas"]["SectionRectangle"] | components["schemas"]["SectionRound"];
        /**
         * @description Grade, such as S275 or S355; its strengths are those of the thickest part.
         * @example S275
         */
        readonly SteelGrade: string;
        /** Steel by grade */
        readonly SteelByGrade: {
            /** @constant */
            readonly type: "steel";
            readonly grade: components["schemas"]["SteelGrade"];
            /** @description Modulus of elasticity. Default 210000 N/mm². */
            readonly E?: components["schemas"]["QuantityInput"];
            /** @description Shear modulus. Default 81000 N/mm². */
            readonly G?: components["schemas"]["QuantityInput"];
        };
        /** Steel by strength */
        readonly SteelByStrength: {
            /** @constant */
            readonly type: "steel";
            /** @description Yield strength of the thickest part. */
            readonly fy: components["schemas"]["QuantityInput"];
            /** @description Ultimate strength. */
            readonly fu?: components["schemas"]["QuantityInput"];
            /** @description Modulus of elasticity. Default 210000 N/mm². */
            readonly E?: components["schemas"]["QuantityInput"];
            /** @description Shear modulus. Default 81000 N/mm². */
            readonly G?: components["schemas"]["QuantityInput"];
        };
        /**
         * @description Strength class of EN 338 (`C24`, `D40`) or EN 14080 (`GL24h`).
         * @example C24
         * @example GL24h
         */
        readonly TimberClass: string;
        /**
         * @description Service class of EN 1995-1-1 2.3.1.3.
         * @enum {integer}
         */
        readonly ServiceClass: 1 | 2 | 3;
        /**
         * @description The member shares its load with others side by side (EN 1995-1-1 6.6, k_sys).
         * @default false
         */
        readonly LoadSharing: boolean;
        /** Timber by strength class */
        readonly TimberByClass: {
            /** @constant */
            readonly type: "timber";
            readonly class: components["schemas"]["TimberClass"];
            readonly serviceClass: components["schemas"]["ServiceClass"];
            readonly loadSharing?: components["schemas"]["LoadSharing"];
        };
        /** Characteristic strengths, stiffnesses and density */
        readonly TimberStrengths: {
            /** @description Bending strength. */
            readonly fmk: components["schemas"]["QuantityInput"];
            /** @description Tension along the grain. */
            readonly ft0k: components["schemas"]["QuantityInput"];
            /** @description Compression along the grain. */
            readonly fc0k: components["schemas"]["QuantityInput"];
            /** @description Compression across the grain. */
            readonly fc90k: components["schemas"]["QuantityInput"];
            /** @description Shear strength. */
            readonly fvk: components["schemas"]["QuantityInput"];
            /** @description Mean modulus of elasticity along the grain. */
            readonly E0mean: components["schemas"]["QuantityInput"];
            /** @description Fifth percentile modulus of elasticity. */
            readonly E005: components["schemas"]["QuantityInput"];
            /** @description Mean shear modulus. */
            readonly Gmean: components["schemas"]["QuantityInput"];
            /** @description Characteristic density in kg/m³. */
            readonly rhok: number;
            /** @description Mean density in kg/m³. */
            readonly rhomean: number;
        };
        /**
         * @description What the strengths are of; it sets gamma_M, k_h and k_mod.
         * @enum {string}
         */
        readonly TimberProduct: "solid" | "glulam" | "lvl";
        /** Timber by strengths */
        readonly TimberByStrengths: {
            /** @constant */
            readonly type: "timber";
            readonly strengths: components["schemas"]["TimberStrengths"];
            readonly product: components["schemas"]["TimberProduct"];
            readonly serviceClass: components["schemas"]["ServiceClass"];
            readonly loadSharing?: components["schemas"]["LoadSharing"];
        };
        /** Material */
        readonly MaterialInput: components["schemas"]["SteelByGrade"] | components["schemas"]["SteelByStrength"] | components["schemas"]["TimberByClass"] | components["schemas"]["TimberByStrengths"];
        /**
         * @description `characteristic`: the profile's partial and combination factors are applied. `design`: every value counts once, by 1. Nothing is ever factored twice.
         * @enum {string}
         */
        readonly LoadBasis: "characteristic" | "design";
        /** @description The spans from the first support to the last. */
        readonly Spans: readonly components["schemas"]["QuantityInput"][];
        /** Overhangs beyond the outermost supports */
        readonly Overhangs: {
            /** @description Before the first support. Default 0. */
            readonly start?: components["schemas"]["QuantityInput"];
            /** @description Beyond the last support. Default 0. */
            readonly end?: components["schemas"]["QuantityInput"];
        };
        /**
         * @description Name of the source of a load. The same name is one source and takes one factor, wherever it stands, thrust included.
         * @example earth
         */
        readonly SourceName: string;
        /**
         * @description What kind of action it is; this sets its partial factor.
         * @enum {string}
         */
        readonly Nature: "permanent" | "variable" | "accidental";
        /**
         * @description Category of a variable action, which gives its combination factors psi and its default load duration. The profile lists its own.
         * @example construction
         */
        readonly Category: string;
        /**
         * @description Load-duration class of EN 1995-1-1 Table 2.1; it sets k_mod of timber and has no effect on steel.
         * @enum {string}
         */
        readonly LoadDuration: "permanent" | "long-term" | "medium-term" | "short-term" | "instantaneous";
        /**
         * @description Whether a variable load may be absent span by span (EN 1990 4.1.1, 6.4.3.1). `false`: it is there as a whole or not at all.
         * @default true
         */
        readonly PatternLoading: boolean;
        /** Uniform line load */
        readonly UniformLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "uniform";
            /** @description Line load, positive towards the supports. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Where it begins, from the first support. Default: the start of the member. */
            readonly from?: components["schemas"]["QuantityInput"];
            /** @description Where it ends, from the first support. Default: the end of the member. */
            readonly to?: components["schemas"]["QuantityInput"];
        };
        /** Line load that varies linearly */
        readonly LinearLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "linear";
            /** @description Line load where it begins, positive towards the supports. */
            readonly start: components["schemas"]["QuantityInput"];
            /** @description Line load where it ends, positive towards the supports. */
            readonly end: components["schemas"]["QuantityInput"];
            /** @description Where it begins, from the first support. Default: the start of the member. */
            readonly from?: components["schemas"]["QuantityInput"];
            /** @description Where it ends, from the first support. Default: the end of the member. */
            readonly to?: components["schemas"]["QuantityInput"];
        };
        /** Point load */
        readonly PointLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "point";
            /** @description Force, positive towards the supports. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Where it acts, from the first support; negative on the start overhang. */
            readonly at: components["schemas"]["QuantityInput"];
        };
        /** Area load on a width */
        readonly AreaLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "area";
            /** @description Area load, positive towards the supports. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Width that the member carries. */
            readonly width: components["schemas"]["QuantityInput"];
            /** @description Where it begins, from the first support. Default: the start of the member. */
            readonly from?: components["schemas"]["QuantityInput"];
            /** @description Where it ends, from the first support. Default: the end of the member. */
            readonly to?: components["schemas"]["QuantityInput"];
        };
        /** Moment applied at a point */
        readonly MomentLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "moment";
            /** @description Moment; positive where the bending moment M rises by it as x passes. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Where it acts, from the first support; negative on the start overhang. */
            readonly at: components["schemas"]["QuantityInput"];
        };
        /** Load */
        readonly Load: components["schemas"]["UniformLoad"] | components["schemas"]["LinearLoad"] | components["schemas"]["PointLoad"] | components["schemas"]["AreaLoad"] | components["schemas"]["MomentLoad"];
        /** @description All loads across the member. At most 6 variable and 6 permanent names, thrust included. Give either `loads` or `loadSets`. */
        readonly Loads: readonly components["schemas"]["Load"][];
        /**
         * @description Name of the set; the governing one is named in the answer.
         * @example DA1-C1
         */
        readonly LoadSetId: string;
        /**
         * @description Design situation of EN 1990 3.2, or `serviceability`.
         * @enum {string}
         */
        readonly Situation: "persistent" | "accidental" | "serviceability";
        /** A load case that the caller combined or wants combined */
        readonly LoadSet: {
            readonly id: components["schemas"]["LoadSetId"];
            readonly situation: components["schemas"]["Situation"];
            /**
             * @description `A1`: the profile's factors for actions are applied. `none`: every value counts once, by 1.
             * @enum {string}
             */
            readonly combination: "A1" | "none";
            /** @description The loads of this set. */
            readonly loads: readonly components["schemas"]["Load"][];
        };
        /** @description Instead of `loads`. All are evaluated; the worst governs and is named. */
        readonly LoadSets: readonly components["schemas"]["LoadSet"][];
        /** Axial compression from one source */
        readonly AxialLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            /** @description Compression; never negative. */
            readonly value: components["schemas"]["QuantityInput"];
        };
        /** @description Axial compression along the whole member, from return walers. */
        readonly Thrust: readonly components["schemas"]["AxialLoad"][];
        /** @description Stiffness of each support along the load, as many as there are supports; `null` is rigid. */
        readonly SupportStiffness: readonly (null | components["schemas"]["QuantityInput"])[];
        /**
         * Supports that carry the waler's own weight
         * @description Hangers or brackets. Default the props.
         */
        readonly VerticalSupports: {
            /** @description Distance between hangers or brackets. */
            readonly spacing: components["schemas"]["QuantityInput"];
        };
        /**
         * @description Held all along, or at the supports only.
         * @enum {string}
         */
        readonly RestraintWord: "full" | "at-supports";
        /** Restraints at a spacing */
        readonly RestraintSpacing: {
            /** @description Distance between restraints, counted from the first support. */
            readonly spacing: components["schemas"]["QuantityInput"];
        };
        /** @description How one face is held. */
        readonly FaceRestraint: components["schemas"]["RestraintWord"] | components["schemas"]["RestraintSpacing"];
        /** Restraint of each face */
        readonly RestraintOfFaces: {
            readonly loadedFace?: components["schemas"]["FaceRestraint"];
            readonly propFace?: components["schemas"]["FaceRestraint"];
        };
        /**
         * Lateral restraint
         * @description `full`, `at-supports` or a spacing hold both flanges, or the twist, there. With faces named, a face that is not named is held at the supports only, and a face earns credit only where it is in compression. Points of zero moment are never restraints. Default `at-supports`.
         */
        readonly Restraint: components["schemas"]["RestraintWord"] | components["schemas"]["RestraintSpacing"] | components["schemas"]["RestraintOfFaces"];
        /**
         * @description The height at which the transverse load acts, seen along its direction.
         * @enum {string}
         */
        readonly LoadLevel: "top" | "shear-centre" | "bottom";
        /** Stiff bearing at each support */
        readonly StiffBearing: {
            /** @description Length of bearing along the member (s_s, or the bearing length across the grain). */
            readonly length: components["schemas"]["QuantityInput"];
            /** @description Distance c from the end of the member to the nearer edge of the outermost bearing. Default 0. */
            readonly endDistance?: components["schemas"]["QuantityInput"];
        };
        /**
         * @description `true`: every prop, ends included, is taken away, one at a time. A list: those, counted from 1. EN 1990 6.11 with A_d = 0.
         * @default false
         */
        readonly LossOfProp: boolean | readonly number[];
        /**
         * @description A part of the span between supports; an overhang counts twice its length. A bare number is refused.
         * @example span/200
         */
        readonly DeflectionRatio: string;
        /** Limits of the deflection */
        readonly DeflectionLimits: {
            readonly instant?: components["schemas"]["DeflectionRatio"];
            readonly final?: components["schemas"]["DeflectionRatio"];
            readonly netFinal?: components["schemas"]["DeflectionRatio"];
        };
        /**
         * Limit of the deflection
         * @description One limit for all, or one for each. Default the profile's.
         */
        readonly DeflectionLimit: components["schemas"]["DeflectionRatio"] | components["schemas"]["DeflectionLimits"];
        /** @description Buckling length over system length, about each axis. */
        readonly BucklingFactors: {
            /**
             * @description About y-y, in the plane of the loads. A ratio.
             * @default 1
             */
            readonly y?: number;
            /**
             * @description About z-z, out of that plane. A ratio.
             * @default 1
             */
            readonly z?: number;
        };
        /**
         * @description Interaction factors k_ij from EN 1993-1-1 Annex A (method 1) or Annex B (method 2). Default: the profile's.
         * @enum {string}
         */
        readonly InteractionMethod: "annex-A" | "annex-B";
        /**
         * @description Lateral torsional buckling curves by EN 1993-1-1 6.3.2.2 (`general`) or 6.3.2.3 (`rolled`, I and H sections only). Default: the profile's.
         * @enum {string}
         */
        readonly LateralTorsionalMethod: "general" | "rolled";
        /**
         * @description One verification of the contract.
         * @enum {string}
         */
        readonly VerificationId: "tension" | "compression" | "bending-y" | "bending-z" | "shear-z" | "shear-y" | "torsion" | "shear-torsion" | "bending-shear-y" | "bending-shear-z" | "bending-axial-y" | "bending-axial-z" | "biaxial" | "flexural-buckling-y" | "flexural-buckling-z" | "flexural-buckling-u" | "flexural-buckling-v" | "torsional-buckling" | "torsional-flexural-buckling" | "lateral-torsional-buckling" | "interaction-y" | "interaction-z" | "interaction-lt" | "von-mises" | "transverse-force" | "transverse-force-bending" | "web-buckling-shear" | "flange-induced-buckling" | "bearing-across-grain" | "bearing-at-angle" | "notch" | "ground-bearing" | "adjustable-prop" | "deflection" | "deflection-final" | "deflection-net-final";
        /** @description Why, in the caller's own words. It is printed beside the status everywhere. */
        readonly Reason: string;
        /** A verification the caller takes upon themselves */
        readonly Waiver: {
            readonly verification: components["schemas"]["VerificationId"];
            readonly reason: components["schemas"]["Reason"];
        };
        /** @description Owed verifications that the caller takes upon themselves. They are printed beside the status everywhere. */
        readonly Waivers: readonly components["schemas"]["Waiver"][];
        /**
         * Waler check
         * @description A member over props. x runs from the first support in m, negative on the start overhang; a transverse load is positive towards the supports.
         */
        readonly WalerRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default compression-only
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about z-z, between props or between `verticalSupports`.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly verticalSupports?: components["schemas"]["VerticalSupports"];
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /**
         * @description `pass`: everything the check owes was verified and holds. `fail` outranks all. `incomplete`: what was verified holds, but an owed verification was not made for want of an input. `provisional`: would pass, but rests on a revision or a value that is not approved and confirmed. Only `pass` is a pass.
         * @enum {string}
         */
        readonly CheckStatus: "pass" | "fail" | "incomplete" | "provisional";
        /** An owed verification that was not made */
        readonly MissingItem: {
            /** @description JSON pointer to the field of the request that is wanting. */
            readonly pointer: string;
            readonly verification: components["schemas"]["VerificationId"];
            /** @description Why it was not made. */
            readonly reason: string;
            /** @description Publication and clause. */
            readonly clause?: string;
        };
        /** An owed verification that the caller waived */
        readonly WaivedItem: {
            readonly verification: components["schemas"]["VerificationId"];
            /** @description The caller's own. */
            readonly reason: string;
        };
        /**
         * @description The Eurocode's own symbol, subscripts joined by `_`, commas dropped.
         * @example M_c_y_Rd
         */
        readonly Symbol: string;
        /**
         * @description Units of an answer; `1` is a ratio, a class or a count.
         * @enum {string}
         */
        readonly Unit: "mm" | "mm^2" | "mm^3" | "mm^4" | "mm^6" | "m" | "N" | "kN" | "N/mm" | "kN/m" | "kN/m^2" | "kN m" | "kN m^2" | "kN/mm" | "N/mm^2" | "kg/m" | "kg/m^3" | "m/s" | "K" | "deg" | "1";
        /** A named number with its unit */
        readonly SymbolQuantity: {
            readonly symbol: components["schemas"]["Symbol"];
            /** @description Full double precision. */
            readonly value: number;
            readonly unit: components["schemas"]["Unit"];
        };
        /**
         * @description Whether this one criterion holds; a verification that was not made is in `missing`.
         * @enum {string}
         */
        readonly VerificationStatus: "pass" | "fail";
        /** A place on the member */
        readonly Place: {
            /** @description 1 to n; 0 and n+1 are the overhangs. */
            readonly span: number;
            /** @description From the first support, in m. */
            readonly x: number;
            /** @description The support it lies on, counted from 1. */
            readonly support?: number;
        };
        /** A number with its unit */
        readonly Quantity: {
            /** @description Full double precision. */
            readonly value: number;
            readonly unit: components["schemas"]["Unit"];
        };
        /** @description Values by symbol. */
        readonly Values: {
            readonly [key: string]: components["schemas"]["Quantity"];
        };
        /** One verification */
        readonly Verification: {
            readonly id: components["schemas"]["VerificationId"];
            /** @description What is verified. */
            readonly title: string;
            /** @description Publication and clause of the criterion. */
            readonly clause: string;
            readonly effect: components["schemas"]["SymbolQuantity"];
            readonly resistance: components["schemas"]["SymbolQuantity"];
            /** @description Left over right side of the criterion as printed ((6.1): its square root). `null` where the resistance is zero; `reason` says why. */
            readonly utilisation: number | null;
            /** @description Why there is no utilisation. */
            readonly reason?: string;
            readonly status: components["schemas"]["VerificationStatus"];
            /** @description Id of the combination that governs; `null` where there is none. */
            readonly combination: string | null;
            /** @description Where it governs; `null` where the whole member is meant. */
            readonly at: components["schemas"]["Place"] | null;
            /**
             * @description The named point of the section, or the state of stress counted from 1 (`state-3`), where it governs.
             * @example flange-tip-top-right
             * @example state-3
             */
            readonly point?: string;
            readonly values: components["schemas"]["Values"];
        };
        /** One line of the working */
        readonly Step: {
            /**
             * @description A formula with numbers put in, a given value, or a choice with its reason.
             * @enum {string}
             */
            readonly kind: "formula" | "given" | "choice";
            /** @description Id under `/v1/formulas`; `null` for a choice. */
            readonly formula: string | null;
            /** @description The verification it belongs to; `null` for what depends on section, material and profile only. */
            readonly verification: components["schemas"]["VerificationId"] | null;
            /** @description What the line gives. */
            readonly symbol: string | null;
            /** @description The line in words. */
            readonly title: string;
            /** @description The line with its numbers in mathjs syntax with units; it evaluates to `value`. */
            readonly substituted: string;
            /** @description Why a choice was made, in words with the numbers that decided. */
            readonly because?: string;
            /** @description The number that the line gives; for a choice a number or a word. */
            readonly value: number | string;
            readonly unit: components["schemas"]["Unit"];
            /** @description Publication and clause. */
            readonly clause: string;
            /** @description What was put in, by symbol. */
            readonly inputs: {
                readonly [key: string]: components["schemas"]["Quantity"];
            };
        };
        /** One combination */
        readonly CombinationLine: {
            /**
             * @description Named by verifications and reactions.
             * @example C7
             */
            readonly id: string;
            readonly situation: components["schemas"]["Situation"];
            /** @description Expression of EN 1990, such as 6.10b. */
            readonly expression: string;
            /** @description The load set that it was made of. */
            readonly loadSet?: string;
            /** @description The leading variable action. */
            readonly leading?: string | null;
            /** @description Factor of each action by name; an action that is absent is not listed. */
            readonly factors: {
                readonly [key: string]: number;
            };
            /** @description k_mod of timber. */
            readonly kMod: number | null;
            /** @description Which spans the variable actions stand on; `null`: all. */
            readonly pattern: string | null;
            /** @description The prop that is taken away, counted from 1. */
            readonly lostSupport: number | null;
            /** @description Supports that lift, counted from 1. */
            readonly lifted: readonly number[];
        };
        /**
         * What one action gives
         * @description Characteristic, in kN; it goes unchanged into a prop's `axial`.
         */
        readonly ReactionOfAction: {
            readonly name: string;
            /** @enum {string} */
            readonly nature: "permanent" | "variable" | "accidental";
            readonly category?: string;
            readonly min: number;
            readonly max: number;
        };
        /**
         * Least and greatest design reaction
         * @description In kN.
         */
        readonly DesignReaction: {
            readonly min: number;
            readonly max: number;
            /** @description Id of the combination that gives the greatest. */
            readonly combination: string;
        };
        /**
         * Least and greatest
         * @description In kN for a reaction.
         */
        readonly Range: {
            readonly min: number;
            readonly max: number;
        };
        /**
         * Reaction of one support
         * @description All `count` members together, square to the member, in kN; positive pushes.
         */
        readonly Reaction: {
            /** @description Counted from 1. */
            readonly support: number;
            /** @description From the first support, in m. */
            readonly x: number;
            readonly byAction: readonly components["schemas"]["ReactionOfAction"][];
            readonly design: {
                /** @description `null` where no persistent combination was made. */
                readonly persistent: components["schemas"]["DesignReaction"] | null;
                /** @description `null` where no accidental combination was made. */
                readonly accidental: components["schemas"]["DesignReaction"] | null;
            };
            /** @description `null` where no serviceability combination was made. */
            readonly serviceability: components["schemas"]["Range"] | null;
        };
        /**
         * One point of an envelope
         * @description Moment in kN m, shear in kN, deflection in mm.
         */
        readonly DiagramPoint: {
            /** @description 1 to n; 0 and n+1 are the overhangs. */
            readonly span: number;
            /** @description From the first support, in m. */
            readonly x: number;
            readonly min: number;
            readonly max: number;
        };
        /** Envelopes along the member */
        readonly Diagrams: {
            /** @description In kN m, sagging positive. */
            readonly moment: readonly components["schemas"]["DiagramPoint"][];
            /** @description In kN, dM/dx. */
            readonly shear: readonly components["schemas"]["DiagramPoint"][];
            /** @description In mm, positive with the load. */
            readonly deflection: readonly components["schemas"]["DiagramPoint"][];
        };
        /** A strip of a plate that does not count */
        readonly IneffectiveStrip: {
            /**
             * @description The effect whose effective section leaves it out.
             * @enum {string}
             */
            readonly under: "N" | "My" | "Mz";
            /** @description Of its centre. */
            readonly y: number;
            /** @description Of its centre. */
            readonly z: number;
            /** @description Along y-y. */
            readonly width: number;
            /** @description Along z-z. */
            readonly height: number;
        };
        /**
         * What a drawing of the section needs
         * @description Lengths in mm, from the centroid of the gross section; y to the right, z downwards, as M_y positive stretches z > 0.
         */
        readonly SectionSketch: {
            /** @description Designation or the shape in words. */
            readonly name: string;
            /** @enum {string} */
            readonly shape: "I" | "channel" | "RHS" | "CHS" | "angle" | "rectangle" | "round";
            /**
             * @description Of an I section.
             * @enum {string}
             */
            readonly fabrication?: "rolled" | "welded";
            /** @description By the names of a request: h b tw tf r, slope and r2 of tapered flanges; h b t ro ri of an RHS; d t; h b t r1 r2 of an angle; yc and zc, the centroid from the back of the web or legs. */
            readonly dimensions: {
                readonly [key: string]: number;
            };
            /** @description What class 4 leaves out, under the axial force or under the moment that acts. */
            readonly ineffective: readonly components["schemas"]["IneffectiveStrip"][];
        };
        /**
         * Stress at one point
         * @description In N/mm², tension positive; y and z in mm from the centroid of the gross section.
         */
        readonly StressPoint: {
            /** @example web-centre */
            readonly id: string;
            /** @description The point in words. */
            readonly title: string;
            /** @description `null` for a state of stress. */
            readonly y: number | null;
            /** @description `null` for a state of stress. */
            readonly z: number | null;
            /** @description Along the member. */
            readonly sigma: number;
            /** @description Across it; only of a state of stress. */
            readonly sigmaZ?: number;
            /** @description Shear along the wall, from shear forces and torsion. */
            readonly tau: number;
            /** @description By von Mises. */
            readonly sigma_v: number;
        };
        /** Stress along one wall */
        readonly StressWall: {
            /** @example web */
            readonly id: string;
            /** @description The wall in words. */
            readonly title: string;
            /** @description Its thickness in mm. */
            readonly t: number;
            readonly points: readonly {
                /** @description In mm. */
                readonly y: number;
                /** @description In mm. */
                readonly z: number;
                /** @description In N/mm². */
                readonly sigma: number;
                /** @description In N/mm². */
                readonly tau: number;
            }[];
        };
        /** One axis of an interaction curve */
        readonly InteractionAxis: {
            readonly symbol: components["schemas"]["Symbol"];
            readonly unit: components["schemas"]["Unit"];
        };
        /** A point of an interaction curve */
        readonly InteractionPoint: {
            readonly x: number;
            readonly y: number;
        };
        /**
         * What two effects may be together
         * @description Numbers in the unit of their axis; the curve runs from the axis of one to that of the other.
         */
        readonly InteractionCurve: {
            readonly verification: components["schemas"]["VerificationId"];
            readonly x: components["schemas"]["InteractionAxis"];
            readonly y: components["schemas"]["InteractionAxis"];
            readonly curve: readonly components["schemas"]["InteractionPoint"][];
            /** @description What acts. */
            readonly point: components["schemas"]["InteractionPoint"];
        };
        /**
         * @description Where the revision stands in its approval.
         * @enum {string}
         */
        readonly RevisionStatus: "draft" | "proposed" | "approved" | "withdrawn";
        /**
         * @description What the revision is worth on the day of the answer.
         * @enum {string}
         */
        readonly RevisionStanding: "in-effect" | "not-yet-in-effect" | "draft" | "withdrawn" | "expired";
        /** A departure of the firm from the published set */
        readonly DepartureLine: {
            readonly id: string;
            /** @description Into the tree of the profile, parts joined by a dot. */
            readonly path: string;
            readonly from: number | string | null;
            readonly to: number | string | null;
            readonly reason: string;
        };
        /** A value that nobody confirmed against its source */
        readonly UnconfirmedValue: {
            /** @description Into the tree of the profile, parts joined by a dot. */
            readonly path: string;
            readonly value: number | string;
            readonly clause: string;
        };
        /** The revision that the answer stands on */
        readonly ProfileStamp: {
            /** @example uk-na */
            readonly slug: string;
            readonly revision: number;
            readonly title: string;
            readonly status: components["schemas"]["RevisionStatus"];
            readonly standing: components["schemas"]["RevisionStanding"];
            /** @description Over the canonical JSON of tree and departures, in hex. */
            readonly sha256: string;
            /** @description Those of the revision. */
            readonly departures: readonly components["schemas"]["DepartureLine"][];
            /** @description Recalled values that this check used. */
            readonly unconfirmed: readonly components["schemas"]["UnconfirmedValue"][];
        };
        /** Something a competent reader will want to know */
        readonly Advisory: {
            /** @example unequal-sharing */
            readonly code: string;
            /** @enum {string} */
            readonly severity: "info" | "caution";
            readonly message: string;
            readonly clause?: string;
        };
        /** What the answer stands on */
        readonly Basis: {
            /**
             * @example [
             *       "EN 1993-1-1:2005+A1:2014"
             *     ]
             */
            readonly standards: readonly string[];
            /**
             * @description Semantic version of the numbers.
             * @example 1.0.0
             */
            readonly engine: string;
        };
        /** Where the answer was kept */
        readonly RecordLink: {
            /** @example HT-7F3K-9QD2 */
            readonly reference: string;
            readonly url: string;
        };
        /** Answer of a check */
        readonly CheckAnswer: {
            readonly check: components["schemas"]["CheckId"];
            readonly status: components["schemas"]["CheckStatus"];
            /** @description The greatest; `null` where a resistance is zero or nothing was verified. */
            readonly utilisation: number | null;
            /** @description The verification with the greatest utilisation. */
            readonly governing: components["schemas"]["VerificationId"] | null;
            readonly missing: readonly components["schemas"]["MissingItem"][];
            readonly waived: readonly components["schemas"]["WaivedItem"][];
            /** @description What this check does not verify. */
            readonly notCovered: readonly string[];
            readonly verifications: readonly components["schemas"]["Verification"][];
            /** @description What depends on section, material and profile only, and the values of the governing verification. */
            readonly values: components["schemas"]["Values"];
            /** @description The working; with `detail=full`. */
            readonly steps?: readonly components["schemas"]["Step"][];
            readonly combinations?: readonly components["schemas"]["CombinationLine"][];
            readonly reactions?: readonly components["schemas"]["Reaction"][];
            readonly diagrams?: components["schemas"]["Diagrams"];
            readonly section?: components["schemas"]["SectionSketch"];
            /** @description Stress at each named point of the section or in each state; of `stress` and of `section`. */
            readonly points?: readonly components["schemas"]["StressPoint"][];
            /** @description How stress runs along each wall of the section; with `detail=full`. */
            readonly walls?: readonly components["schemas"]["StressWall"][];
            /** @description What the section carries together, with the point that acts; with `detail=full`. */
            readonly interaction?: readonly components["schemas"]["InteractionCurve"][];
            readonly profile: components["schemas"]["ProfileStamp"];
            readonly advisories: readonly components["schemas"]["Advisory"][];
            readonly basis: components["schemas"]["Basis"];
            /** @description `null` unless the answer was kept. */
            readonly record: components["schemas"]["RecordLink"] | null;
            /** @description The caution that goes with every answer. */
            readonly notice: string;
        };
        /**
         * Beam check
         * @description A bearer, a joist, any continuous beam. x runs from the first support in m, negative on the start overhang; a transverse load is positive towards the supports.
         */
        readonly BeamRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default both-ways
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about y-y, with the loads.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /** Compression between two bounds */
        readonly AxialRange: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            /** @description The least; negative where the action relieves the prop. */
            readonly min: components["schemas"]["QuantityInput"];
            /** @description The greatest. */
            readonly max: components["schemas"]["QuantityInput"];
        };
        /**
         * Compression of a prop from one source
         * @description One `value`, or `min` and `max` as a waler's `reactions.byAction` gives them.
         */
        readonly PropAxial: components["schemas"]["AxialLoad"] | components["schemas"]["AxialRange"];
        /**
         * @description The axis that it bends about.
         * @enum {string}
         */
        readonly BendingAxis: "y" | "z";
        /** Uniform line load across a prop */
        readonly PropUniformLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly axis: components["schemas"]["BendingAxis"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "uniform";
            /** @description Line load, positive in the same direction for all. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Where it begins, from the lower end. Default: the lower end. */
            readonly from?: components["schemas"]["QuantityInput"];
            /** @description Where it ends, from the lower end. Default: the upper end. */
            readonly to?: components["schemas"]["QuantityInput"];
        };
        /** Line load that varies linearly across a prop */
        readonly PropLinearLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly axis: components["schemas"]["BendingAxis"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "linear";
            /** @description Line load where it begins, positive in the same direction for all. */
            readonly start: components["schemas"]["QuantityInput"];
            /** @description Line load where it ends, positive in the same direction for all. */
            readonly end: components["schemas"]["QuantityInput"];
            /** @description Where it begins, from the lower end. Default: the lower end. */
            readonly from?: components["schemas"]["QuantityInput"];
            /** @description Where it ends, from the lower end. Default: the upper end. */
            readonly to?: components["schemas"]["QuantityInput"];
        };
        /** Point load across a prop */
        readonly PropPointLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly axis: components["schemas"]["BendingAxis"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "point";
            /** @description Force, positive in the same direction for all. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Where it acts, from the lower end. */
            readonly at: components["schemas"]["QuantityInput"];
        };
        /** Area load on a width across a prop */
        readonly PropAreaLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly axis: components["schemas"]["BendingAxis"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "area";
            /** @description Area load, positive in the same direction for all. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Width that the member carries. */
            readonly width: components["schemas"]["QuantityInput"];
            /** @description Where it begins, from the lower end. Default: the lower end. */
            readonly from?: components["schemas"]["QuantityInput"];
            /** @description Where it ends, from the lower end. Default: the upper end. */
            readonly to?: components["schemas"]["QuantityInput"];
        };
        /** Moment applied at a point across a prop */
        readonly PropMomentLoad: {
            readonly name: components["schemas"]["SourceName"];
            readonly nature: components["schemas"]["Nature"];
            readonly category?: components["schemas"]["Category"];
            readonly duration?: components["schemas"]["LoadDuration"];
            readonly axis: components["schemas"]["BendingAxis"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "moment";
            /** @description Moment; positive where the bending moment M rises by it as x passes. */
            readonly value: components["schemas"]["QuantityInput"];
            /** @description Where it acts, from the lower end. */
            readonly at: components["schemas"]["QuantityInput"];
        };
        /**
         * Transverse load on a prop
         * @description A load of a beam check with the axis about which it bends.
         */
        readonly PropLoad: components["schemas"]["PropUniformLoad"] | components["schemas"]["PropLinearLoad"] | components["schemas"]["PropPointLoad"] | components["schemas"]["PropAreaLoad"] | components["schemas"]["PropMomentLoad"];
        /**
         * Eccentricity of the axial force at both ends
         * @description The same at both ends, in the worse direction. Default the profile's rule; without one the check is incomplete.
         */
        readonly Eccentricity: {
            /** @description The offset that makes M_y. */
            readonly y?: components["schemas"]["QuantityInput"];
            /** @description The offset that makes M_z. */
            readonly z?: components["schemas"]["QuantityInput"];
        };
        /**
         * Change of temperature of a restrained prop
         * @description N_T = restraintRatio · alpha · deltaT · E · A, a variable action of category temperature, of both signs, leading in turn.
         */
        readonly Thermal: {
            /** @description Difference of temperature; of both signs. */
            readonly deltaT: components["schemas"]["QuantityInput"];
            /** @description Part of the free movement that is prevented. A ratio. */
            readonly restraintRatio: number;
        };
        /**
         * Prop check
         * @description A compression member between a waler and its reaction.
         */
        readonly PropRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            /** @description Length between its ends. */
            readonly length: components["schemas"]["QuantityInput"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            /** @description Compression by source; the reactions of a waler go in unchanged. */
            readonly axial: readonly components["schemas"]["PropAxial"][];
            /** @description Loads across the prop. */
            readonly transverse?: readonly components["schemas"]["PropLoad"][];
            /** @description Angle to the horizontal. Self-weight bends by g cos and adds g L sin to N. Default 0. */
            readonly inclination?: components["schemas"]["QuantityInput"];
            /**
             * @description Whether self-weight counts.
             * @default true
             */
            readonly selfWeight?: boolean;
            /**
             * @description The axis that self-weight bends about.
             * @default y
             * @enum {string}
             */
            readonly selfWeightAxis?: "y" | "z";
            readonly eccentricity?: components["schemas"]["Eccentricity"];
            readonly thermal?: components["schemas"]["Thermal"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        };
        /**
         * Resistance that the maker declares
         * @description A characteristic strength over gamma_M stands against design load, a safe working load against the sum of characteristic loads; never mixed.
         */
        readonly DeclaredResistance: {
            /** @description At the extension. */
            readonly resistance: components["schemas"]["QuantityInput"];
            /**
             * @description What the figure is.
             * @enum {string}
             */
            readonly basis: "characteristic" | "design" | "safe-working-load";
            /** @description Where the figure stands. */
            readonly source: components["schemas"]["Reason"];
        };
        /**
         * Adjustable prop check
         * @description An adjustable telescopic steel prop of EN 1065, vertical within the standard's tolerance.
         */
        readonly AdjustablePropRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            /**
             * @description Class of EN 1065.
             * @enum {string}
             */
            readonly propClass: "A" | "B" | "C" | "D" | "E";
            /** @description Length fully extended. */
            readonly maxLength: components["schemas"]["QuantityInput"];
            /** @description Length fully closed. */
            readonly minLength?: components["schemas"]["QuantityInput"];
            /** @description Length it is used at. */
            readonly extension: components["schemas"]["QuantityInput"];
            /** @description Compression by source. */
            readonly axial: readonly components["schemas"]["PropAxial"][];
            readonly declared?: components["schemas"]["DeclaredResistance"];
            readonly waive?: components["schemas"]["Waivers"];
        };
        /** Timber by strength class, with the duration of its load */
        readonly TimberByClassWithDuration: {
            /** @constant */
            readonly type: "timber";
            readonly class: components["schemas"]["TimberClass"];
            readonly serviceClass: components["schemas"]["ServiceClass"];
            readonly loadSharing?: components["schemas"]["LoadSharing"];
            readonly loadDuration: components["schemas"]["LoadDuration"];
        };
        /** Timber by strengths, with the duration of its load */
        readonly TimberByStrengthsWithDuration: {
            /** @constant */
            readonly type: "timber";
            readonly strengths: components["schemas"]["TimberStrengths"];
            readonly product: components["schemas"]["TimberProduct"];
            readonly serviceClass: components["schemas"]["ServiceClass"];
            readonly loadSharing?: components["schemas"]["LoadSharing"];
            readonly loadDuration: components["schemas"]["LoadDuration"];
        };
        /**
         * Material of a check whose effects are known
         * @description Timber needs the duration of its load, since no load names it.
         */
        readonly MaterialWithDurationInput: components["schemas"]["SteelByGrade"] | components["schemas"]["SteelByStrength"] | components["schemas"]["TimberByClassWithDuration"] | components["schemas"]["TimberByStrengthsWithDuration"];
        /**
         * Buckling lengths
         * @description Each defaults to `length`; 0 is held all along.
         */
        readonly BucklingLengths: {
            /** @description Flexural, about y-y. */
            readonly y?: components["schemas"]["QuantityInput"];
            /** @description Flexural, about z-z. */
            readonly z?: components["schemas"]["QuantityInput"];
            /** @description Torsional. */
            readonly T?: components["schemas"]["QuantityInput"];
            /** @description Lateral torsional. */
            readonly LT?: components["schemas"]["QuantityInput"];
        };
        /** Moment that varies linearly */
        readonly MomentLinear: {
            /**
             * @default linear
             * @constant
             */
            readonly shape?: "linear";
            /** @description At the start. */
            readonly start: components["schemas"]["QuantityInput"];
            /** @description At the end. */
            readonly end: components["schemas"]["QuantityInput"];
        };
        /** Moment under a uniform load */
        readonly MomentUniformLoad: {
            /** @constant */
            readonly shape: "uniform-load";
            /** @description At the start. */
            readonly start: components["schemas"]["QuantityInput"];
            /** @description At the end. */
            readonly end: components["schemas"]["QuantityInput"];
            /** @description At mid-length. */
            readonly mid: components["schemas"]["QuantityInput"];
        };
        /** Moment under a central point load */
        readonly MomentPointLoad: {
            /** @constant */
            readonly shape: "point-load";
            /** @description At the start. */
            readonly start: components["schemas"]["QuantityInput"];
            /** @description At the end. */
            readonly end: components["schemas"]["QuantityInput"];
            /** @description At mid-length. */
            readonly mid: components["schemas"]["QuantityInput"];
        };
        /**
         * A moment along the member
         * @description One quantity: uniform. Start and end, the same sign being single curvature; and `mid` where a load makes the diagram curved or kinked.
         */
        readonly MomentInput: components["schemas"]["QuantityInput"] | components["schemas"]["MomentLinear"] | components["schemas"]["MomentUniformLoad"] | components["schemas"]["MomentPointLoad"];
        /**
         * Design effects along a member
         * @description `compression` or `tension`, at most one, never negative.
         */
        readonly MemberEffects: {
            /** @description N_Ed as compression. */
            readonly compression?: components["schemas"]["QuantityInput"];
            /** @description N_Ed as tension. */
            readonly tension?: components["schemas"]["QuantityInput"];
            /** @description Bending about y-y. */
            readonly My?: components["schemas"]["MomentInput"];
            /** @description Bending about z-z. */
            readonly Mz?: components["schemas"]["MomentInput"];
            /** @description Shear along z-z. */
            readonly Vz?: components["schemas"]["QuantityInput"];
            /** @description Shear along y-y. */
            readonly Vy?: components["schemas"]["QuantityInput"];
        };
        /** @description A factor of equivalent uniform moment. */
        readonly MomentFactor: number;
        /**
         * Member check
         * @description A member whose design effects are known.
         */
        readonly MemberRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialWithDurationInput"];
            /** @description Length between its ends. */
            readonly length: components["schemas"]["QuantityInput"];
            readonly bucklingLengths?: components["schemas"]["BucklingLengths"];
            readonly effects: components["schemas"]["MemberEffects"];
            /** @default shear-centre */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            /** @description Override of C_1, named in the working. A ratio. */
            readonly C1?: number;
            /** @description Override of C_my, named in the working. A ratio. */
            readonly Cmy?: components["schemas"]["MomentFactor"];
            /** @description Override of C_mz, named in the working. A ratio. */
            readonly Cmz?: components["schemas"]["MomentFactor"];
            /** @description Override of C_mLT, named in the working. A ratio. */
            readonly CmLT?: components["schemas"]["MomentFactor"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
        };
        /**
         * Design effects at one cross-section
         * @description `compression` or `tension`, at most one, never negative.
         */
        readonly SectionEffects: {
            /** @description N_Ed as compression. */
            readonly compression?: components["schemas"]["QuantityInput"];
            /** @description N_Ed as tension. */
            readonly tension?: components["schemas"]["QuantityInput"];
            /** @description Bending about y-y. */
            readonly My?: components["schemas"]["QuantityInput"];
            /** @description Bending about z-z. */
            readonly Mz?: components["schemas"]["QuantityInput"];
            /** @description Shear along y-y. */
            readonly Vy?: components["schemas"]["QuantityInput"];
            /** @description Shear along z-z. */
            readonly Vz?: components["schemas"]["QuantityInput"];
            /** @description Torsion; on an open section with its parts `stVenant` and `warping`. */
            readonly T?: components["schemas"]["QuantityInput"];
            /** @description St Venant part of T. */
            readonly stVenant?: components["schemas"]["QuantityInput"];
            /** @description Warping part of T. */
            readonly warping?: components["schemas"]["QuantityInput"];
            /** @description Bimoment. */
            readonly bimoment?: components["schemas"]["QuantityInput"];
        };
        /**
         * Cross-section check
         * @description Design effects that act together at one cross-section, on one member whatever `count` is. V above 0.5 V_pl reduces the yield strength of A_v by (1 - rho) in N and M (EN 1993-1-1 6.2.10). Shear forces act through the shear centre; what a load beside it turns is given as `T`.
         */
        readonly SectionRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly material: components["schemas"]["MaterialWithDurationInput"];
            readonly section: components["schemas"]["SectionInput"];
            readonly effects: components["schemas"]["SectionEffects"];
            /** @description Net area at the holes for fasteners, of one member; without it there are none. */
            readonly netArea?: components["schemas"]["QuantityInput"];
            /**
             * @description Whether von Mises' criterion (EN 1993-1-1 6.2.1(5)) counts.
             * @default false
             */
            readonly vonMises?: boolean;
        };
        /** Plane state of stress */
        readonly StressState: {
            /** @description Along the member, tension positive. Default 0. */
            readonly sigmaX?: components["schemas"]["QuantityInput"];
            /** @description Across the member, tension positive. Default 0. */
            readonly sigmaZ?: components["schemas"]["QuantityInput"];
            /** @description Shear stress. Default 0. */
            readonly tau?: components["schemas"]["QuantityInput"];
        };
        /**
         * Stress check
         * @description States of stress as they are, or effects at the named points of a section. Tension is positive. M_y positive stretches z > 0.
         */
        readonly StressRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly material: components["schemas"]["MaterialInput"];
            /** @description States of stress; give either these or a section with effects. */
            readonly states?: readonly components["schemas"]["StressState"][];
            readonly section?: components["schemas"]["SectionInput"];
            readonly effects?: components["schemas"]["SectionEffects"];
        } & (unknown | unknown);
        /**
         * Timber across the grain
         * @description EN 1995-1-1 6.1.5, at an angle 6.2.2.
         */
        readonly BearingAcrossGrain: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "across-grain";
            readonly profile?: components["schemas"]["ProfileName"];
            readonly material: components["schemas"]["MaterialWithDurationInput"];
            /** @description Width of the contact. */
            readonly width: components["schemas"]["QuantityInput"];
            /** @description Length of the contact along the grain. */
            readonly length: components["schemas"]["QuantityInput"];
            /** @description From the contact to the end of the member, a. Default 0. */
            readonly edgeDistance?: components["schemas"]["QuantityInput"];
            /** @description Clear distance to the next contact, l_1. */
            readonly spacing?: components["schemas"]["QuantityInput"];
            /** @description Depth of the member, h. */
            readonly depth: components["schemas"]["QuantityInput"];
            /**
             * @description How the member lies.
             * @enum {string}
             */
            readonly support: "continuous" | "discrete";
            /** @description Design force. */
            readonly force: components["schemas"]["QuantityInput"];
            /** @description Angle of the force to the grain. Default 90°. */
            readonly angle?: components["schemas"]["QuantityInput"];
        };
        /**
         * Transverse force on a steel web
         * @description EN 1993-1-5 section 6.
         */
        readonly BearingTransverseForce: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "transverse-force";
            readonly profile?: components["schemas"]["ProfileName"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly section: components["schemas"]["SectionInput"];
            /**
             * @description Type of load application of Figure 6.1.
             * @enum {string}
             */
            readonly type: "a" | "b" | "c";
            /** @description Stiff bearing length s_s. */
            readonly bearingLength: components["schemas"]["QuantityInput"];
            /** @description Distance between transverse stiffeners. Default none. */
            readonly stiffenerSpacing?: components["schemas"]["QuantityInput"];
            /** @description Distance c from the end, for type c. Default 0. */
            readonly endDistance?: components["schemas"]["QuantityInput"];
            /** @description Design force. */
            readonly force: components["schemas"]["QuantityInput"];
        };
        /** Sole plate on ground */
        readonly BearingOnGround: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            readonly kind: "ground";
            readonly profile?: components["schemas"]["ProfileName"];
            readonly material?: components["schemas"]["MaterialWithDurationInput"];
            /** @description Width of the plate. */
            readonly width: components["schemas"]["QuantityInput"];
            /** @description Length of the plate. */
            readonly length: components["schemas"]["QuantityInput"];
            /** @description Depth of the plate. */
            readonly depth: components["schemas"]["QuantityInput"];
            /** @description Force on the plate. */
            readonly force: components["schemas"]["QuantityInput"];
            /** @description Allowable bearing pressure. */
            readonly groundPressure: components["schemas"]["QuantityInput"];
        };
        /**
         * Bearing check
         * @description Timber across the grain, a transverse force on a steel web, or a sole plate on ground.
         */
        readonly BearingRequest: components["schemas"]["BearingAcrossGrain"] | components["schemas"]["BearingTransverseForce"] | components["schemas"]["BearingOnGround"];
        /**
         * A JSON Schema
         * @description Draft 2020-12, with all that it refers to under `$defs`.
         */
        readonly JsonSchema: {
            readonly [key: string]: unknown;
        };
        /** An element of MathML */
        readonly MathElement: {
            readonly [key: string]: unknown;
        };
        /** One formula */
        readonly Formula: {
            readonly id: string;
            readonly symbol: components["schemas"]["Symbol"];
            readonly title: string;
            readonly unit: components["schemas"]["Unit"];
            readonly clause: string;
            /** @description The formula in mathjs syntax. */
            readonly expression: string;
            /** @description Unit of each symbol in it. */
            readonly where: {
                readonly [key: string]: components["schemas"]["Unit"];
            };
            /** @description Presentation MathML. */
            readonly mathml: string;
            /** @description The same MathML as a tree, for pages that may not set markup. */
            readonly elements: components["schemas"]["MathElement"];
        };
        /** One revision without its values */
        readonly RevisionFacts: {
            readonly revision: number;
            readonly status: components["schemas"]["RevisionStatus"];
            readonly standing: components["schemas"]["RevisionStanding"];
            /** @description Over the canonical JSON of tree and departures, in hex. */
            readonly sha256: string;
            /** @description The first day it may be used. */
            readonly effectiveFrom: string | null;
            /** @description When it ends; `null`: not. */
            readonly expiresAt: string | null;
            readonly approvedAt: string | null;
            readonly approvedBy: string | null;
        };
        /** One factor profile */
        readonly ProfileSummary: {
            /** @example uk-na */
            readonly slug: string;
            readonly title: string;
            /** @description Who answers for it. */
            readonly owner: string;
            /** @description The revision in effect today, or `null`. */
            readonly current: number | null;
            /** @description Newest first. */
            readonly revisions: readonly components["schemas"]["RevisionFacts"][];
        };
        /** The factor profiles there are */
        readonly ProfileList: {
            readonly items: readonly components["schemas"]["ProfileSummary"][];
            readonly nextPageToken: components["schemas"]["NextPageToken"];
        };
        /** One revision with all its values */
        readonly ProfileDetail: {
            /** @example uk-na */
            readonly slug: string;
            readonly title: string;
            /** @description Who answers for it. */
            readonly owner: string;
            readonly revision: number;
            readonly status: components["schemas"]["RevisionStatus"];
            readonly standing: components["schemas"]["RevisionStanding"];
            /** @description Over the canonical JSON of tree and departures, in hex. */
            readonly sha256: string;
            /** @description The first day it may be used. */
            readonly effectiveFrom: string | null;
            /** @description When it ends; `null`: not. */
            readonly expiresAt: string | null;
            readonly approvedAt: string | null;
            readonly approvedBy: string | null;
            readonly departures: readonly components["schemas"]["DepartureLine"][];
            /** @description Names to branches or to values; a value carries value, unit, clause, source, locator, kind, confirmedBy and note. */
            readonly tree: {
                readonly [key: string]: unknown;
            };
        };
        /**
         * Shape of a section of the catalogue
         * @description A square hollow section is an `RHS` whose `h` and `b` are one.
         * @enum {string}
         */
        readonly CatalogueShape: "I" | "channel" | "angle" | "RHS" | "CHS" | "rectangle" | "round";
        /**
         * Taper of the flanges
         * @description Of sections whose flanges thin towards their toes, UPN and IPN.
         */
        readonly FlangeTaper: {
            /** @description Rise of the inner face over its run. */
            readonly slope: components["schemas"]["Quantity"];
            /** @description Distance from the toe to where the flange is `tf` thick. */
            readonly at: components["schemas"]["Quantity"];
            /** @description Radius of the toe. */
            readonly r2: components["schemas"]["Quantity"];
        };
        /**
         * Dimensions of a section
         * @description Those of its shape, named as a request names them: I and channel `h b tw tf r`, RHS `h b t ro ri`, CHS `d t`, angle `h b t r1 r2`, rectangle `b h`, round `d`.
         */
        readonly SectionDimensions: {
            /** @description Depth, along z-z; the longer leg of an angle. */
            readonly h?: components["schemas"]["Quantity"];
            /** @description Width, along y-y; the shorter leg of an angle. */
            readonly b?: components["schemas"]["Quantity"];
            /** @description Diameter. */
            readonly d?: components["schemas"]["Quantity"];
            /** @description Thickness of the web. */
            readonly tw?: components["schemas"]["Quantity"];
            /** @description Thickness of the flange, of a tapered one at `taper.at`. */
            readonly tf?: components["schemas"]["Quantity"];
            /** @description Thickness of the wall or of the legs. */
            readonly t?: components["schemas"]["Quantity"];
            /** @description Radius of the root. */
            readonly r?: components["schemas"]["Quantity"];
            /** @description Radius of the root of an angle. */
            readonly r1?: components["schemas"]["Quantity"];
            /** @description Radius of the toes of an angle. */
            readonly r2?: components["schemas"]["Quantity"];
            /** @description Outer radius of the corners. */
            readonly ro?: components["schemas"]["Quantity"];
            /** @description Inner radius of the corners. */
            readonly ri?: components["schemas"]["Quantity"];
            readonly taper?: components["schemas"]["FlangeTaper"];
        };
        /**
         * Properties of a section
         * @description Computed from the dimensions, of one member, gross. y-y and z-z are parallel to the flanges and to the web or the legs; of an angle the principal axes u-u and v-v are given too. What has no meaning for a shape is left out.
         */
        readonly SectionPropertyValues: {
            /** @description Area. */
            readonly A: components["schemas"]["Quantity"];
            /** @description Second moment of area about y-y. */
            readonly Iy: components["schemas"]["Quantity"];
            /** @description Second moment of area about z-z. */
            readonly Iz: components["schemas"]["Quantity"];
            /** @description Elastic modulus about y-y. */
            readonly Wely: components["schemas"]["Quantity"];
            /** @description Elastic modulus about z-z. */
            readonly Welz: components["schemas"]["Quantity"];
            /** @description Plastic modulus about y-y; not of angles. */
            readonly Wply?: components["schemas"]["Quantity"];
            /** @description Plastic modulus about z-z; not of angles. */
            readonly Wplz?: components["schemas"]["Quantity"];
            /** @description Radius of gyration about y-y. */
            readonly iy: components["schemas"]["Quantity"];
            /** @description Radius of gyration about z-z. */
            readonly iz: components["schemas"]["Quantity"];
            /** @description St Venant torsion constant. */
            readonly It: components["schemas"]["Quantity"];
            /** @description Warping constant; of I sections and channels. */
            readonly Iw?: components["schemas"]["Quantity"];
            /** @description Torsion modulus; of hollow sections. */
            readonly Wt?: components["schemas"]["Quantity"];
            /** @description Centroid from the back of the web of a channel or of the upright leg of an angle. */
            readonly yc?: components["schemas"]["Quantity"];
            /** @description Centroid from the back of the lying leg of an angle. */
            readonly zc?: components["schemas"]["Quantity"];
            /** @description Shear centre of a channel from the web's centre line, on the side without flanges. */
            readonly e0?: components["schemas"]["Quantity"];
            /** @description Shear centre from the centroid along y-y, towards the web or the upright leg. */
            readonly y0?: components["schemas"]["Quantity"];
            /** @description Shear centre from the centroid along z-z, towards the lying leg. */
            readonly z0?: components["schemas"]["Quantity"];
            /** @description Product of area of an angle, toes towards positive y and z. */
            readonly Iyz?: components["schemas"]["Quantity"];
            /** @description Greater principal second moment of area of an angle. */
            readonly Iu?: components["schemas"]["Quantity"];
            /** @description Lesser principal second moment of area of an angle. */
            readonly Iv?: components["schemas"]["Quantity"];
            /** @description Radius of gyration about u-u. */
            readonly iu?: components["schemas"]["Quantity"];
            /** @description Radius of gyration about v-v. */
            readonly iv?: components["schemas"]["Quantity"];
        };
        /** A section of the catalogue */
        readonly SectionFacts: {
            /** @description As a request names it. */
            readonly designation: string;
            readonly family: string;
            readonly shape: components["schemas"]["CatalogueShape"];
            /**
             * @description Of an I section.
             * @enum {string}
             */
            readonly fabrication?: "rolled" | "welded";
            /**
             * @description Of a hollow section. A designation that does not say it means the hot-finished one where both are made.
             * @enum {string}
             */
            readonly forming?: "hot-finished" | "cold-formed";
            /** @description Where the dimensions come from. */
            readonly source: string;
            /** @description Per length, as published; `null` where none is. */
            readonly mass: components["schemas"]["Quantity"] | null;
            readonly dimensions: components["schemas"]["SectionDimensions"];
            readonly properties: components["schemas"]["SectionPropertyValues"];
        };
        /** A page of the sections */
        readonly SectionList: {
            readonly items: readonly components["schemas"]["SectionFacts"][];
            readonly nextPageToken: components["schemas"]["NextPageToken"];
        };
        /** One check of a batch */
        readonly BatchItem: {
            /** @description The caller's own, unique in the batch. */
            readonly id: string;
            readonly check: components["schemas"]["CheckId"];
            /** @description The body of that check. It is validated on its own, so that one item's fault leaves its neighbours alone. */
            readonly input: {
                readonly [key: string]: unknown;
            };
        };
        /** Many checks at a time */
        readonly BatchRequest: {
            /** @description The checks. */
            readonly items: readonly components["schemas"]["BatchItem"][];
        };
        /**
         * Answer to one item
         * @description Either `result` or `problem`.
         */
        readonly BatchResult: {
            readonly id: string;
            readonly httpStatus: number;
            readonly result?: components["schemas"]["CheckAnswer"];
            readonly problem?: components["schemas"]["Problem"];
        };
        /** Answers in the order of the items */
        readonly BatchAnswer: {
            readonly items: readonly components["schemas"]["BatchResult"][];
        };
        /** Sections to choose from */
        readonly Candidates: {
            /** @description Families of the catalogue. */
            readonly families: readonly string[];
            /** @description Greatest depth. */
            readonly maxDepth?: components["schemas"]["QuantityInput"];
            /** @description Only these. */
            readonly designations?: readonly components["schemas"]["SectionName"][];
        };
        /**
         * Lightest section of a waler
         * @description The body of the check without `section`, and the candidates.
         */
        readonly WalerSelectRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly candidates: components["schemas"]["Candidates"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default compression-only
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about z-z, between props or between `verticalSupports`.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly verticalSupports?: components["schemas"]["VerticalSupports"];
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /** One candidate */
        readonly SelectedSection: {
            readonly designation: string;
            /** @description Of the set. */
            readonly mass: components["schemas"]["Quantity"];
            readonly status: components["schemas"]["CheckStatus"];
            readonly utilisation: number | null;
            readonly governing: components["schemas"]["VerificationId"] | null;
        };
        /** A candidate that could not be checked */
        readonly SkippedSection: {
            readonly designation: string;
            readonly problem: components["schemas"]["Problem"];
        };
        /** The lightest section that passes */
        readonly SelectAnswer: {
            readonly check: components["schemas"]["CheckId"];
            /** @description The first that passes, or `null`. */
            readonly chosen: components["schemas"]["SelectedSection"] | null;
            /** @description Those that were checked, by mass. */
            readonly candidates: readonly components["schemas"]["SelectedSection"][];
            readonly skipped: readonly components["schemas"]["SkippedSection"][];
        };
        /**
         * Lightest section of a beam
         * @description The body of the check without `section`, and the candidates.
         */
        readonly BeamSelectRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly candidates: components["schemas"]["Candidates"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default both-ways
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about y-y, with the loads.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /**
         * Lightest section of a prop
         * @description The body of the check without `section`, and the candidates.
         */
        readonly PropSelectRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly candidates: components["schemas"]["Candidates"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            /** @description Length between its ends. */
            readonly length: components["schemas"]["QuantityInput"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            /** @description Compression by source; the reactions of a waler go in unchanged. */
            readonly axial: readonly components["schemas"]["PropAxial"][];
            /** @description Loads across the prop. */
            readonly transverse?: readonly components["schemas"]["PropLoad"][];
            /** @description Angle to the horizontal. Self-weight bends by g cos and adds g L sin to N. Default 0. */
            readonly inclination?: components["schemas"]["QuantityInput"];
            /**
             * @description Whether self-weight counts.
             * @default true
             */
            readonly selfWeight?: boolean;
            /**
             * @description The axis that self-weight bends about.
             * @default y
             * @enum {string}
             */
            readonly selfWeightAxis?: "y" | "z";
            readonly eccentricity?: components["schemas"]["Eccentricity"];
            readonly thermal?: components["schemas"]["Thermal"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        };
        /**
         * Lightest section of a member
         * @description The body of the check without `section`, and the candidates.
         */
        readonly MemberSelectRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly candidates: components["schemas"]["Candidates"];
            readonly material: components["schemas"]["MaterialWithDurationInput"];
            /** @description Length between its ends. */
            readonly length: components["schemas"]["QuantityInput"];
            readonly bucklingLengths?: components["schemas"]["BucklingLengths"];
            readonly effects: components["schemas"]["MemberEffects"];
            /** @default shear-centre */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            /** @description Override of C_1, named in the working. A ratio. */
            readonly C1?: number;
            /** @description Override of C_my, named in the working. A ratio. */
            readonly Cmy?: components["schemas"]["MomentFactor"];
            /** @description Override of C_mz, named in the working. A ratio. */
            readonly Cmz?: components["schemas"]["MomentFactor"];
            /** @description Override of C_mLT, named in the working. A ratio. */
            readonly CmLT?: components["schemas"]["MomentFactor"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
        };
        /** @description The profiles to compare, the first being the one that others are compared with. */
        readonly Profiles: readonly components["schemas"]["ProfileName"][];
        /**
         * A waler under several profiles
         * @description The body of the check, and the profiles.
         */
        readonly WalerCompareRequest: {
            readonly profiles: components["schemas"]["Profiles"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default compression-only
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about z-z, between props or between `verticalSupports`.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly verticalSupports?: components["schemas"]["VerticalSupports"];
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /**
         * The member under one profile
         * @description Either `result` or `problem`.
         */
        readonly ComparedProfile: {
            readonly profile: string;
            readonly httpStatus: number;
            readonly result?: components["schemas"]["CheckAnswer"];
            readonly problem?: components["schemas"]["Problem"];
        };
        /** The same member under several profiles */
        readonly CompareAnswer: {
            readonly check: components["schemas"]["CheckId"];
            readonly items: readonly components["schemas"]["ComparedProfile"][];
        };
        /**
         * A beam under several profiles
         * @description The body of the check, and the profiles.
         */
        readonly BeamCompareRequest: {
            readonly profiles: components["schemas"]["Profiles"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default both-ways
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about y-y, with the loads.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /**
         * A prop under several profiles
         * @description The body of the check, and the profiles.
         */
        readonly PropCompareRequest: {
            readonly profiles: components["schemas"]["Profiles"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            /** @description Length between its ends. */
            readonly length: components["schemas"]["QuantityInput"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            /** @description Compression by source; the reactions of a waler go in unchanged. */
            readonly axial: readonly components["schemas"]["PropAxial"][];
            /** @description Loads across the prop. */
            readonly transverse?: readonly components["schemas"]["PropLoad"][];
            /** @description Angle to the horizontal. Self-weight bends by g cos and adds g L sin to N. Default 0. */
            readonly inclination?: components["schemas"]["QuantityInput"];
            /**
             * @description Whether self-weight counts.
             * @default true
             */
            readonly selfWeight?: boolean;
            /**
             * @description The axis that self-weight bends about.
             * @default y
             * @enum {string}
             */
            readonly selfWeightAxis?: "y" | "z";
            readonly eccentricity?: components["schemas"]["Eccentricity"];
            readonly thermal?: components["schemas"]["Thermal"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        };
        /**
         * A member under several profiles
         * @description The body of the check, and the profiles.
         */
        readonly MemberCompareRequest: {
            readonly profiles: components["schemas"]["Profiles"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialWithDurationInput"];
            /** @description Length between its ends. */
            readonly length: components["schemas"]["QuantityInput"];
            readonly bucklingLengths?: components["schemas"]["BucklingLengths"];
            readonly effects: components["schemas"]["MemberEffects"];
            /** @default shear-centre */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            /** @description Override of C_1, named in the working. A ratio. */
            readonly C1?: number;
            /** @description Override of C_my, named in the working. A ratio. */
            readonly Cmy?: components["schemas"]["MomentFactor"];
            /** @description Override of C_mz, named in the working. A ratio. */
            readonly Cmz?: components["schemas"]["MomentFactor"];
            /** @description Override of C_mLT, named in the working. A ratio. */
            readonly CmLT?: components["schemas"]["MomentFactor"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
        };
        /**
         * @description `span`: all spans by one factor, or the length of a prop. `loads.NAME`: all loads of that name, thrust and axial force too.
         * @example loads.earth
         */
        readonly Vary: string;
        /**
         * Greatest load or span of a waler
         * @description The body of the check, and what varies.
         */
        readonly WalerLimitsRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly vary: components["schemas"]["Vary"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default compression-only
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about z-z, between props or between `verticalSupports`.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly verticalSupports?: components["schemas"]["VerticalSupports"];
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /**
         * The greatest value that passes
         * @description Rounded towards pass.
         */
        readonly LimitFound: {
            readonly value: number;
            readonly unit: components["schemas"]["Unit"];
            readonly utilisation: number | null;
            readonly governing: components["schemas"]["VerificationId"] | null;
        };
        /** There is no such value */
        readonly NoLimit: {
            /** @description Why. */
            readonly none: string;
        };
        /** Greatest load or span */
        readonly LimitsAnswer: components["schemas"]["LimitFound"] | components["schemas"]["NoLimit"];
        /**
         * Greatest load or span of a beam
         * @description The body of the check, and what varies.
         */
        readonly BeamLimitsRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly vary: components["schemas"]["Vary"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            readonly spans: components["schemas"]["Spans"];
            readonly overhangs?: components["schemas"]["Overhangs"];
            readonly loads?: components["schemas"]["Loads"];
            readonly loadSets?: components["schemas"]["LoadSets"];
            readonly patternLoading?: components["schemas"]["PatternLoading"];
            readonly thrust?: components["schemas"]["Thrust"];
            /**
             * @description `compression-only`: a support only pushes; a combination that would pull on one is solved again without it, until none pulls. `both-ways`: a support holds against lifting too.
             * @default both-ways
             * @enum {string}
             */
            readonly supports?: "compression-only" | "both-ways";
            readonly supportStiffness?: components["schemas"]["SupportStiffness"];
            /**
             * @description Self-weight bends about y-y, with the loads.
             * @default true
             */
            readonly selfWeight?: boolean;
            readonly restraint?: components["schemas"]["Restraint"];
            /** @default top */
            readonly loadLevel?: components["schemas"]["LoadLevel"];
            readonly bearing?: components["schemas"]["StiffBearing"];
            readonly lossOfProp?: components["schemas"]["LossOfProp"];
            readonly deflectionLimit?: components["schemas"]["DeflectionLimit"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        } & (unknown | unknown);
        /**
         * Greatest load or length of a prop
         * @description The body of the check, and what varies.
         */
        readonly PropLimitsRequest: {
            readonly profile?: components["schemas"]["ProfileName"];
            readonly vary: components["schemas"]["Vary"];
            readonly section: components["schemas"]["SectionInput"];
            readonly material: components["schemas"]["MaterialInput"];
            readonly loadBasis: components["schemas"]["LoadBasis"];
            /** @description Length between its ends. */
            readonly length: components["schemas"]["QuantityInput"];
            readonly bucklingFactors?: components["schemas"]["BucklingFactors"];
            /** @description Compression by source; the reactions of a waler go in unchanged. */
            readonly axial: readonly components["schemas"]["PropAxial"][];
            /** @description Loads across the prop. */
            readonly transverse?: readonly components["schemas"]["PropLoad"][];
            /** @description Angle to the horizontal. Self-weight bends by g cos and adds g L sin to N. Default 0. */
            readonly inclination?: components["schemas"]["QuantityInput"];
            /**
             * @description Whether self-weight counts.
             * @default true
             */
            readonly selfWeight?: boolean;
            /**
             * @description The axis that self-weight bends about.
             * @default y
             * @enum {string}
             */
            readonly selfWeightAxis?: "y" | "z";
            readonly eccentricity?: components["schemas"]["Eccentricity"];
            readonly thermal?: components["schemas"]["Thermal"];
            readonly interaction?: components["schemas"]["InteractionMethod"];
            readonly lateralTorsional?: components["schemas"]["LateralTorsionalMethod"];
            readonly waive?: components["schemas"]["Waivers"];
        };
        /** One call */
        readonly UsageEvent: {
            /** @description The log's own id of the call; X-Request-Id of its answer. */
            readonly id: string;
            /**
             * Format: date-time
             * @description When it began.
             */
            readonly at: string;
            /**
             * @description A streamed answer has a row before its first byte and one after its last.
             * @enum {string}
             */
            readonly phase: "whole" | "start" | "end";
            readonly clientId: string | null;
            /** @description As it is called today. */
            readonly clientName: string | null;
            readonly keyId: string | null;
            /** @description The public part of the key. */
            readonly keySelector: string | null;
            /** @description Who was signed in; `null` for a call with a key. */
            readonly personId: string | null;
            /** @description As they are called today. */
            readonly personName: string | null;
            readonly method: string;
            readonly route: string;
            readonly checkId: string | null;
            readonly profile: string | null;
            readonly profileRevision: number | null;
            readonly httpStatus: number;
            /** @description The problem's code. */
            readonly code: string | null;
            /** @description Status of the check. */
            readonly answer: string | null;
            readonly utilisation: number | null;
            readonly governing: string | null;
            /** @description How many items a batch had. */
            readonly items: number | null;
            /** @description In microseconds. */
            readonly durationUs: number;
            readonly address: string | null;
            readonly origin: string | null;
            /** @description The caller's own X-Request-Id. */
            readonly callerRequestId: string | null;
            /** @description How many alike calls the row stands for. */
            readonly repeats: number;
        };
        /** A page of the log */
        readonly UsageList: {
            /** @description Newest first. */
            readonly items: readonly components["schemas"]["UsageEvent"][];
            readonly nextPageToken: components["schemas"]["NextPageToken"];
        };
        /**
         * @description What a person is to the firm.
         * @enum {string}
         */
        readonly Role: "admin" | "lead" | "engineer" | "checker" | "developer";
        /** A person */
        readonly PersonFacts: {
            readonly id: string;
            readonly email: string;
            readonly name: string;
            readonly roles: readonly components["schemas"]["Role"][];
        };
        /**
         * @description What a person may do; the roles give it.
         * @enum {string}
         */
        readonly Permission: "catalogue:read" | "checks:run" | "profiles:read" | "clients:read" | "clients:write" | "keys:read" | "keys:write" | "usage:read";
        /** Who is signed in */
        readonly SessionState: {
            /** @description `null`: nobody is signed in. */
            readonly person: components["schemas"]["PersonFacts"] | null;
            readonly permissions: readonly components["schemas"]["Permission"][];
            /** @description Goes into the header X-CSRF-Token of every change; `null` before the sign-in. */
            readonly csrfToken: string | null;
        };
        /** A sign-in */
        readonly SessionRequest: {
            /**
             * @description The person's email; capitals do not matter.
             * @example admin@saltmarsh.example
             */
            readonly email: string;
            /**
             * Format: password
             * @description The password; one of more than 72 bytes is nobody's.
             */
            readonly password: string;
        };
        /** A client */
        readonly ClientFacts: {
            readonly id: string;
            readonly name: string;
            readonly defaultProfile: string | null;
            readonly pins: readonly string[];
            readonly createdAt: string;
            /** @description When it was taken out of use; `null`: it is in use. */
            readonly disabledAt: string | null;
            /** @description Keys that are neither revoked nor expired. */
            readonly liveKeys: number;
        };
        /** A page of the clients */
        readonly ClientList: {
            /** @description By name. */
            readonly items: readonly components["schemas"]["ClientFacts"][];
            readonly nextPageToken: components["schemas"]["NextPageToken"];
        };
        /** A client to be made */
        readonly ClientRequest: {
            /**
             * @description What the tool is called in the log. No two clients share it.
             * @example Waler schedule workbook
             */
            readonly name: string;
            /**
             * @description Factor profile of requests that name none; `null`: each has to name one. Default `null`.
             * @example uk-na
             */
            readonly defaultProfile?: string | null;
            /** @description Revisions that the client is held at when a request names the profile alone. */
            readonly pins?: readonly string[];
        };
        /**
         * What changes of a client
         * @description What is left out stays as it is.
         */
        readonly ClientChange: {
            /**
             * @description What the tool is called in the log. No two clients share it.
             * @example Waler schedule workbook
             */
            readonly name?: string;
            /**
             * @description Factor profile of requests that name none; `null`: each has to name one. Default `null`.
             * @example uk-na
             */
            readonly defaultProfile?: string | null;
            /** @description Revisions that the client is held at when a request names the profile alone. */
            readonly pins?: readonly string[];
            /** @description Out of use, no key of the client opens; back in use, those not revoked open again. */
            readonly disabled?: boolean;
        };
        /**
         * @description What a key may do. `admin` reads the usage log.
         * @enum {string}
         */
        readonly Scope: "checks" | "catalogue" | "admin";
        /** A key, without its secret */
        readonly KeyFacts: {
            /** @description The public part; it names the key in lists and in the log. */
            readonly selector: string;
            readonly clientId: string;
            /** @enum {string} */
            readonly kind: "secret" | "page" | "cell";
            readonly label: string;
            readonly scopes: readonly components["schemas"]["Scope"][];
            readonly origins: readonly string[];
            /** @description `null`: all. */
            readonly profiles: readonly string[] | null;
            /** @description Calls a minute; `null`: the limit of the service. */
            readonly rateLimit: number | null;
            readonly createdAt: string;
            readonly expiresAt: string | null;
            readonly revokedAt: string | null;
            /** @description A day. */
            readonly lastUsedOn: string | null;
            /**
             * @description Whether it opens.
             * @enum {string}
             */
            readonly state: "live" | "expired" | "revoked";
        };
        /** A page of the keys of a client */
        readonly KeyList: {
            /** @description Newest first. */
            readonly items: readonly components["schemas"]["KeyFacts"][];
            readonly nextPageToken: components["schemas"]["NextPageToken"];
        };
        /**
         * @description `secret` for servers and scripts, `page` for pages in a browser.
         * @enum {string}
         */
        readonly KeyKindToIssue: "secret" | "page";
        /** A key to be issued */
        readonly KeyRequest: {
            readonly kind: components["schemas"]["KeyKindToIssue"];
            /**
             * @description What the key is for, for those who manage it.
             * @example Site office workbook
             */
            readonly label: string;
            /** @description What it may do; a page key never `admin`. Default `checks` and `catalogue`. */
            readonly scopes?: readonly components["schemas"]["Scope"][];
            /** @description Pages that may use a page key, at least one: scheme, host and port as a browser sends them, compared exactly. A secret key has none. */
            readonly origins?: readonly string[];
            /** @description Factor profiles that it may use; `null`: all. Default `null`. */
            readonly profiles?: readonly string[] | null;
            /** @description Calls a minute; `null`: the limit of the service. Default `null`. */
            readonly rateLimit?: number | null;
            /**
             * @description When it ends: date and time with its offset; `null`: not by itself. Default `null`.
             * @example 2027-01-31T18:00:00Z
             */
            readonly expiresAt?: string | null;
        };
        /** A key with its text */
        readonly IssuedKey: {
            readonly key: components["schemas"]["KeyFacts"];
            /** @description The key itself. It is told this once and stored nowhere. */
            readonly text: string;
        };
        /** An OpenAPI 3.1 document */
        readonly OpenApiDocument: {
            readonly [key: string]: unknown;
        };
        /** The process answers */
        readonly Health: {
            /** @enum {string} */
            readonly status: "ok";
        };
        /** What the service needs, and whether it is there */
        readonly Readiness: {
            /** @enum {string} */
            readonly status: "ready" | "not-ready";
            /** @description The database answers. */
            readonly database: boolean;
            /** @description Changes of keys and profiles are heard. */
            readonly listener: boolean;
            /** Partitions of the log */
            readonly partitions: {
                readonly ok: boolean;
                readonly warnings: readonly string[];
            };
        };
        /** What a problem means */
        readonly ProblemKind: {
            /** Format: uri-reference */
            readonly type: string;
            readonly code: string;
            readonly status: number;
            readonly title: string;
            /** @description Whether the same request may succeed later. */
            readonly retryable: boolean;
            /** @description Why it happens. */
            readonly why: string;
            /** @description What to do. */
            readonly remedy: string;
        };
        /** Every problem there is */
        readonly ProblemKindList: {
            readonly items: readonly components["schemas"]["ProblemKind"][];
            readonly nextPageToken: components["schemas"]["NextPageToken"];
        };
    };
    responses: {
        /** @description No key, or not a good one. */
        readonly KeyRefused: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly "WWW-Authenticate": components["headers"]["WwwAuthenticate"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/key-required",
                 *       "title": "A key is required",
                 *       "status": 401,
                 *       "detail": "Send the key in the Authorization header.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "key-required",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The key lacks the scope, may not use the profile, or is used from a foreign origin. */
        readonly NotAllowed: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly "WWW-Authenticate": components["headers"]["WwwAuthenticate"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/scope-missing",
                 *       "title": "The key lacks a scope",
                 *       "status": 403,
                 *       "detail": "The key lacks the scope \"checks\".",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "scope-missing",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description A query parameter is unknown, stands twice or has a value that it cannot have. */
        readonly QueryNotValid: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/query-not-valid",
                 *       "title": "The query is not valid",
                 *       "status": 422,
                 *       "detail": "The query is not valid.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "query-not-valid",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": [
                 *         {
                 *           "pointer": "/query/detial",
                 *           "code": "unknown-parameter",
                 *           "message": "No such parameter.",
                 *           "fix": "Known here: detail."
                 *         }
                 *       ]
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The limit of calls a minute is used up. */
        readonly TooManyCalls: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly "Retry-After": components["headers"]["RetryAfter"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/rate-limited",
                 *       "title": "Too many requests",
                 *       "status": 429,
                 *       "detail": "The limit \"key\" is used up; it begins anew in 12 s.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "rate-limited",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": true,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description A defect of this service. */
        readonly Unexpected: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/unexpected",
                 *       "title": "Something went wrong here",
                 *       "status": 500,
                 *       "detail": "A defect of this service.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "unexpected",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": true,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The log or the database is away, or too much waits. Nothing was done. */
        readonly Away: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly "Retry-After": components["headers"]["RetryAfter"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/log-unavailable",
                 *       "title": "The call could not be logged",
                 *       "status": 503,
                 *       "detail": "The call could not be logged. Nothing was done; ask again.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "log-unavailable",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": true,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The body is not JSON. */
        readonly NotJson: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/not-json",
                 *       "title": "The body is not JSON",
                 *       "status": 400,
                 *       "detail": "The body cannot be read as JSON.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "not-json",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The body has more than 1 MB. */
        readonly TooLarge: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/too-large",
                 *       "title": "The body is too large",
                 *       "status": 413,
                 *       "detail": "The body has more than 1 MB.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "too-large",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The body is not declared as JSON in UTF-8. */
        readonly NotDeclaredAsJson: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/media-type",
                 *       "title": "The body is not declared as JSON",
                 *       "status": 415,
                 *       "detail": "Send the body as application/json in UTF-8.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "media-type",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description Not valid, or outside what the check covers. Each fault has its JSON pointer; a `fix` where one is known. At most 20, the most specific first. Codes of `errors` are wrong-type, missing-field, unknown-field, not-one-of, one-of-both, not-a-quantity, wrong-unit, unknown-unit, negative, must-be-positive, too-large, too-small, too-many, too-many-fields, too-few, empty, too-long, too-short, repeated, wrong-form, control-character, not-text, reserved-word, not-finite. */
        readonly NotValid: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/not-valid",
                 *       "title": "The request is not valid",
                 *       "status": 422,
                 *       "detail": "Some of the body is not what the check takes.",
                 *       "instance": "/v1/checks/waler",
                 *       "code": "not-valid",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": [
                 *         {
                 *           "pointer": "/spans/1",
                 *           "code": "wrong-unit",
                 *           "message": "`spans[1]`: The unit \"kN\" does not measure what m measures.",
                 *           "fix": "Give a number in m, or text such as \"2.4 m\"."
                 *         },
                 *         {
                 *           "pointer": "/overhang",
                 *           "code": "unknown-field",
                 *           "message": "There is no field `overhang`.",
                 *           "fix": "Did you mean `overhangs`?"
                 *         }
                 *       ]
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description There is nothing here, or nothing that the key may know of. */
        readonly NotFound: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/not-found",
                 *       "title": "There is nothing here",
                 *       "status": 404,
                 *       "detail": "There is no such thing.",
                 *       "instance": "/v1/profiles/no-such",
                 *       "code": "not-found",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The caller has the answer already. */
        readonly NotModified: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly ETag: components["headers"]["ETag"];
                readonly "Cache-Control": components["headers"]["CacheControl"];
                readonly [name: string]: unknown;
            };
            content?: never;
        };
        /** @description The email and the password do not belong together, or the person is out of use. */
        readonly SignInRefused: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly "WWW-Authenticate": components["headers"]["WwwAuthenticate"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/sign-in-refused",
                 *       "title": "The sign-in is refused",
                 *       "status": 401,
                 *       "detail": "The email and the password do not belong together.",
                 *       "instance": "/v1/session",
                 *       "code": "sign-in-refused",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description No role of the person allows it, the session's token is missing, or a page of another site asks. */
        readonly NotPermitted: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/permission-missing",
                 *       "title": "Your roles do not allow it",
                 *       "status": 403,
                 *       "detail": "None of your roles has the permission \"clients:write\".",
                 *       "instance": "/v1/clients",
                 *       "code": "permission-missing",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description Nobody is signed in, or the session has ended. */
        readonly SessionRefused: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly "WWW-Authenticate": components["headers"]["WwwAuthenticate"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/sign-in-required",
                 *       "title": "Nobody is signed in",
                 *       "status": 401,
                 *       "detail": "Nobody is signed in. A key does not do here.",
                 *       "instance": "/v1/clients",
                 *       "code": "sign-in-required",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": []
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
        /** @description The name is taken, or the client is out of use. */
        readonly Conflict: {
            headers: {
                readonly "X-Request-Id": components["headers"]["XRequestId"];
                readonly RateLimit: components["headers"]["RateLimit"];
                readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                readonly [name: string]: unknown;
            };
            content: {
                /**
                 * @example {
                 *       "type": "/problems/name-taken",
                 *       "title": "The name is taken",
                 *       "status": 409,
                 *       "detail": "There is a client \"Waler schedule workbook\" already.",
                 *       "instance": "/v1/clients",
                 *       "code": "name-taken",
                 *       "requestId": "01K4QZ6T3M8V5W2C7R9B0N1XJD",
                 *       "retryable": false,
                 *       "errors": [
                 *         {
                 *           "pointer": "/name",
                 *           "code": "taken",
                 *           "message": "There is a client \"Waler schedule workbook\" already."
                 *         }
                 *       ]
                 *     }
                 */
                readonly "application/problem+json": components["schemas"]["Problem"];
            };
        };
    };
    parameters: {
        /** @description The caller's own id of the call; it is kept in the log as a label. */
        readonly RequestId: string;
        /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
        readonly Detail: "full" | "summary";
        /**
         * @description One of the checks.
         * @example waler
         */
        readonly CheckIdInPath: components["schemas"]["CheckId"];
        /** @description A step's `formula`. */
        readonly FormulaIdInPath: string;
        /**
         * @description `uk-na` is the revision in effect, else the newest; `uk-na@2` is that revision.
         * @example uk-na
         */
        readonly ProfileInPath: string;
        /**
         * @description Part of a designation in any spelling, such as `457 191`, `ub457` or `HE 200 B`.
         * @example 457x191
         */
        readonly SectionSearch: string;
        /**
         * @description Only sections of this family.
         * @example UB
         */
        readonly SectionFamily: string;
        /**
         * @description Only sections of this shape.
         * @example I
         */
        readonly SectionShape: components["schemas"]["CatalogueShape"];
        /** @description How many to a page. */
        readonly PageSize: number;
        /** @description `nextPageToken` of the page before. Default the first page. */
        readonly PageToken: string;
        /** @description ETag of the answer that the caller has. */
        readonly IfNoneMatch: string;
        /**
         * @description A section's designation in any spelling.
         * @example UB 457x191x67
         */
        readonly DesignationInPath: string;
        /** @description `full` shows the working of every item; `summary` gathers none, and is quicker. Default `summary`. */
        readonly BatchDetail: "full" | "summary";
        /** @description Only calls of this client, by its id, or of those whose name holds this text. */
        readonly UsageClient: string;
        /** @description Only calls with this key, by its public part. */
        readonly UsageKey: string;
        /** @description Only calls of this person, by the id. */
        readonly UsagePerson: string;
        /**
         * @description Only calls under this factor profile, or this revision of it.
         * @example uk-na@1
         */
        readonly UsageProfile: string;
        /** @description Only calls of this check. */
        readonly UsageCheck: components["schemas"]["CheckId"];
        /** @description Only calls answered with this HTTP status. */
        readonly UsageStatus: number;
        /** @description Only checks answered with this status. */
        readonly UsageAnswer: "pass" | "fail" | "incomplete" | "provisional";
        /**
         * @description Only calls from this date, or date and time with its offset, on.
         * @example 2026-01-31T08:00:00Z
         */
        readonly UsageFrom: string;
        /**
         * @description Only calls before this date, or date and time with its offset.
         * @example 2026-02-01
         */
        readonly UsageTo: string;
        /**
         * @description X-Request-Id of the answer.
         * @example 01K4QZ6T3M8V5W2C7R9B0N1XJD
         */
        readonly RequestIdInPath: string;
        /** @description The session's `csrfToken`. */
        readonly CsrfToken: string;
        /**
         * @description A client's `id`.
         * @example 5a17c0de-0001-4000-8000-000000000003
         */
        readonly ClientIdInPath: string;
        /**
         * @description The public part of a key.
         * @example 4Fq9ZtR2mLx7
         */
        readonly SelectorInPath: string;
        /**
         * @description A problem's `code`.
         * @example not-valid
         */
        readonly ProblemCodeInPath: string;
    };
    requestBodies: never;
    headers: {
        /**
         * @description The log's own id of the call. A caller's own X-Request-Id is kept beside it.
         * @example 01K4QZ6T3M8V5W2C7R9B0N1XJD
         */
        readonly XRequestId: string;
        /**
         * @description What is left of each limit, and the seconds until it begins anew.
         * @example "key"; r=5999; t=60
         */
        readonly RateLimit: string;
        /**
         * @description The limits that apply, with their windows in seconds.
         * @example "key"; q=6000; w=60
         */
        readonly RateLimitPolicy: string;
        /**
         * @description What the key lacks, by RFC 6750.
         * @example Bearer realm="headtree", error="invalid_token"
         */
        readonly WwwAuthenticate: string;
        /**
         * @description Seconds to wait before the same request is sent again.
         * @example 12
         */
        readonly RetryAfter: string;
        /**
         * @description How long the answer may be kept.
         * @example private, max-age=31536000, immutable
         */
        readonly CacheControl: string;
        /**
         * @description Changes when the answer does; goes into If-None-Match.
         * @example "pK3mN0xv2dQ8sT5hRjZL4w"
         */
        readonly ETag: string;
        /**
         * @description The cookie of the session; no script can read it.
         * @example headtree=s%3A…; Path=/; HttpOnly; SameSite=Lax
         */
        readonly SetCookie: string;
        /**
         * @description Where it is.
         * @example /v1/clients/5a17c0de-0001-4000-8000-000000000003
         */
        readonly Location: string;
    };
    pathItems: never;
}
export type $defs = Record<string, never>;
export interface operations {
    readonly listChecks: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The checks. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "items": [
                     *         {
                     *           "id": "waler",
                     *           "title": "Waler",
                     *           "path": "/v1/checks/waler",
                     *           "schema": "/v1/checks/waler/schema"
                     *         }
                     *       ],
                     *       "nextPageToken": null
                     *     }
                     */
                    readonly "application/json": components["schemas"]["CheckList"];
                };
            };
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkWaler: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["WalerRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkBeam: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["BeamRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkProp: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["PropRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkAdjustableProp: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["AdjustablePropRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkMember: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["MemberRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkSection: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["SectionRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkStress: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["StressRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly checkBearing: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working, line by line; `summary` gathers none, and is quicker. Default `full`. */
                readonly detail?: components["parameters"]["Detail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["BearingRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. Only `pass` is a pass. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readCheckSchema: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description One of the checks.
                 * @example waler
                 */
                readonly check: components["parameters"]["CheckIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The schema. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "$schema": "https://json-schema.org/draft/2020-12/schema",
                     *       "title": "Waler check",
                     *       "type": "object"
                     *     }
                     */
                    readonly "application/json": components["schemas"]["JsonSchema"];
                };
            };
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readFormula: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /** @description A step's `formula`. */
                readonly id: components["parameters"]["FormulaIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The formula. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly "Cache-Control": components["headers"]["CacheControl"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Formula"];
                };
            };
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly listProfiles: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The profiles. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ProfileList"];
                };
            };
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readProfile: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description `uk-na` is the revision in effect, else the newest; `uk-na@2` is that revision.
                 * @example uk-na
                 */
                readonly slug: components["parameters"]["ProfileInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The revision. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ProfileDetail"];
                };
            };
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly listSections: {
        readonly parameters: {
            readonly query?: {
                /**
                 * @description Part of a designation in any spelling, such as `457 191`, `ub457` or `HE 200 B`.
                 * @example 457x191
                 */
                readonly search?: components["parameters"]["SectionSearch"];
                /**
                 * @description Only sections of this family.
                 * @example UB
                 */
                readonly family?: components["parameters"]["SectionFamily"];
                /**
                 * @description Only sections of this shape.
                 * @example I
                 */
                readonly shape?: components["parameters"]["SectionShape"];
                /** @description How many to a page. */
                readonly pageSize?: components["parameters"]["PageSize"];
                /** @description `nextPageToken` of the page before. Default the first page. */
                readonly pageToken?: components["parameters"]["PageToken"];
            };
            readonly header?: {
                /** @description ETag of the answer that the caller has. */
                readonly "If-None-Match"?: components["parameters"]["IfNoneMatch"];
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description A page of the sections. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly ETag: components["headers"]["ETag"];
                    readonly "Cache-Control": components["headers"]["CacheControl"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "items": [
                     *         {
                     *           "designation": "UB 457x191x67",
                     *           "family": "UB",
                     *           "shape": "I",
                     *           "fabrication": "rolled",
                     *           "source": "EN 10365:2017",
                     *           "mass": {
                     *             "value": 67.1,
                     *             "unit": "kg/m"
                     *           },
                     *           "dimensions": {
                     *             "h": {
                     *               "value": 453.4,
                     *               "unit": "mm"
                     *             },
                     *             "b": {
                     *               "value": 189.9,
                     *               "unit": "mm"
                     *             },
                     *             "tw": {
                     *               "value": 8.5,
                     *               "unit": "mm"
                     *             },
                     *             "tf": {
                     *               "value": 12.7,
                     *               "unit": "mm"
                     *             },
                     *             "r": {
                     *               "value": 10.2,
                     *               "unit": "mm"
                     *             }
                     *           },
                     *           "properties": {
                     *             "A": {
                     *               "value": 8552.5,
                     *               "unit": "mm^2"
                     *             },
                     *             "Iy": {
                     *               "value": 293792000,
                     *               "unit": "mm^4"
                     *             },
                     *             "Iz": {
                     *               "value": 14517000,
                     *               "unit": "mm^4"
                     *             },
                     *             "Wely": {
                     *               "value": 1295950,
                     *               "unit": "mm^3"
                     *             },
                     *             "Welz": {
                     *               "value": 152890,
                     *               "unit": "mm^3"
                     *             },
                     *             "Wply": {
                     *               "value": 1471000,
                     *               "unit": "mm^3"
                     *             },
                     *             "Wplz": {
                     *               "value": 237350,
                     *               "unit": "mm^3"
                     *             },
                     *             "iy": {
                     *               "value": 185.3,
                     *               "unit": "mm"
                     *             },
                     *             "iz": {
                     *               "value": 41.2,
                     *               "unit": "mm"
                     *             },
                     *             "It": {
                     *               "value": 371300,
                     *               "unit": "mm^4"
                     *             },
                     *             "Iw": {
                     *               "value": 704800000000,
                     *               "unit": "mm^6"
                     *             }
                     *           }
                     *         }
                     *       ],
                     *       "nextPageToken": null
                     *     }
                     */
                    readonly "application/json": components["schemas"]["SectionList"];
                };
            };
            readonly 304: components["responses"]["NotModified"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readSection: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description ETag of the answer that the caller has. */
                readonly "If-None-Match"?: components["parameters"]["IfNoneMatch"];
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description A section's designation in any spelling.
                 * @example UB 457x191x67
                 */
                readonly designation: components["parameters"]["DesignationInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The section. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly ETag: components["headers"]["ETag"];
                    readonly "Cache-Control": components["headers"]["CacheControl"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "designation": "UB 457x191x67",
                     *       "family": "UB",
                     *       "shape": "I",
                     *       "fabrication": "rolled",
                     *       "source": "EN 10365:2017",
                     *       "mass": {
                     *         "value": 67.1,
                     *         "unit": "kg/m"
                     *       },
                     *       "dimensions": {
                     *         "h": {
                     *           "value": 453.4,
                     *           "unit": "mm"
                     *         },
                     *         "b": {
                     *           "value": 189.9,
                     *           "unit": "mm"
                     *         },
                     *         "tw": {
                     *           "value": 8.5,
                     *           "unit": "mm"
                     *         },
                     *         "tf": {
                     *           "value": 12.7,
                     *           "unit": "mm"
                     *         },
                     *         "r": {
                     *           "value": 10.2,
                     *           "unit": "mm"
                     *         }
                     *       },
                     *       "properties": {
                     *         "A": {
                     *           "value": 8552.5,
                     *           "unit": "mm^2"
                     *         },
                     *         "Iy": {
                     *           "value": 293792000,
                     *           "unit": "mm^4"
                     *         },
                     *         "Iz": {
                     *           "value": 14517000,
                     *           "unit": "mm^4"
                     *         },
                     *         "Wely": {
                     *           "value": 1295950,
                     *           "unit": "mm^3"
                     *         },
                     *         "Welz": {
                     *           "value": 152890,
                     *           "unit": "mm^3"
                     *         },
                     *         "Wply": {
                     *           "value": 1471000,
                     *           "unit": "mm^3"
                     *         },
                     *         "Wplz": {
                     *           "value": 237350,
                     *           "unit": "mm^3"
                     *         },
                     *         "iy": {
                     *           "value": 185.3,
                     *           "unit": "mm"
                     *         },
                     *         "iz": {
                     *           "value": 41.2,
                     *           "unit": "mm"
                     *         },
                     *         "It": {
                     *           "value": 371300,
                     *           "unit": "mm^4"
                     *         },
                     *         "Iw": {
                     *           "value": 704800000000,
                     *           "unit": "mm^6"
                     *         }
                     *       }
                     *     }
                     */
                    readonly "application/json": components["schemas"]["SectionFacts"];
                };
            };
            readonly 304: components["responses"]["NotModified"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly runBatch: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working of every item; `summary` gathers none, and is quicker. Default `summary`. */
                readonly detail?: components["parameters"]["BatchDetail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["BatchRequest"];
            };
        };
        readonly responses: {
            /** @description The answers, in the order of the items. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["BatchAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly runCsvBatch: {
        readonly parameters: {
            readonly query?: {
                /** @description `full` shows the working of every item; `summary` gathers none, and is quicker. Default `summary`. */
                readonly detail?: components["parameters"]["BatchDetail"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description One of the checks.
                 * @example waler
                 */
                readonly check: components["parameters"]["CheckIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example ref,section,spans,loads.0.name,loads.0.value
                 *     W1,UB 457x191x67,3+3+2.4,earth,95
                 */
                readonly "text/csv": string;
            };
        };
        readonly responses: {
            /** @description The rows. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example ref,row,status,utilisation,governing,error
                     *     W1,1,pass,0.62,bending-y,
                     *     #end,1
                     */
                    readonly "text/csv": string;
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly selectWaler: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["WalerSelectRequest"];
            };
        };
        readonly responses: {
            /** @description The choice. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SelectAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly selectBeam: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["BeamSelectRequest"];
            };
        };
        readonly responses: {
            /** @description The choice. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SelectAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly selectProp: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["PropSelectRequest"];
            };
        };
        readonly responses: {
            /** @description The choice. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SelectAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly selectMember: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["MemberSelectRequest"];
            };
        };
        readonly responses: {
            /** @description The choice. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SelectAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly compareWaler: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["WalerCompareRequest"];
            };
        };
        readonly responses: {
            /** @description The comparison. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CompareAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly compareBeam: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["BeamCompareRequest"];
            };
        };
        readonly responses: {
            /** @description The comparison. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CompareAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly compareProp: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["PropCompareRequest"];
            };
        };
        readonly responses: {
            /** @description The comparison. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CompareAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly compareMember: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["MemberCompareRequest"];
            };
        };
        readonly responses: {
            /** @description The comparison. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CompareAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly limitsWaler: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["WalerLimitsRequest"];
            };
        };
        readonly responses: {
            /** @description The limit. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["LimitsAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly limitsBeam: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["BeamLimitsRequest"];
            };
        };
        readonly responses: {
            /** @description The limit. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["LimitsAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly limitsProp: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["PropLimitsRequest"];
            };
        };
        readonly responses: {
            /** @description The limit. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["LimitsAnswer"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly listUsage: {
        readonly parameters: {
            readonly query?: {
                /** @description Only calls of this client, by its id, or of those whose name holds this text. */
                readonly client?: components["parameters"]["UsageClient"];
                /** @description Only calls with this key, by its public part. */
                readonly key?: components["parameters"]["UsageKey"];
                /** @description Only calls of this person, by the id. */
                readonly person?: components["parameters"]["UsagePerson"];
                /**
                 * @description Only calls under this factor profile, or this revision of it.
                 * @example uk-na@1
                 */
                readonly profile?: components["parameters"]["UsageProfile"];
                /** @description Only calls of this check. */
                readonly check?: components["parameters"]["UsageCheck"];
                /** @description Only calls answered with this HTTP status. */
                readonly status?: components["parameters"]["UsageStatus"];
                /** @description Only checks answered with this status. */
                readonly answer?: components["parameters"]["UsageAnswer"];
                /**
                 * @description Only calls from this date, or date and time with its offset, on.
                 * @example 2026-01-31T08:00:00Z
                 */
                readonly from?: components["parameters"]["UsageFrom"];
                /**
                 * @description Only calls before this date, or date and time with its offset.
                 * @example 2026-02-01
                 */
                readonly to?: components["parameters"]["UsageTo"];
                /** @description How many to a page. */
                readonly pageSize?: components["parameters"]["PageSize"];
                /** @description `nextPageToken` of the page before. Default the first page. */
                readonly pageToken?: components["parameters"]["PageToken"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description A page of the log. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["UsageList"];
                };
            };
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readUsage: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description X-Request-Id of the answer.
                 * @example 01K4QZ6T3M8V5W2C7R9B0N1XJD
                 */
                readonly requestId: components["parameters"]["RequestIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The call. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["UsageEvent"];
                };
            };
            readonly 401: components["responses"]["KeyRefused"];
            readonly 403: components["responses"]["NotAllowed"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readSession: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Who is signed in. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "person": {
                     *         "id": "5a17c0de-0002-4000-8000-000000000001",
                     *         "email": "admin@saltmarsh.example",
                     *         "name": "Asha Verrall",
                     *         "roles": [
                     *           "admin"
                     *         ]
                     *       },
                     *       "permissions": [
                     *         "catalogue:read",
                     *         "checks:run",
                     *         "profiles:read",
                     *         "clients:read",
                     *         "clients:write",
                     *         "keys:read",
                     *         "keys:write",
                     *         "usage:read"
                     *       ],
                     *       "csrfToken": "q0Y9r2K7c5m1Vx3nT8bLw4Zs6Jd0HfAeUoPiRtYgNkM"
                     *     }
                     */
                    readonly "application/json": components["schemas"]["SessionState"];
                };
            };
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly signIn: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "email": "admin@saltmarsh.example",
                 *       "password": "correct horse battery staple"
                 *     }
                 */
                readonly "application/json": components["schemas"]["SessionRequest"];
            };
        };
        readonly responses: {
            /** @description The person is signed in. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly "Set-Cookie": components["headers"]["SetCookie"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "person": {
                     *         "id": "5a17c0de-0002-4000-8000-000000000001",
                     *         "email": "admin@saltmarsh.example",
                     *         "name": "Asha Verrall",
                     *         "roles": [
                     *           "admin"
                     *         ]
                     *       },
                     *       "permissions": [
                     *         "catalogue:read",
                     *         "checks:run",
                     *         "profiles:read",
                     *         "clients:read",
                     *         "clients:write",
                     *         "keys:read",
                     *         "keys:write",
                     *         "usage:read"
                     *       ],
                     *       "csrfToken": "q0Y9r2K7c5m1Vx3nT8bLw4Zs6Jd0HfAeUoPiRtYgNkM"
                     *     }
                     */
                    readonly "application/json": components["schemas"]["SessionState"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["SignInRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly signOut: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The session's `csrfToken`. */
                readonly "X-CSRF-Token": components["parameters"]["CsrfToken"];
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Nobody is signed in. */
            readonly 204: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            readonly 403: components["responses"]["NotPermitted"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly listClients: {
        readonly parameters: {
            readonly query?: {
                /** @description How many to a page. */
                readonly pageSize?: components["parameters"]["PageSize"];
                /** @description `nextPageToken` of the page before. Default the first page. */
                readonly pageToken?: components["parameters"]["PageToken"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description A page of the clients. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "items": [
                     *         {
                     *           "id": "5a17c0de-0001-4000-8000-000000000003",
                     *           "name": "Waler schedule workbook",
                     *           "defaultProfile": "uk-na",
                     *           "pins": [],
                     *           "createdAt": "2026-01-31T08:00:00.000Z",
                     *           "disabledAt": null,
                     *           "liveKeys": 1
                     *         }
                     *       ],
                     *       "nextPageToken": null
                     *     }
                     */
                    readonly "application/json": components["schemas"]["ClientList"];
                };
            };
            readonly 401: components["responses"]["SessionRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly makeClient: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The session's `csrfToken`. */
                readonly "X-CSRF-Token": components["parameters"]["CsrfToken"];
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "name": "Waler schedule workbook",
                 *       "defaultProfile": "uk-na"
                 *     }
                 */
                readonly "application/json": components["schemas"]["ClientRequest"];
            };
        };
        readonly responses: {
            /** @description The client. */
            readonly 201: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly Location: components["headers"]["Location"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "id": "5a17c0de-0001-4000-8000-000000000003",
                     *       "name": "Waler schedule workbook",
                     *       "defaultProfile": "uk-na",
                     *       "pins": [],
                     *       "createdAt": "2026-01-31T08:00:00.000Z",
                     *       "disabledAt": null,
                     *       "liveKeys": 1
                     *     }
                     */
                    readonly "application/json": components["schemas"]["ClientFacts"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["SessionRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 409: components["responses"]["Conflict"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readClient: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description A client's `id`.
                 * @example 5a17c0de-0001-4000-8000-000000000003
                 */
                readonly id: components["parameters"]["ClientIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The client. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "id": "5a17c0de-0001-4000-8000-000000000003",
                     *       "name": "Waler schedule workbook",
                     *       "defaultProfile": "uk-na",
                     *       "pins": [],
                     *       "createdAt": "2026-01-31T08:00:00.000Z",
                     *       "disabledAt": null,
                     *       "liveKeys": 1
                     *     }
                     */
                    readonly "application/json": components["schemas"]["ClientFacts"];
                };
            };
            readonly 401: components["responses"]["SessionRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly changeClient: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The session's `csrfToken`. */
                readonly "X-CSRF-Token": components["parameters"]["CsrfToken"];
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description A client's `id`.
                 * @example 5a17c0de-0001-4000-8000-000000000003
                 */
                readonly id: components["parameters"]["ClientIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "disabled": true
                 *     }
                 */
                readonly "application/json": components["schemas"]["ClientChange"];
            };
        };
        readonly responses: {
            /** @description The client. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "id": "5a17c0de-0001-4000-8000-000000000003",
                     *       "name": "Waler schedule workbook",
                     *       "defaultProfile": "uk-na",
                     *       "pins": [],
                     *       "createdAt": "2026-01-31T08:00:00.000Z",
                     *       "disabledAt": "2026-02-01T09:00:00.000Z",
                     *       "liveKeys": 1
                     *     }
                     */
                    readonly "application/json": components["schemas"]["ClientFacts"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["SessionRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 404: components["responses"]["NotFound"];
            readonly 409: components["responses"]["Conflict"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly listKeys: {
        readonly parameters: {
            readonly query?: {
                /** @description How many to a page. */
                readonly pageSize?: components["parameters"]["PageSize"];
                /** @description `nextPageToken` of the page before. Default the first page. */
                readonly pageToken?: components["parameters"]["PageToken"];
            };
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description A client's `id`.
                 * @example 5a17c0de-0001-4000-8000-000000000003
                 */
                readonly id: components["parameters"]["ClientIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description A page of the keys. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "items": [
                     *         {
                     *           "selector": "4Fq9ZtR2mLx7",
                     *           "clientId": "5a17c0de-0001-4000-8000-000000000003",
                     *           "kind": "page",
                     *           "label": "Site office page",
                     *           "scopes": [
                     *             "checks",
                     *             "catalogue"
                     *           ],
                     *           "origins": [
                     *             "https://intranet.example"
                     *           ],
                     *           "profiles": null,
                     *           "rateLimit": null,
                     *           "createdAt": "2026-01-31T08:00:00.000Z",
                     *           "expiresAt": "2027-01-31T18:00:00.000Z",
                     *           "revokedAt": null,
                     *           "lastUsedOn": null,
                     *           "state": "live"
                     *         }
                     *       ],
                     *       "nextPageToken": null
                     *     }
                     */
                    readonly "application/json": components["schemas"]["KeyList"];
                };
            };
            readonly 401: components["responses"]["SessionRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly issueKey: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The session's `csrfToken`. */
                readonly "X-CSRF-Token": components["parameters"]["CsrfToken"];
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description A client's `id`.
                 * @example 5a17c0de-0001-4000-8000-000000000003
                 */
                readonly id: components["parameters"]["ClientIdInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "kind": "page",
                 *       "label": "Site office page",
                 *       "origins": [
                 *         "https://intranet.example"
                 *       ],
                 *       "expiresAt": "2027-01-31T18:00:00Z"
                 *     }
                 */
                readonly "application/json": components["schemas"]["KeyRequest"];
            };
        };
        readonly responses: {
            /** @description The key with its text. */
            readonly 201: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "key": {
                     *         "selector": "4Fq9ZtR2mLx7",
                     *         "clientId": "5a17c0de-0001-4000-8000-000000000003",
                     *         "kind": "page",
                     *         "label": "Site office page",
                     *         "scopes": [
                     *           "checks",
                     *           "catalogue"
                     *         ],
                     *         "origins": [
                     *           "https://intranet.example"
                     *         ],
                     *         "profiles": null,
                     *         "rateLimit": null,
                     *         "createdAt": "2026-01-31T08:00:00.000Z",
                     *         "expiresAt": "2027-01-31T18:00:00.000Z",
                     *         "revokedAt": null,
                     *         "lastUsedOn": null,
                     *         "state": "live"
                     *       },
                     *       "text": "htp_4Fq9ZtR2mLx7_THE-SECRET-PART-IS-SHOWN-HERE"
                     *     }
                     */
                    readonly "application/json": components["schemas"]["IssuedKey"];
                };
            };
            readonly 400: components["responses"]["NotJson"];
            readonly 401: components["responses"]["SessionRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 404: components["responses"]["NotFound"];
            readonly 409: components["responses"]["Conflict"];
            readonly 413: components["responses"]["TooLarge"];
            readonly 415: components["responses"]["NotDeclaredAsJson"];
            readonly 422: components["responses"]["NotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly revokeKey: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The session's `csrfToken`. */
                readonly "X-CSRF-Token": components["parameters"]["CsrfToken"];
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description The public part of a key.
                 * @example 4Fq9ZtR2mLx7
                 */
                readonly selector: components["parameters"]["SelectorInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The key. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "selector": "4Fq9ZtR2mLx7",
                     *       "clientId": "5a17c0de-0001-4000-8000-000000000003",
                     *       "kind": "page",
                     *       "label": "Site office page",
                     *       "scopes": [
                     *         "checks",
                     *         "catalogue"
                     *       ],
                     *       "origins": [
                     *         "https://intranet.example"
                     *       ],
                     *       "profiles": null,
                     *       "rateLimit": null,
                     *       "createdAt": "2026-01-31T08:00:00.000Z",
                     *       "expiresAt": "2027-01-31T18:00:00.000Z",
                     *       "revokedAt": "2026-02-01T09:00:00.000Z",
                     *       "lastUsedOn": null,
                     *       "state": "revoked"
                     *     }
                     */
                    readonly "application/json": components["schemas"]["KeyFacts"];
                };
            };
            readonly 401: components["responses"]["SessionRefused"];
            readonly 403: components["responses"]["NotPermitted"];
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
            readonly 503: components["responses"]["Away"];
        };
    };
    readonly readContract: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The contract. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly RateLimit: components["headers"]["RateLimit"];
                    readonly "RateLimit-Policy": components["headers"]["RateLimitPolicy"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["OpenApiDocument"];
                };
            };
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 429: components["responses"]["TooManyCalls"];
            readonly 500: components["responses"]["Unexpected"];
        };
    };
    readonly isAlive: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description It does. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "status": "ok"
                     *     }
                     */
                    readonly "application/json": components["schemas"]["Health"];
                };
            };
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 500: components["responses"]["Unexpected"];
        };
    };
    readonly isReady: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description It is. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "status": "ready",
                     *       "database": true,
                     *       "listener": true,
                     *       "partitions": {
                     *         "ok": true,
                     *         "warnings": []
                     *       }
                     *     }
                     */
                    readonly "application/json": components["schemas"]["Readiness"];
                };
            };
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 500: components["responses"]["Unexpected"];
            /** @description It is not. */
            readonly 503: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly "Retry-After": components["headers"]["RetryAfter"];
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example {
                     *       "status": "not-ready",
                     *       "database": false,
                     *       "listener": false,
                     *       "partitions": {
                     *         "ok": true,
                     *         "warnings": []
                     *       }
                     *     }
                     */
                    readonly "application/json": components["schemas"]["Readiness"];
                };
            };
        };
    };
    readonly listProblems: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The page. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ProblemKindList"];
                    readonly "text/html": string;
                };
            };
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 500: components["responses"]["Unexpected"];
        };
    };
    readonly readProblem: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description The caller's own id of the call; it is kept in the log as a label. */
                readonly "X-Request-Id"?: components["parameters"]["RequestId"];
            };
            readonly path: {
                /**
                 * @description A problem's `code`.
                 * @example not-valid
                 */
                readonly code: components["parameters"]["ProblemCodeInPath"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The page. */
            readonly 200: {
                headers: {
                    readonly "X-Request-Id": components["headers"]["XRequestId"];
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ProblemKind"];
                    readonly "text/html": string;
                };
            };
            readonly 404: components["responses"]["NotFound"];
            readonly 422: components["responses"]["QueryNotValid"];
            readonly 500: components["responses"]["Unexpected"];
        };
    };
}
