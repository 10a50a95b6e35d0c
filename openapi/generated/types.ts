/* Generated from openapi/ by `npm run contract`. Do not change by hand. */
export interface paths {
    readonly "/v1/checks/waler": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Check a waler */
        readonly post: operations["checkWaler"];
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
        readonly VerificationId: "tension" | "compression" | "bending-y" | "bending-z" | "shear-z" | "shear-y" | "torsion" | "shear-torsion" | "bending-shear-y" | "bending-axial-y" | "bending-axial-z" | "biaxial" | "flexural-buckling-y" | "flexural-buckling-z" | "flexural-buckling-u" | "flexural-buckling-v" | "torsional-buckling" | "torsional-flexural-buckling" | "lateral-torsional-buckling" | "interaction-y" | "interaction-z" | "interaction-lt" | "von-mises" | "transverse-force" | "transverse-force-bending" | "web-buckling-shear" | "flange-induced-buckling" | "bearing-across-grain" | "bearing-at-angle" | "notch" | "ground-bearing" | "adjustable-prop" | "deflection" | "deflection-final" | "deflection-net-final";
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
         * @description The last part of a check's path.
         * @enum {string}
         */
        readonly CheckId: "waler" | "beam" | "prop" | "adjustable-prop" | "member" | "section" | "stress" | "bearing";
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
            /** @description The formula with its numbers in mathjs syntax with units; for a choice its text. */
            readonly substituted: string;
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
            readonly profile: components["schemas"]["ProfileStamp"];
            readonly advisories: readonly components["schemas"]["Advisory"][];
            readonly basis: components["schemas"]["Basis"];
            /** @description `null` unless the answer was kept. */
            readonly record: components["schemas"]["RecordLink"] | null;
            /** @description The caution that goes with every answer. */
            readonly notice: string;
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
    };
    responses: never;
    parameters: never;
    requestBodies: never;
    headers: never;
    pathItems: never;
}
export type $defs = Record<string, never>;
export interface operations {
    readonly checkWaler: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["WalerRequest"];
            };
        };
        readonly responses: {
            /** @description The answer. */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CheckAnswer"];
                };
            };
            /** @description Not valid. */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
}
