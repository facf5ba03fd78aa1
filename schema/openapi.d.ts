// Generated from schema/openapi.json by schema/generate.ts. Do not edit.
export interface paths {
    readonly "/v1/single-pile": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Resistance of one pile, compression or uplift */
        readonly post: operations["calculateSinglePile"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/block": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Resistance of the block that a layout encloses */
        readonly post: operations["calculateBlock"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/group": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Sum of single piles against block: what governs */
        readonly post: operations["calculateGroup"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/settlement": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Settlement, tilt, pile loads and stiffness */
        readonly post: operations["calculateSettlement"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Every check of every cap of a schedule; nothing is stored */
        readonly post: operations["assessSchedule"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/replay": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Re-evaluate a trace */
        readonly post: operations["replayTrace"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/methods": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Every method with source, validity, parameters and formulas */
        readonly get: operations["listMethods"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/sources": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** The bibliography */
        readonly get: operations["listSources"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/limits": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** What one request may hold */
        readonly get: operations["listLimits"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/methods/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** The methods of one id */
        readonly get: operations["getMethod"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/projects": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Projects that the key has a right to, by slug */
        readonly get: operations["listProjects"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/projects/{slug}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** One project */
        readonly get: operations["getProject"];
        /** Make a project, or change its title */
        readonly put: operations["putProject"];
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/projects/{slug}/assessments": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Assessments of a project, oldest first */
        readonly get: operations["listAssessments"];
        readonly put?: never;
        /** Assess a schedule and keep it as the next revision of the project */
        readonly post: operations["recordAssessment"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/projects/{slug}/integrity": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Recompute every hash, link and row of the records of a project */
        readonly get: operations["verifyProject"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** One record: state, summary, hashes; how far it is, as long as it is none */
        readonly get: operations["getAssessment"];
        readonly put?: never;
        readonly post?: never;
        /** Cancel an assessment that waits or runs; a record is never deleted */
        readonly delete: operations["cancelAssessment"];
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/events": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Progress as server-sent events, until the assessment ends */
        readonly get: operations["watchAssessment"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/content": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Request, result and notices as the canonical JSON (RFC 8785) whose SHA-256 is the content hash */
        readonly get: operations["getContent"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/caps": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Caps of a record as flat rows */
        readonly get: operations["listCaps"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/caps/{mark}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** One cap of a record: checks, settlement, stiffness, and the trace behind them */
        readonly get: operations["getCap"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/changes": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** What differs from another revision: verdicts that turned, caps and what governs them, inputs by pointer */
        readonly get: operations["listChanges"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/signatures": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Signatures of a record, in their order */
        readonly get: operations["listSignatures"];
        readonly put?: never;
        /** Sign a record: originator, then checker, then approver, three people */
        readonly post: operations["signAssessment"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/reverify": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /** Compute a record again with the running engine */
        readonly post: operations["reverifyAssessment"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/projects/{slug}/plan": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Plan of the newest assessment of a project: all caps with utilisation, settlement and what governs */
        readonly get: operations["printPlan"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/sheet": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** The same plan of one assessment */
        readonly get: operations["printOverview"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/caps/{mark}/sheet": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Calculation sheet of one cap, with the signatures of the record */
        readonly get: operations["printCapSheet"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/piles": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Schedule of piles, as CSV or as a page */
        readonly get: operations["printPiles"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/v1/assessments/{id}/piles.csv": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** Schedule of piles as CSV, for links */
        readonly get: operations["getPilesCsv"];
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
        readonly GroundProfile: {
            readonly name?: string;
            /** @description depth of the water table; left out: below all */
            readonly waterTableDepth?: number | string;
            readonly layers: readonly ({
                readonly name: string;
                /** @description thickness; may be left out on the last layer */
                readonly thickness?: number | string;
                /** @description bulk unit weight; below water: saturated */
                readonly unitWeight: number | string;
                /** @description SPT blow count N60 */
                readonly sptN60?: number | string;
                readonly coneResistance?: (number | string) | {
                    /** @description cone resistance, at the top */
                    readonly top: number | string;
                    /** @description cone resistance, at the bottom */
                    readonly bottom: number | string;
                };
                readonly youngsModulus?: (number | string) | {
                    /** @description Young's modulus, at the top */
                    readonly top: number | string;
                    /** @description Young's modulus, at the bottom */
                    readonly bottom: number | string;
                };
                /** @description Poisson's ratio */
                readonly poissonsRatio?: number | string;
                /** @constant */
                readonly soil: "cohesive";
                readonly undrainedShearStrength?: (number | string) | {
                    /** @description undrained shear strength, at the top */
                    readonly top: number | string;
                    /** @description undrained shear strength, at the bottom */
                    readonly bottom: number | string;
                };
                /** @description plasticity index, percent */
                readonly plasticityIndex?: number | string;
                /** @description overconsolidation ratio */
                readonly overconsolidationRatio?: number | string;
                /** @description effective friction angle */
                readonly effectiveFrictionAngle?: number | string;
            } | {
                readonly name: string;
                /** @description thickness; may be left out on the last layer */
                readonly thickness?: number | string;
                /** @description bulk unit weight; below water: saturated */
                readonly unitWeight: number | string;
                /** @description SPT blow count N60 */
                readonly sptN60?: number | string;
                readonly coneResistance?: (number | string) | {
                    /** @description cone resistance, at the top */
                    readonly top: number | string;
                    /** @description cone resistance, at the bottom */
                    readonly bottom: number | string;
                };
                readonly youngsModulus?: (number | string) | {
                    /** @description Young's modulus, at the top */
                    readonly top: number | string;
                    /** @description Young's modulus, at the bottom */
                    readonly bottom: number | string;
                };
                /** @description Poisson's ratio */
                readonly poissonsRatio?: number | string;
                /** @constant */
                readonly soil: "granular";
                /** @description friction angle */
                readonly frictionAngle?: number | string;
                /** @description relative density, percent */
                readonly relativeDensity?: number | string;
            } | {
                readonly name: string;
                /** @description thickness; may be left out on the last layer */
                readonly thickness?: number | string;
                /** @description bulk unit weight; below water: saturated */
                readonly unitWeight: number | string;
                /** @description SPT blow count N60 */
                readonly sptN60?: number | string;
                readonly coneResistance?: (number | string) | {
                    /** @description cone resistance, at the top */
                    readonly top: number | string;
                    /** @description cone resistance, at the bottom */
                    readonly bottom: number | string;
                };
                readonly youngsModulus?: (number | string) | {
                    /** @description Young's modulus, at the top */
                    readonly top: number | string;
                    /** @description Young's modulus, at the bottom */
                    readonly bottom: number | string;
                };
                /** @description Poisson's ratio */
                readonly poissonsRatio?: number | string;
                /** @constant */
                readonly soil: "rock";
                readonly unconfinedCompressiveStrength?: (number | string) | {
                    /** @description unconfined compressive strength, at the top */
                    readonly top: number | string;
                    /** @description unconfined compressive strength, at the bottom */
                    readonly bottom: number | string;
                };
                /** @description rock quality designation, percent */
                readonly rqd?: number | string;
            })[];
            readonly rigidBase?: boolean;
        };
        readonly PileType: {
            readonly section: {
                /** @constant */
                readonly shape: "circular";
                /** @description diameter */
                readonly diameter: number | string;
            } | {
                /** @constant */
                readonly shape: "square";
                /** @description width */
                readonly width: number | string;
            } | {
                /** @constant */
                readonly shape: "tubular";
                /** @description outer diameter */
                readonly diameter: number | string;
                /** @description wall thickness */
                readonly wallThickness: number | string;
                /** @enum {string} */
                readonly toe: "open" | "closed";
            } | {
                /** @constant */
                readonly shape: "h";
                /** @description section depth */
                readonly depth: number | string;
                /** @description flange width */
                readonly flangeWidth: number | string;
                /** @description steel area */
                readonly area: number | string;
            };
            /** @description length */
            readonly length: number | string;
            /** @description depth of the head below the surface */
            readonly headDepth?: number | string;
            /** @enum {string} */
            readonly installation: "driven" | "bored" | "continuous-flight-auger";
            /** @description Young's modulus of the pile */
            readonly youngsModulus?: number | string;
            /** @description diameter of an enlarged base */
            readonly baseDiameter?: number | string;
            /** @description unit weight of the pile */
            readonly unitWeight?: number | string;
            readonly sectionResistance?: {
                /** @description design resistance of the section */
                readonly compression?: number | string;
                /** @description design resistance of the section */
                readonly tension?: number | string;
            };
        };
        readonly Layout: {
            /** @constant */
            readonly kind: "grid";
            readonly columns: number;
            readonly rows: number;
            /** @description spacing of the pile axes */
            readonly spacing?: number | string;
            /** @description spacing of the pile axes */
            readonly spacingX?: number | string;
            /** @description spacing of the pile axes */
            readonly spacingY?: number | string;
        } | {
            /** @constant */
            readonly kind: "ring";
            readonly count: number;
            /** @description radius */
            readonly radius: number | string;
        } | {
            /** @constant */
            readonly kind: "points";
            readonly points: readonly {
                /** @description position along x */
                readonly x: number | string;
                /** @description position along y */
                readonly y: number | string;
            }[];
        };
        readonly DesignBasis: {
            /** @constant */
            readonly format: "overall-factor";
            /** @description overall factor */
            readonly factor: number | string;
            /** @description overall factor of the block */
            readonly blockFactor?: number | string;
            /** @description overall factor in uplift */
            readonly upliftFactor?: number | string;
            readonly split?: {
                /** @description factor on the shaft */
                readonly shaft: number | string;
                /** @description factor on the base */
                readonly base: number | string;
            };
        } | {
            /** @constant */
            readonly format: "en1997-1-2004";
            /** @enum {string} */
            readonly approach: "DA1-1" | "DA1-2" | "DA2" | "DA3";
            readonly characteristic: {
                /** @constant */
                readonly route: "model-factor";
                /** @description model factor */
                readonly value: number | string;
            } | {
                /** @constant */
                readonly route: "profiles";
                readonly count: number;
                readonly stiffStructure?: boolean;
            };
        } | {
            /** @constant */
            readonly format: "custom";
            /** @description factor on the shaft */
            readonly shaft: number | string;
            /** @description factor on the base */
            readonly base: number | string;
            /** @description factor on the block */
            readonly block: number | string;
            /** @description factor in uplift */
            readonly uplift: number | string;
        };
        readonly MethodChoices: {
            readonly cohesiveShaft?: ("rp2geo-2011" | "rp2a-1984" | "randolph-murphy-1985" | "kolk-van-der-velde-1996" | "skempton-1959" | "oneill-reese-1999" | "gec10-2018" | "burland-1973" | "specified-alpha") | ({
                /** @constant */
                readonly method: "rp2geo-2011";
            } | {
                /** @constant */
                readonly method: "rp2a-1984";
            } | {
                /** @constant */
                readonly method: "randolph-murphy-1985";
                /** @description normally consolidated strength ratio */
                readonly normallyConsolidatedRatio?: number | string;
            } | {
                /** @constant */
                readonly method: "kolk-van-der-velde-1996";
            } | {
                /** @constant */
                readonly method: "skempton-1959";
            } | {
                /** @constant */
                readonly method: "oneill-reese-1999";
            } | {
                /** @constant */
                readonly method: "gec10-2018";
            } | {
                /** @constant */
                readonly method: "burland-1973";
            } | {
                /** @constant */
                readonly method: "specified-alpha";
                /** @description adhesion factor */
                readonly alpha: number | string;
            });
            readonly cohesiveBase?: ("skempton-1951" | "linear-depth" | "nhi-2006" | "oneill-reese-1999" | "specified-nc") | ({
                /** @constant */
                readonly method: "skempton-1951";
            } | {
                /** @constant */
                readonly method: "linear-depth";
            } | {
                /** @constant */
                readonly method: "nhi-2006";
            } | {
                /** @constant */
                readonly method: "oneill-reese-1999";
            } | {
                /** @constant */
                readonly method: "specified-nc";
                /** @description bearing factor */
                readonly bearingFactor: number | string;
            });
            readonly granularShaft?: ("beta-effective-stress" | "navfac-1986" | "rp2geo-2011" | "oneill-reese-1999" | "specified-beta") | ({
                /** @constant */
                readonly method: "beta-effective-stress";
                /** @description earth pressure coefficient */
                readonly earthPressure?: number | string;
                /** @description interface angle over friction angle */
                readonly interfaceRatio?: number | string;
                /** @description limit of the unit shaft resistance */
                readonly limit?: number | string;
            } | {
                /** @constant */
                readonly method: "navfac-1986";
            } | {
                /** @constant */
                readonly method: "rp2geo-2011";
                /** @description sand-silt (1) instead of sand (0) */
                readonly silty?: number | string;
            } | {
                /** @constant */
                readonly method: "oneill-reese-1999";
            } | {
                /** @constant */
                readonly method: "specified-beta";
                /** @description shaft factor */
                readonly beta: number | string;
            });
            readonly granularBase?: ("navfac-1986" | "janbu-1976" | "rp2geo-2011" | "oneill-reese-1999") | ({
                /** @constant */
                readonly method: "navfac-1986";
            } | {
                /** @constant */
                readonly method: "janbu-1976";
                /** @description plastification angle */
                readonly plastificationAngle?: number | string;
            } | {
                /** @constant */
                readonly method: "rp2geo-2011";
                /** @description sand-silt (1) instead of sand (0) */
                readonly silty?: number | string;
            } | {
                /** @constant */
                readonly method: "oneill-reese-1999";
            });
            readonly upliftRatio?: {
                /** @description share of the shaft resistance in uplift */
                readonly cohesive?: number | string;
                /** @description share of the shaft resistance in uplift */
                readonly granular?: number | string;
            };
            /** @description longest sublayer of the shaft sum */
            readonly sublayer?: number | string;
        };
        readonly SinglePileRequest: {
            readonly pile: components["schemas"]["PileType"];
            readonly ground: components["schemas"]["GroundProfile"];
            /** @enum {string} */
            readonly direction?: "compression" | "uplift";
            readonly methods?: components["schemas"]["MethodChoices"];
            readonly designBasis?: components["schemas"]["DesignBasis"];
        };
        readonly GroupRequest: {
            readonly pile: components["schemas"]["PileType"];
            readonly ground: components["schemas"]["GroundProfile"];
            /** @enum {string} */
            readonly direction?: "compression" | "uplift";
            readonly methods?: components["schemas"]["MethodChoices"];
            readonly designBasis?: components["schemas"]["DesignBasis"];
            readonly layout: components["schemas"]["Layout"];
        };
        readonly SettlementRequest: {
            readonly pile: components["schemas"]["PileType"];
            readonly ground: components["schemas"]["GroundProfile"];
            readonly layout?: components["schemas"]["Layout"];
            readonly load: {
                /** @description vertical load, positive downward */
                readonly V: number | string;
                /** @description moment that presses piles at +y */
                readonly Mx?: number | string;
                /** @description moment that presses piles at +x */
                readonly My?: number | string;
            };
            /** @enum {string} */
            readonly cap?: "rigid" | "flexible";
            /**
             * @description left out: elastic-continuum
             * @enum {string}
             */
            readonly method?: "elastic-continuum" | "randolph-wroth-1978";
            /**
             * @description hyperbolic: the pile's own springs soften towards its resistance by `methods`; gives load-settlement curves (elastic-continuum)
             * @enum {string}
             */
            readonly nonlinearity?: "hyperbolic";
            readonly failureRatio?: {
                /** @description R_f of the shaft; left out 0.5 */
                readonly shaft?: number | string;
                /** @description R_f of the base; left out 0.9 */
                readonly base?: number | string;
            };
            readonly methods?: components["schemas"]["MethodChoices"];
            /**
             * @description full: every element of every pile acts on every other (elastic-continuum, up to 64 piles); left out: superposed interaction factors
             * @enum {string}
             */
            readonly coupling?: "full";
        };
        readonly Schedule: {
            readonly title: string;
            readonly designBasis: components["schemas"]["DesignBasis"];
            readonly methods?: components["schemas"]["MethodChoices"];
            /**
             * @description left out: elastic-continuum
             * @enum {string}
             */
            readonly settlementMethod?: "elastic-continuum" | "randolph-wroth-1978";
            /** @description true: each cap also settles in the field of all others; left out: caps settle alone */
            readonly capInteraction?: boolean;
            readonly ground: {
                readonly [key: string]: components["schemas"]["GroundProfile"];
            };
            readonly pileTypes: {
                readonly [key: string]: components["schemas"]["PileType"];
            };
            readonly caps: readonly {
                readonly mark: string;
                /** @description position along x */
                readonly x: number | string;
                /** @description position along y */
                readonly y: number | string;
                readonly ground: string;
                readonly pileType: string;
                readonly layout: components["schemas"]["Layout"];
                /** @description weight of the cap, added to V */
                readonly capWeight?: number | string;
            }[];
            readonly loads: {
                /** @constant */
                readonly signs: "pressing";
                /** @enum {string} */
                readonly loadsAre: "actions" | "reactions";
                readonly combinations: {
                    readonly [key: string]: {
                        /** @enum {string} */
                        readonly limitState: "ultimate" | "working" | "serviceability";
                    };
                };
                readonly rows: readonly {
                    readonly cap: string;
                    readonly combination: string;
                    /** @description V */
                    readonly V: number | string;
                    /** @description Mx */
                    readonly Mx: number | string;
                    /** @description My */
                    readonly My: number | string;
                }[];
            } | {
                /** @constant */
                readonly signs: "right-handed-z-up";
                /** @enum {string} */
                readonly loadsAre: "actions" | "reactions";
                readonly combinations: {
                    readonly [key: string]: {
                        /** @enum {string} */
                        readonly limitState: "ultimate" | "working" | "serviceability";
                    };
                };
                readonly rows: readonly {
                    readonly cap: string;
                    readonly combination: string;
                    /** @description Fx */
                    readonly Fx: number | string;
                    /** @description Fy */
                    readonly Fy: number | string;
                    /** @description Fz */
                    readonly Fz: number | string;
                    /** @description Mx */
                    readonly Mx: number | string;
                    /** @description My */
                    readonly My: number | string;
                    /** @description Mz */
                    readonly Mz: number | string;
                }[];
            } | {
                /** @constant */
                readonly signs: "right-handed-z-down";
                /** @enum {string} */
                readonly loadsAre: "actions" | "reactions";
                readonly combinations: {
                    readonly [key: string]: {
                        /** @enum {string} */
                        readonly limitState: "ultimate" | "working" | "serviceability";
                    };
                };
                readonly rows: readonly {
                    readonly cap: string;
                    readonly combination: string;
                    /** @description Fx */
                    readonly Fx: number | string;
                    /** @description Fy */
                    readonly Fy: number | string;
                    /** @description Fz */
                    readonly Fz: number | string;
                    /** @description Mx */
                    readonly Mx: number | string;
                    /** @description My */
                    readonly My: number | string;
                    /** @description Mz */
                    readonly Mz: number | string;
                }[];
            };
            readonly limits?: {
                /** @description largest settlement */
                readonly settlement?: number | string;
                /** @description largest tilt */
                readonly tilt?: number | string;
                /** @description largest angular distortion */
                readonly angularDistortion?: number | string;
            };
        };
        readonly ReplayRequest: {
            readonly trace: {
                readonly steps: readonly ({
                    readonly id: string;
                    readonly symbol: string;
                    readonly name: string;
                    readonly value: number;
                    readonly unit: string;
                    readonly quantity: string;
                    /** @constant */
                    readonly kind: "input";
                    readonly from?: string;
                    /** @constant */
                    readonly default?: true;
                    readonly reason?: string;
                    readonly source?: {
                        readonly key: string;
                        readonly locator: string;
                    };
                } | {
                    readonly id: string;
                    readonly symbol: string;
                    readonly name: string;
                    readonly value: number;
                    readonly unit: string;
                    readonly quantity: string;
                    /** @constant */
                    readonly kind: "formula";
                    readonly formula: string;
                    readonly operands: readonly {
                        readonly symbol: string;
                        readonly value: number;
                        readonly unit: string;
                        readonly from: string;
                    }[];
                    readonly source: {
                        readonly key: string;
                        readonly locator: string;
                    };
                    readonly range?: readonly {
                        readonly symbol: string;
                        readonly min?: number;
                        readonly max?: number;
                        readonly inside: boolean;
                    }[];
                } | {
                    readonly id: string;
                    readonly symbol: string;
                    readonly name: string;
                    readonly value: number;
                    readonly unit: string;
                    readonly quantity: string;
                    /** @constant */
                    readonly kind: "sum";
                    readonly operands: readonly {
                        readonly symbol: string;
                        readonly value: number;
                        readonly unit: string;
                        readonly from: string;
                    }[];
                } | {
                    readonly id: string;
                    readonly symbol: string;
                    readonly name: string;
                    readonly value: number;
                    readonly unit: string;
                    readonly quantity: string;
                    /** @constant */
                    readonly kind: "lookup";
                    readonly operands: readonly {
                        readonly symbol: string;
                        readonly value: number;
                        readonly unit: string;
                        readonly from: string;
                    }[];
                    readonly rows: readonly (readonly [
                        number,
                        number
                    ])[];
                    readonly source: {
                        readonly key: string;
                        readonly locator: string;
                    };
                } | {
                    readonly id: string;
                    readonly symbol: string;
                    readonly name: string;
                    readonly value: number;
                    readonly unit: string;
                    readonly quantity: string;
                    /** @constant */
                    readonly kind: "choice";
                    /** @enum {string} */
                    readonly rule: "smallest" | "largest";
                    readonly operands: readonly {
                        readonly symbol: string;
                        readonly value: number;
                        readonly unit: string;
                        readonly from: string;
                    }[];
                    readonly chosen: string;
                } | {
                    readonly id: string;
                    readonly symbol: string;
                    readonly name: string;
                    readonly value: number;
                    readonly unit: string;
                    readonly quantity: string;
                    /** @constant */
                    readonly kind: "solution";
                    readonly method: string;
                    readonly operands: readonly {
                        readonly symbol: string;
                        readonly value: number;
                        readonly unit: string;
                        readonly from: string;
                    }[];
                    readonly unknowns: readonly {
                        readonly symbol: string;
                        readonly value: number;
                        readonly unit: string;
                    }[];
                    readonly residuals: readonly {
                        readonly name: string;
                        readonly value: number;
                    }[];
                    readonly tolerance: number;
                    readonly mesh?: readonly number[];
                    readonly table?: {
                        readonly columns: readonly {
                            readonly symbol: string;
                            readonly unit: string;
                        }[];
                        readonly rows: readonly (readonly number[])[];
                    };
                    readonly source: {
                        readonly key: string;
                        readonly locator: string;
                    };
                })[];
                readonly results?: {
                    readonly [key: string]: string;
                };
                readonly sources?: readonly unknown[];
            };
            readonly request?: unknown;
        };
        readonly ProjectRequest: {
            readonly title: string;
        };
        readonly SignatureRequest: {
            /**
             * @description who signs in this order, each once
             * @enum {string}
             */
            readonly role: "originator" | "checker" | "approver";
            /** @description what the signature says, in words */
            readonly meaning: string;
        };
        readonly Step: {
            readonly id: string;
            readonly symbol: string;
            readonly name: string;
            readonly value: number;
            readonly unit: string;
            readonly quantity: string;
            /** @constant */
            readonly kind: "input";
            readonly from?: string;
            /** @constant */
            readonly default?: true;
            readonly reason?: string;
            readonly source?: {
                readonly key: string;
                readonly locator: string;
            };
        } | {
            readonly id: string;
            readonly symbol: string;
            readonly name: string;
            readonly value: number;
            readonly unit: string;
            readonly quantity: string;
            /** @constant */
            readonly kind: "formula";
            readonly formula: string;
            readonly operands: readonly {
                readonly symbol: string;
                readonly value: number;
                readonly unit: string;
                readonly from: string;
            }[];
            readonly source: {
                readonly key: string;
                readonly locator: string;
            };
            readonly range?: readonly {
                readonly symbol: string;
                readonly min?: number;
                readonly max?: number;
                readonly inside: boolean;
            }[];
        } | {
            readonly id: string;
            readonly symbol: string;
            readonly name: string;
            readonly value: number;
            readonly unit: string;
            readonly quantity: string;
            /** @constant */
            readonly kind: "sum";
            readonly operands: readonly {
                readonly symbol: string;
                readonly value: number;
                readonly unit: string;
                readonly from: string;
            }[];
        } | {
            readonly id: string;
            readonly symbol: string;
            readonly name: string;
            readonly value: number;
            readonly unit: string;
            readonly quantity: string;
            /** @constant */
            readonly kind: "lookup";
            readonly operands: readonly {
                readonly symbol: string;
                readonly value: number;
                readonly unit: string;
                readonly from: string;
            }[];
            readonly rows: readonly (readonly [
                number,
                number
            ])[];
            readonly source: {
                readonly key: string;
                readonly locator: string;
            };
        } | {
            readonly id: string;
            readonly symbol: string;
            readonly name: string;
            readonly value: number;
            readonly unit: string;
            readonly quantity: string;
            /** @constant */
            readonly kind: "choice";
            /** @enum {string} */
            readonly rule: "smallest" | "largest";
            readonly operands: readonly {
                readonly symbol: string;
                readonly value: number;
                readonly unit: string;
                readonly from: string;
            }[];
            readonly chosen: string;
        } | {
            readonly id: string;
            readonly symbol: string;
            readonly name: string;
            readonly value: number;
            readonly unit: string;
            readonly quantity: string;
            /** @constant */
            readonly kind: "solution";
            readonly method: string;
            readonly operands: readonly {
                readonly symbol: string;
                readonly value: number;
                readonly unit: string;
                readonly from: string;
            }[];
            readonly unknowns: readonly {
                readonly symbol: string;
                readonly value: number;
                readonly unit: string;
            }[];
            readonly residuals: readonly {
                readonly name: string;
                readonly value: number;
            }[];
            readonly tolerance: number;
            readonly mesh?: readonly number[];
            readonly table?: {
                readonly columns: readonly {
                    readonly symbol: string;
                    readonly unit: string;
                }[];
                readonly rows: readonly (readonly number[])[];
            };
            readonly source: {
                readonly key: string;
                readonly locator: string;
            };
        };
        readonly Notice: {
            readonly code: string;
            /** @enum {string} */
            readonly level: "caution" | "warning" | "info";
            readonly text: string;
            readonly pointer?: string;
        };
        readonly Trace: {
            readonly steps: readonly components["schemas"]["Step"][];
            readonly results: {
                readonly [key: string]: string;
            };
            readonly sources: readonly {
                readonly key: string;
                readonly title: string;
                readonly author: string;
                readonly year: number | null;
                /** @enum {string} */
                readonly basis: "published" | "common practice" | "memory";
            }[];
        };
        readonly SinglePileResult: {
            /** @description resistance of the shaft */
            readonly shaftResistance: number;
            /** @description resistance of the base */
            readonly baseResistance: number;
            /** @description unfactored resistance */
            readonly ultimateResistance: number;
            /** @description after partial or resistance factors */
            readonly designResistance?: number;
            /** @description under an overall factor */
            readonly allowableLoad?: number;
            /** @description effective weight, counted in uplift */
            readonly weight?: number;
            readonly layers: readonly {
                readonly name: string;
                /** @description depth */
                readonly top: number;
                /** @description depth */
                readonly bottom: number;
                /** @description mean over the layer */
                readonly unitShaftResistance: number;
                /** @description in this layer */
                readonly shaftResistance: number;
            }[];
            /** @description at the toe */
            readonly unitBaseResistance: number;
            /** @description depth of the toe */
            readonly toeDepth: number;
        };
        readonly BlockResult: {
            /** @description smaller side */
            readonly breadth: number;
            /** @description larger side */
            readonly length: number;
            /** @description depth of the toe */
            readonly depth: number;
            /** @description of the block */
            readonly perimeter: number;
            /** @description of the block */
            readonly baseArea: number;
            /** @description soil on soil */
            readonly sideResistance: number;
            /** @description of the block */
            readonly baseResistance: number;
            /** @description unfactored resistance */
            readonly ultimateResistance: number;
            /** @description effective weight, counted in uplift */
            readonly weight?: number;
            /** @description after partial or resistance factors */
            readonly designResistance?: number;
            /** @description under an overall factor */
            readonly allowableLoad?: number;
        };
        readonly Check: {
            /** @enum {string} */
            readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt";
            readonly combination: string;
            /** @description kN, mm or ratio, by check */
            readonly demand: number;
            /** @description in the unit of the demand */
            readonly resistance: number;
            /** @description demand over resistance */
            readonly utilisation: number;
            readonly satisfied: boolean;
            readonly pile?: number;
        };
        readonly SinglePileAnswer: {
            readonly result: components["schemas"]["SinglePileResult"];
            readonly notices: readonly components["schemas"]["Notice"][];
            readonly trace?: components["schemas"]["Trace"];
            readonly meta: {
                readonly engine: string;
                readonly requestHash: string;
            };
        };
        readonly BlockAnswer: {
            readonly result: components["schemas"]["BlockResult"];
            readonly notices: readonly components["schemas"]["Notice"][];
            readonly trace?: components["schemas"]["Trace"];
            readonly meta: {
                readonly engine: string;
                readonly requestHash: string;
            };
        };
        readonly GroupAnswer: {
            readonly result: {
                readonly pileCount: number;
                readonly single: components["schemas"]["SinglePileResult"];
                /** @description single pile times number */
                readonly sumOfPiles: number;
                /** @description smaller of sum and block over the sum */
                readonly efficiency: number;
                readonly block: components["schemas"]["BlockResult"];
                /** @enum {string} */
                readonly governing: "piles" | "block";
                /** @description the smaller */
                readonly ultimateResistance: number;
                /** @description after partial or resistance factors */
                readonly designResistance?: number;
                /** @description under an overall factor */
                readonly allowableLoad?: number;
            };
            readonly notices: readonly components["schemas"]["Notice"][];
            readonly trace?: components["schemas"]["Trace"];
            readonly meta: {
                readonly engine: string;
                readonly requestHash: string;
            };
        };
        readonly SettlementAnswer: {
            readonly result: {
                readonly single: {
                    /** @description V over the number of piles */
                    readonly load: number;
                    /** @description of the pile head */
                    readonly settlement: number;
                    /** @description of the pile head */
                    readonly stiffness: number;
                    /** @description I of s = P I / (E_s d) */
                    readonly influenceFactor: number;
                    /** @description share of the load at the base */
                    readonly baseLoadShare: number;
                    /** @description along the pile from the head down (elastic-continuum) */
                    readonly axial?: readonly {
                        /** @description bottom of an element */
                        readonly depth: number;
                        /** @description in the pile at this depth */
                        readonly axialLoad: number;
                        /** @description mean on the element above this depth */
                        readonly shaftStress: number;
                    }[];
                    /** @description load-settlement curve, with nonlinearity hyperbolic */
                    readonly curve?: readonly {
                        /** @description load */
                        readonly load: number;
                        /** @description settlement */
                        readonly settlement: number;
                    }[];
                };
                readonly group?: {
                    /** @description at the centroid of the piles */
                    readonly settlement: number;
                    /** @description over the single pile */
                    readonly settlementRatio?: number;
                    readonly tilt: {
                        /** @description slope of settlement along x */
                        readonly alongX: number;
                        /** @description slope of settlement along y */
                        readonly alongY: number;
                    };
                    /** @description flexible cap */
                    readonly largest?: number;
                    /** @description flexible cap */
                    readonly differential?: number;
                    /** @description load-settlement curve, with nonlinearity hyperbolic */
                    readonly curve?: readonly {
                        /** @description load */
                        readonly load: number;
                        /** @description settlement */
                        readonly settlement: number;
                    }[];
                    readonly piles: readonly {
                        /** @description position */
                        readonly x: number;
                        /** @description position */
                        readonly y: number;
                        /** @description of the pile */
                        readonly load: number;
                        /** @description of the pile */
                        readonly settlement: number;
                    }[];
                    readonly stiffness: {
                        /** @description vertical */
                        readonly vertical: number;
                        /** @description rocking along x; 0 where the piles cannot take it */
                        readonly rockingAlongX: number;
                        /** @description rocking along y; 0 where the piles cannot take it */
                        readonly rockingAlongY: number;
                        /** @description rigid cap at the cap's origin, pressing signs: ready for a structural model */
                        readonly atOrigin: {
                            /** @description rows: settlement (m), slope along x, slope along y (rad); columns: V (kN), My, Mx (kN.m). Units m/kN, 1/kN, rad/(kN.m). Symmetric */
                            readonly flexibility: readonly (readonly number[])[];
                            /** @description its inverse: rows V, My, Mx; columns settlement, slope along x, slope along y. Units kN/m, kN/rad, kN.m/rad. Symmetric; 0 where the piles cannot take it */
                            readonly stiffness: readonly (readonly number[])[];
                        };
                    };
                };
            };
            readonly notices: readonly components["schemas"]["Notice"][];
            readonly trace?: components["schemas"]["Trace"];
            readonly meta: {
                readonly engine: string;
                readonly requestHash: string;
            };
        };
        readonly AssessmentAnswer: {
            readonly result: {
                readonly summary: {
                    readonly caps: number;
                    /** @description caps with every check satisfied */
                    readonly satisfied: number;
                    /** @description caps with a check exceeded; neighbours are counted in `checks` alone */
                    readonly exceeded: number;
                    /** @description of all caps and neighbours */
                    readonly worst?: {
                        readonly cap: string;
                        /** @description the other cap of an angular distortion */
                        readonly neighbour?: string;
                        /** @enum {string} */
                        readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                        readonly combination: string;
                        /** @description largest */
                        readonly utilisation: number;
                    };
                    /** @description the worst of each kind of check, how many were made and how many exceed */
                    readonly checks: readonly {
                        readonly cap: string;
                        /** @description the other cap of an angular distortion */
                        readonly neighbour?: string;
                        /** @enum {string} */
                        readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                        readonly combination: string;
                        /** @description largest */
                        readonly utilisation: number;
                        readonly count: number;
                        readonly exceeded: number;
                    }[];
                };
                readonly caps: readonly {
                    readonly mark: string;
                    readonly pileCount: number;
                    readonly single: components["schemas"]["SinglePileResult"];
                    readonly block: components["schemas"]["BlockResult"];
                    readonly checks: readonly components["schemas"]["Check"][];
                    readonly settlement: readonly {
                        readonly combination: string;
                        /** @description at the centroid of the piles */
                        readonly settlement: number;
                        /** @description slope of the cap */
                        readonly tilt: number;
                    }[];
                    readonly stiffness: {
                        /** @description vertical */
                        readonly vertical: number;
                        /** @description rocking along x; 0 where the piles cannot take it */
                        readonly rockingAlongX: number;
                        /** @description rocking along y; 0 where the piles cannot take it */
                        readonly rockingAlongY: number;
                        /** @description rigid cap at the cap's origin, pressing signs: ready for a structural model */
                        readonly atOrigin: {
                            /** @description rows: settlement (m), slope along x, slope along y (rad); columns: V (kN), My, Mx (kN.m). Units m/kN, 1/kN, rad/(kN.m). Symmetric */
                            readonly flexibility: readonly (readonly number[])[];
                            /** @description its inverse: rows V, My, Mx; columns settlement, slope along x, slope along y. Units kN/m, kN/rad, kN.m/rad. Symmetric; 0 where the piles cannot take it */
                            readonly stiffness: readonly (readonly number[])[];
                        };
                    };
                    readonly notices: readonly components["schemas"]["Notice"][];
                }[];
                readonly neighbours: readonly {
                    readonly a: string;
                    readonly b: string;
                    /** @description in plan */
                    readonly distance: number;
                    readonly combination: string;
                    /** @description between the two */
                    readonly differentialSettlement: number;
                    /** @description differential settlement over distance */
                    readonly angularDistortion: number;
                    /** @description of the limit */
                    readonly utilisation?: number;
                    readonly satisfied?: boolean;
                }[];
            };
            readonly notices: readonly components["schemas"]["Notice"][];
            readonly trace?: components["schemas"]["Trace"];
            readonly meta: {
                readonly engine: string;
                readonly requestHash: string;
            };
        };
        readonly ReplayAnswer: {
            readonly result: {
                readonly holds: boolean;
                readonly count: number;
                readonly steps: readonly {
                    readonly id: string;
                    readonly holds: boolean;
                    readonly why?: string;
                    readonly printed?: number;
                    readonly found?: number;
                }[];
            };
            readonly notices: readonly components["schemas"]["Notice"][];
            readonly meta: {
                readonly engine: string;
                readonly requestHash: string;
            };
        };
        readonly Problem: {
            readonly type: string;
            readonly title: string;
            readonly status: number;
            readonly detail: string;
            readonly traceId?: string;
            readonly errors?: readonly ({
                readonly pointer: string;
                readonly code: string;
                readonly detail: string;
            } & {
                readonly [key: string]: unknown;
            })[];
        };
        readonly MethodList: {
            readonly methods: readonly ({
                readonly id: string;
                readonly kind: string;
                readonly title: string;
                readonly validity: string;
                readonly theory?: string;
                readonly errorBounds?: string;
                readonly needs: readonly string[];
                readonly source: {
                    readonly key: string;
                    readonly title: string;
                    readonly author: string;
                    readonly year: number | null;
                    /** @enum {string} */
                    readonly basis: "published" | "common practice" | "memory";
                };
            } & {
                readonly [key: string]: unknown;
            })[];
        };
        readonly MethodReply: {
            readonly id: string;
            readonly methods: readonly ({
                readonly id: string;
                readonly kind: string;
                readonly title: string;
                readonly validity: string;
                readonly theory?: string;
                readonly errorBounds?: string;
                readonly needs: readonly string[];
                readonly source: {
                    readonly key: string;
                    readonly title: string;
                    readonly author: string;
                    readonly year: number | null;
                    /** @enum {string} */
                    readonly basis: "published" | "common practice" | "memory";
                };
            } & {
                readonly [key: string]: unknown;
            })[];
        };
        readonly SourceList: {
            readonly sources: readonly {
                readonly key: string;
                readonly title: string;
                readonly author: string;
                readonly year: number | null;
                /** @enum {string} */
                readonly basis: "published" | "common practice" | "memory";
            }[];
        };
        readonly LimitList: {
            /** @description layers of a ground profile */
            readonly layers: number;
            /** @description piles under one cap */
            readonly pilesPerCap: number;
            /** @description caps of a schedule */
            readonly caps: number;
            /** @description rows of loads in a schedule */
            readonly rows: number;
            /** @description bytes of a request; a larger one is a 413 */
            readonly bodyBytes: number;
            /** @description bytes of all header fields; more are a 431 */
            readonly headerBytes: number;
            /** @description seconds until a request must have arrived whole; then 408 */
            readonly requestSeconds: number;
            /** @description seconds of an assessment, waiting included; then 504 */
            readonly assessmentSeconds: number;
            /** @description assessments that wait for a thread; beyond that 503 with Retry-After */
            readonly assessmentsWaiting: number;
            /** @description assessments by `Prefer: respond-async` that wait or run; beyond that 503 with Retry-After */
            readonly jobs: number;
            /** @description seconds that `Prefer: wait` is heeded */
            readonly waitSeconds: number;
            readonly graphql: {
                /** @description fields above one another in a document */
                readonly depth: number;
                /** @description aliases in a document */
                readonly aliases: number;
                /** @description tokens of a document */
                readonly tokens: number;
                /** @description objects of an answer, as many as its lists may hold; hundreds for a calculator, a trace and a comparison of revisions */
                readonly cost: number;
                /** @description characters of a document */
                readonly characters: number;
                /** @description subscriptions that are open in one socket */
                readonly subscriptions: number;
            };
        };
        readonly Project: {
            readonly slug: string;
            readonly title: string;
            /** @description ISO 8601, UTC */
            readonly createdAt: string;
            /** @description ISO 8601, UTC */
            readonly updatedAt: string;
            /** @description number of its newest assessment, 0 before the first */
            readonly revision: number;
        };
        readonly ProjectList: {
            readonly items: readonly components["schemas"]["Project"][];
            /** @description cursor of the next page */
            readonly next?: string;
        };
        readonly Assessment: {
            readonly id: string;
            readonly project: string;
            readonly revision: number;
            readonly title: string;
            /** @enum {string} */
            readonly state: "completed";
            /** @description ISO 8601, UTC */
            readonly createdAt: string;
            /** @description the person or pipeline that the key belongs to */
            readonly actor: string;
            /** @description id of the key; null where the service runs without keys */
            readonly actorKey: string | null;
            readonly engine: string;
            /** @description SHA-256 of the canonical request */
            readonly requestHash: string;
            /** @description SHA-256 of the content, as /content gives it */
            readonly contentHash: string;
            /** @description SHA-256 of the traces */
            readonly traceHash: string;
            /** @description SHA-256 of the record before it in its project; zeros for the first */
            readonly previousHash: string;
            /** @description SHA-256 of the canonical JSON of this object without recordHash, state and summary */
            readonly recordHash: string;
            readonly summary: {
                readonly caps: number;
                /** @description caps with every check satisfied */
                readonly satisfied: number;
                /** @description caps with a check exceeded; neighbours are counted in `checks` alone */
                readonly exceeded: number;
                /** @description of all caps and neighbours */
                readonly worst?: {
                    readonly cap: string;
                    /** @description the other cap of an angular distortion */
                    readonly neighbour?: string;
                    /** @enum {string} */
                    readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                    readonly combination: string;
                    /** @description largest */
                    readonly utilisation: number;
                };
                /** @description the worst of each kind of check, how many were made and how many exceed */
                readonly checks: readonly {
                    readonly cap: string;
                    /** @description the other cap of an angular distortion */
                    readonly neighbour?: string;
                    /** @enum {string} */
                    readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                    readonly combination: string;
                    /** @description largest */
                    readonly utilisation: number;
                    readonly count: number;
                    readonly exceeded: number;
                }[];
            };
        };
        /** @description An assessment that is no record yet, or never will be; this is kept for 30 days */
        readonly Job: {
            /** @description of the record to come */
            readonly id: string;
            readonly project: string;
            /** @enum {string} */
            readonly state: "queued" | "running" | "failed" | "cancelled";
            /** @description ISO 8601, UTC */
            readonly createdAt: string;
            /** @description when it was begun last */
            readonly startedAt: string | null;
            readonly finishedAt: string | null;
            readonly actor: string;
            readonly actorKey: string | null;
            /** @description how often it was begun */
            readonly attempts: number;
            readonly progress: {
                /** @description caps whose piles are computed */
                readonly done: number;
                /** @description of so many; null until the schedule has been read */
                readonly caps: number | null;
            };
            /** @description why there is no record: of failed and cancelled ones */
            readonly problem?: components["schemas"]["Problem"];
        };
        readonly AssessmentOrJob: components["schemas"]["Assessment"] | components["schemas"]["Job"];
        /** @description The data of an event */
        readonly JobProgress: {
            readonly id: string;
            /** @enum {string} */
            readonly state: "queued" | "running" | "failed" | "cancelled" | "completed";
            /** @description caps whose piles are computed */
            readonly done: number;
            /** @description of so many; null until the schedule has been read */
            readonly caps: number | null;
        };
        readonly AssessmentList: {
            readonly items: readonly components["schemas"]["Assessment"][];
            /** @description cursor of the next page */
            readonly next?: string;
        };
        readonly Content: {
            readonly notices: readonly components["schemas"]["Notice"][];
            /** @description the schedule, every quantity in its unit */
            readonly request: {
                readonly [key: string]: unknown;
            };
            readonly result: {
                readonly summary: {
                    readonly caps: number;
                    /** @description caps with every check satisfied */
                    readonly satisfied: number;
                    /** @description caps with a check exceeded; neighbours are counted in `checks` alone */
                    readonly exceeded: number;
                    /** @description of all caps and neighbours */
                    readonly worst?: {
                        readonly cap: string;
                        /** @description the other cap of an angular distortion */
                        readonly neighbour?: string;
                        /** @enum {string} */
                        readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                        readonly combination: string;
                        /** @description largest */
                        readonly utilisation: number;
                    };
                    /** @description the worst of each kind of check, how many were made and how many exceed */
                    readonly checks: readonly {
                        readonly cap: string;
                        /** @description the other cap of an angular distortion */
                        readonly neighbour?: string;
                        /** @enum {string} */
                        readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                        readonly combination: string;
                        /** @description largest */
                        readonly utilisation: number;
                        readonly count: number;
                        readonly exceeded: number;
                    }[];
                };
                readonly caps: readonly {
                    readonly mark: string;
                    readonly pileCount: number;
                    readonly single: components["schemas"]["SinglePileResult"];
                    readonly block: components["schemas"]["BlockResult"];
                    readonly checks: readonly components["schemas"]["Check"][];
                    readonly settlement: readonly {
                        readonly combination: string;
                        /** @description at the centroid of the piles */
                        readonly settlement: number;
                        /** @description slope of the cap */
                        readonly tilt: number;
                    }[];
                    readonly stiffness: {
                        /** @description vertical */
                        readonly vertical: number;
                        /** @description rocking along x; 0 where the piles cannot take it */
                        readonly rockingAlongX: number;
                        /** @description rocking along y; 0 where the piles cannot take it */
                        readonly rockingAlongY: number;
                        /** @description rigid cap at the cap's origin, pressing signs: ready for a structural model */
                        readonly atOrigin: {
                            /** @description rows: settlement (m), slope along x, slope along y (rad); columns: V (kN), My, Mx (kN.m). Units m/kN, 1/kN, rad/(kN.m). Symmetric */
                            readonly flexibility: readonly (readonly number[])[];
                            /** @description its inverse: rows V, My, Mx; columns settlement, slope along x, slope along y. Units kN/m, kN/rad, kN.m/rad. Symmetric; 0 where the piles cannot take it */
                            readonly stiffness: readonly (readonly number[])[];
                        };
                    };
                    readonly notices: readonly components["schemas"]["Notice"][];
                }[];
                readonly neighbours: readonly {
                    readonly a: string;
                    readonly b: string;
                    /** @description in plan */
                    readonly distance: number;
                    readonly combination: string;
                    /** @description between the two */
                    readonly differentialSettlement: number;
                    /** @description differential settlement over distance */
                    readonly angularDistortion: number;
                    /** @description of the limit */
                    readonly utilisation?: number;
                    readonly satisfied?: boolean;
                }[];
            };
        };
        readonly CapRow: {
            readonly mark: string;
            readonly ground: string;
            readonly pileType: string;
            readonly pileCount: number;
            /** @description position in plan */
            readonly x: number;
            /** @description position in plan */
            readonly y: number;
            readonly governingCheck: ("pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt") | null;
            readonly governingCombination: string | null;
            /** @description largest of its checks */
            readonly utilisation: number | null;
            readonly exceeded: boolean;
            /** @description largest over the combinations */
            readonly settlement: number | null;
            /** @description largest over the combinations */
            readonly tilt: number | null;
            /** @description of the cap */
            readonly verticalStiffness: number;
            /** @description of the cap */
            readonly rockingStiffnessAlongX: number;
            /** @description of the cap */
            readonly rockingStiffnessAlongY: number;
        };
        readonly CapList: {
            readonly items: readonly components["schemas"]["CapRow"][];
            /** @description cursor of the next page */
            readonly next?: string;
        };
        readonly CapReply: {
            readonly result: {
                readonly mark: string;
                readonly pileCount: number;
                readonly single: components["schemas"]["SinglePileResult"];
                readonly block: components["schemas"]["BlockResult"];
                readonly checks: readonly components["schemas"]["Check"][];
                readonly settlement: readonly {
                    readonly combination: string;
                    /** @description at the centroid of the piles */
                    readonly settlement: number;
                    /** @description slope of the cap */
                    readonly tilt: number;
                }[];
                readonly stiffness: {
                    /** @description vertical */
                    readonly vertical: number;
                    /** @description rocking along x; 0 where the piles cannot take it */
                    readonly rockingAlongX: number;
                    /** @description rocking along y; 0 where the piles cannot take it */
                    readonly rockingAlongY: number;
                    /** @description rigid cap at the cap's origin, pressing signs: ready for a structural model */
                    readonly atOrigin: {
                        /** @description rows: settlement (m), slope along x, slope along y (rad); columns: V (kN), My, Mx (kN.m). Units m/kN, 1/kN, rad/(kN.m). Symmetric */
                        readonly flexibility: readonly (readonly number[])[];
                        /** @description its inverse: rows V, My, Mx; columns settlement, slope along x, slope along y. Units kN/m, kN/rad, kN.m/rad. Symmetric; 0 where the piles cannot take it */
                        readonly stiffness: readonly (readonly number[])[];
                    };
                };
                readonly notices: readonly components["schemas"]["Notice"][];
            };
            /** @description pointers lead into `result` of the content */
            readonly trace?: components["schemas"]["Trace"];
        };
        readonly ChangesReply: {
            readonly before: components["schemas"]["Assessment"];
            readonly after: components["schemas"]["Assessment"];
            /** @description of all changes, also where a list is cut */
            readonly counts: {
                readonly turnedExceeded: number;
                readonly turnedSatisfied: number;
                readonly caps: number;
                readonly added: number;
                readonly gone: number;
                readonly neighbours: number;
                readonly inputs: {
                    readonly [key: string]: number;
                };
            };
            /** @description checks whose verdict turned, of a cap or of a pair of neighbours; those now exceeded first */
            readonly verdicts: readonly {
                readonly cap?: string;
                readonly a?: string;
                readonly b?: string;
                /** @enum {string} */
                readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                readonly before?: {
                    readonly combination: string;
                    /** @description demand over resistance */
                    readonly utilisation: number;
                    readonly satisfied: boolean;
                };
                readonly after?: {
                    readonly combination: string;
                    /** @description demand over resistance */
                    readonly utilisation: number;
                    readonly satisfied: boolean;
                };
                /** @description utilisation after less before */
                readonly by?: number;
                /** @enum {string} */
                readonly turned: "exceeded" | "satisfied";
            }[];
            readonly caps: readonly {
                readonly mark: string;
                /** @description into schedule and result */
                readonly pointer: {
                    readonly before: string;
                    readonly after: string;
                };
                /**
                 * @description where the verdict of the whole cap turned
                 * @enum {string}
                 */
                readonly turned?: "exceeded" | "satisfied";
                readonly governing: {
                    readonly before?: {
                        /** @enum {string} */
                        readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                        readonly combination: string;
                        /** @description demand over resistance */
                        readonly utilisation: number;
                        readonly satisfied: boolean;
                    };
                    readonly after?: {
                        /** @enum {string} */
                        readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                        readonly combination: string;
                        /** @description demand over resistance */
                        readonly utilisation: number;
                        readonly satisfied: boolean;
                    };
                };
                readonly governingChanged: boolean;
                /** @description utilisation after less before */
                readonly by?: number;
                /** @description those that changed */
                readonly checks: readonly {
                    /** @enum {string} */
                    readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                    readonly before?: {
                        readonly combination: string;
                        /** @description demand over resistance */
                        readonly utilisation: number;
                        readonly satisfied: boolean;
                    };
                    readonly after?: {
                        readonly combination: string;
                        /** @description demand over resistance */
                        readonly utilisation: number;
                        readonly satisfied: boolean;
                    };
                    /** @description utilisation after less before */
                    readonly by?: number;
                }[];
                readonly settlement?: {
                    /** @description largest over the combinations */
                    readonly before?: number;
                    /** @description largest over the combinations */
                    readonly after?: number;
                    /** @description after less before */
                    readonly by?: number;
                };
                readonly verticalStiffness?: {
                    /** @description of the cap */
                    readonly before?: number;
                    /** @description of the cap */
                    readonly after?: number;
                    /** @description after less before */
                    readonly by?: number;
                };
            }[];
            readonly added: readonly {
                readonly mark: string;
                /** @description into the schedule that has it */
                readonly pointer: string;
                readonly exceeded: boolean;
                readonly governing?: {
                    /** @enum {string} */
                    readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                    readonly combination: string;
                    /** @description demand over resistance */
                    readonly utilisation: number;
                    readonly satisfied: boolean;
                };
            }[];
            readonly gone: readonly {
                readonly mark: string;
                /** @description into the schedule that has it */
                readonly pointer: string;
                readonly exceeded: boolean;
                readonly governing?: {
                    /** @enum {string} */
                    readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                    readonly combination: string;
                    /** @description demand over resistance */
                    readonly utilisation: number;
                    readonly satisfied: boolean;
                };
            }[];
            readonly neighbours: readonly {
                readonly a: string;
                readonly b: string;
                /** @enum {string} */
                readonly check: "pile-compression" | "pile-uplift" | "group-compression" | "block-compression" | "group-uplift" | "block-uplift" | "pile-section" | "settlement" | "tilt" | "angular-distortion";
                readonly before?: {
                    readonly combination: string;
                    /** @description demand over resistance */
                    readonly utilisation: number;
                    readonly satisfied: boolean;
                };
                readonly after?: {
                    readonly combination: string;
                    /** @description demand over resistance */
                    readonly utilisation: number;
                    readonly satisfied: boolean;
                };
                /** @description utilisation after less before */
                readonly by?: number;
                readonly angularDistortion: {
                    /** @description of the pair */
                    readonly before?: number;
                    /** @description of the pair */
                    readonly after?: number;
                    /** @description after less before */
                    readonly by?: number;
                };
            }[];
            readonly inputs: readonly {
                /** @enum {string} */
                readonly part: "reaction" | "combination" | "signs" | "ground" | "pile-type" | "cap" | "layout" | "limit" | "method" | "design-basis" | "title";
                /** @description mark, ground profile, pile type or combination; empty: of the whole schedule */
                readonly name: string;
                readonly combination?: string;
                readonly layer?: string;
                /** @description into the schedule of each side */
                readonly pointer: {
                    readonly before?: string;
                    readonly after?: string;
                };
                readonly field: string;
                readonly before?: unknown;
                readonly after?: unknown;
                /** @description after less before */
                readonly by?: number;
                readonly unit?: string;
            }[];
        };
        readonly Signature: {
            readonly id: string;
            readonly assessment: string;
            readonly ordinal: number;
            /** @enum {string} */
            readonly role: "originator" | "checker" | "approver";
            readonly meaning: string;
            readonly actor: string;
            readonly actorKey: string | null;
            /** @description ISO 8601, UTC */
            readonly signedAt: string;
            /** @description SHA-256 of the record that is signed */
            readonly signedHash: string;
            /** @description SHA-256 of the signature before it; zeros for the first */
            readonly previousHash: string;
            /** @description SHA-256 of the canonical JSON of this signature, `assessment` named `record`, without signatureHash */
            readonly signatureHash: string;
        };
        readonly SignatureList: {
            readonly items: readonly components["schemas"]["Signature"][];
        };
        readonly IntegrityReply: {
            readonly project: string;
            readonly holds: boolean;
            readonly records: number;
            /** @description to be kept elsewhere: given back later, it shows rows that were cut off */
            readonly checkpoint: {
                readonly revision: number;
                /** @description SHA-256 of the newest record */
                readonly hash: string;
            };
            readonly flaws: readonly {
                readonly revision: number;
                readonly id?: string;
                /** @enum {string} */
                readonly table: "records" | "caps" | "checks" | "neighbours" | "traces" | "signatures" | "projects";
                readonly at?: string;
                readonly what: string;
            }[];
        };
        readonly ReverifyReply: {
            readonly id: string;
            readonly identical: boolean;
            readonly stored: {
                readonly engine: string;
                /** @description SHA-256 of the content */
                readonly contentHash: string;
            };
            readonly computed: {
                readonly engine: string;
                /** @description SHA-256 of the content */
                readonly contentHash: string;
            };
            /** @description of all changes */
            readonly count: number;
            /** @description at most 1000; pointers lead into the content */
            readonly changes: readonly {
                readonly pointer: string;
                readonly before?: unknown;
                readonly after?: unknown;
            }[];
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
    readonly calculateSinglePile: {
        readonly parameters: {
            readonly query?: {
                /** @description `none` leaves the trace out */
                readonly trace?: string;
                /** @description JSON Pointer into the result: only the steps behind it */
                readonly of?: string;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "pile": {
                 *         "section": {
                 *           "shape": "circular",
                 *           "diameter": "600 mm"
                 *         },
                 *         "length": 16,
                 *         "headDepth": 1,
                 *         "installation": "bored",
                 *         "youngsModulus": "30 GPa",
                 *         "unitWeight": 24,
                 *         "sectionResistance": {
                 *           "compression": 2600,
                 *           "tension": 450
                 *         }
                 *       },
                 *       "ground": {
                 *         "name": "BH1",
                 *         "waterTableDepth": 1.5,
                 *         "layers": [
                 *           {
                 *             "name": "soft clay",
                 *             "thickness": 4,
                 *             "unitWeight": 16.5,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": {
                 *               "top": 18,
                 *               "bottom": 30
                 *             },
                 *             "youngsModulus": 6000,
                 *             "poissonsRatio": 0.5
                 *           },
                 *           {
                 *             "name": "medium dense sand",
                 *             "thickness": 5,
                 *             "unitWeight": 19.5,
                 *             "soil": "granular",
                 *             "frictionAngle": 33,
                 *             "youngsModulus": 40000
                 *           },
                 *           {
                 *             "name": "stiff clay",
                 *             "unitWeight": 20,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": 130,
                 *             "youngsModulus": 60000
                 *           }
                 *         ]
                 *       },
                 *       "direction": "compression",
                 *       "methods": {
                 *         "cohesiveShaft": "gec10-2018",
                 *         "granularShaft": {
                 *           "method": "beta-effective-stress",
                 *           "earthPressure": 0.7
                 *         }
                 *       },
                 *       "designBasis": {
                 *         "format": "overall-factor",
                 *         "factor": 2.5,
                 *         "blockFactor": 3,
                 *         "upliftFactor": 3,
                 *         "split": {
                 *           "shaft": 1.5,
                 *           "base": 3
                 *         }
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["SinglePileRequest"];
            };
        };
        readonly responses: {
            /** @description The answer; with `Accept: text/html` as a page */
            readonly 200: {
                headers: {
                    /** @description Accept */
                    readonly Vary?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SinglePileAnswer"];
                    readonly "text/html": string;
                };
            };
            /** @description The body or URL cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key, where the service asks for one */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The body is larger than the limit (`bodyBytes` of GET /v1/limits) */
            readonly 413: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The request is invalid or physically impossible; `errors` lists every fault */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service is busy or stopping */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly calculateBlock: {
        readonly parameters: {
            readonly query?: {
                /** @description `none` leaves the trace out */
                readonly trace?: string;
                /** @description JSON Pointer into the result: only the steps behind it */
                readonly of?: string;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "pile": {
                 *         "section": {
                 *           "shape": "square",
                 *           "width": "350 mm"
                 *         },
                 *         "length": 15,
                 *         "headDepth": 1,
                 *         "installation": "driven",
                 *         "youngsModulus": "34 GPa",
                 *         "unitWeight": 24.5,
                 *         "sectionResistance": {
                 *           "compression": 1500,
                 *           "tension": 300
                 *         }
                 *       },
                 *       "ground": {
                 *         "name": "BH2",
                 *         "waterTableDepth": 1.2,
                 *         "layers": [
                 *           {
                 *             "name": "soft clay",
                 *             "thickness": 6,
                 *             "unitWeight": 16.5,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": {
                 *               "top": 16,
                 *               "bottom": 30
                 *             },
                 *             "youngsModulus": 5500
                 *           },
                 *           {
                 *             "name": "firm clay",
                 *             "thickness": 14,
                 *             "unitWeight": 18,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": {
                 *               "top": 32,
                 *               "bottom": 50
                 *             },
                 *             "youngsModulus": {
                 *               "top": 14000,
                 *               "bottom": 22000
                 *             }
                 *           },
                 *           {
                 *             "name": "stiff clay",
                 *             "unitWeight": 20,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": 110,
                 *             "youngsModulus": 50000
                 *           }
                 *         ]
                 *       },
                 *       "layout": {
                 *         "kind": "grid",
                 *         "columns": 7,
                 *         "rows": 7,
                 *         "spacing": 0.8
                 *       },
                 *       "designBasis": {
                 *         "format": "overall-factor",
                 *         "factor": 2.5,
                 *         "blockFactor": 3,
                 *         "upliftFactor": 3
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["GroupRequest"];
            };
        };
        readonly responses: {
            /** @description The answer; with `Accept: text/html` as a page */
            readonly 200: {
                headers: {
                    /** @description Accept */
                    readonly Vary?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["BlockAnswer"];
                    readonly "text/html": string;
                };
            };
            /** @description The body or URL cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key, where the service asks for one */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The body is larger than the limit (`bodyBytes` of GET /v1/limits) */
            readonly 413: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The request is invalid or physically impossible; `errors` lists every fault */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service is busy or stopping */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly calculateGroup: {
        readonly parameters: {
            readonly query?: {
                /** @description `none` leaves the trace out */
                readonly trace?: string;
                /** @description JSON Pointer into the result: only the steps behind it */
                readonly of?: string;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "pile": {
                 *         "section": {
                 *           "shape": "square",
                 *           "width": "350 mm"
                 *         },
                 *         "length": 15,
                 *         "headDepth": 1,
                 *         "installation": "driven",
                 *         "youngsModulus": "34 GPa",
                 *         "unitWeight": 24.5,
                 *         "sectionResistance": {
                 *           "compression": 1500,
                 *           "tension": 300
                 *         }
                 *       },
                 *       "ground": {
                 *         "name": "BH2",
                 *         "waterTableDepth": 1.2,
                 *         "layers": [
                 *           {
                 *             "name": "soft clay",
                 *             "thickness": 6,
                 *             "unitWeight": 16.5,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": {
                 *               "top": 16,
                 *               "bottom": 30
                 *             },
                 *             "youngsModulus": 5500
                 *           },
                 *           {
                 *             "name": "firm clay",
                 *             "thickness": 14,
                 *             "unitWeight": 18,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": {
                 *               "top": 32,
                 *               "bottom": 50
                 *             },
                 *             "youngsModulus": {
                 *               "top": 14000,
                 *               "bottom": 22000
                 *             }
                 *           },
                 *           {
                 *             "name": "stiff clay",
                 *             "unitWeight": 20,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": 110,
                 *             "youngsModulus": 50000
                 *           }
                 *         ]
                 *       },
                 *       "layout": {
                 *         "kind": "grid",
                 *         "columns": 7,
                 *         "rows": 7,
                 *         "spacing": "800 mm"
                 *       },
                 *       "methods": {
                 *         "cohesiveShaft": "rp2geo-2011"
                 *       },
                 *       "designBasis": {
                 *         "format": "overall-factor",
                 *         "factor": 2.5,
                 *         "blockFactor": 3,
                 *         "upliftFactor": 3
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["GroupRequest"];
            };
        };
        readonly responses: {
            /** @description The answer; with `Accept: text/html` as a page */
            readonly 200: {
                headers: {
                    /** @description Accept */
                    readonly Vary?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["GroupAnswer"];
                    readonly "text/html": string;
                };
            };
            /** @description The body or URL cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key, where the service asks for one */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The body is larger than the limit (`bodyBytes` of GET /v1/limits) */
            readonly 413: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The request is invalid or physically impossible; `errors` lists every fault */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service is busy or stopping */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly calculateSettlement: {
        readonly parameters: {
            readonly query?: {
                /** @description `none` leaves the trace out */
                readonly trace?: string;
                /** @description JSON Pointer into the result: only the steps behind it */
                readonly of?: string;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "pile": {
                 *         "section": {
                 *           "shape": "circular",
                 *           "diameter": "900 mm"
                 *         },
                 *         "length": 19,
                 *         "headDepth": 1.2,
                 *         "installation": "bored",
                 *         "youngsModulus": "30 GPa",
                 *         "unitWeight": 24,
                 *         "sectionResistance": {
                 *           "compression": 5900,
                 *           "tension": 900
                 *         }
                 *       },
                 *       "ground": {
                 *         "name": "BH3",
                 *         "waterTableDepth": 1.8,
                 *         "layers": [
                 *           {
                 *             "name": "soft clay",
                 *             "thickness": 3,
                 *             "unitWeight": 16.5,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": {
                 *               "top": 20,
                 *               "bottom": 28
                 *             },
                 *             "youngsModulus": 6500
                 *           },
                 *           {
                 *             "name": "dense sand",
                 *             "thickness": 6,
                 *             "unitWeight": 20,
                 *             "soil": "granular",
                 *             "frictionAngle": 36,
                 *             "youngsModulus": 55000
                 *           },
                 *           {
                 *             "name": "stiff clay",
                 *             "unitWeight": 20.5,
                 *             "soil": "cohesive",
                 *             "undrainedShearStrength": 150,
                 *             "youngsModulus": 70000
                 *           }
                 *         ]
                 *       },
                 *       "layout": {
                 *         "kind": "grid",
                 *         "columns": 3,
                 *         "rows": 2,
                 *         "spacing": 2.7
                 *       },
                 *       "load": {
                 *         "V": "7200 kN",
                 *         "Mx": 250,
                 *         "My": 400
                 *       },
                 *       "cap": "rigid",
                 *       "method": "elastic-continuum"
                 *     }
                 */
                readonly "application/json": components["schemas"]["SettlementRequest"];
            };
        };
        readonly responses: {
            /** @description The answer; with `Accept: text/html` as a page */
            readonly 200: {
                headers: {
                    /** @description Accept */
                    readonly Vary?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SettlementAnswer"];
                    readonly "text/html": string;
                };
            };
            /** @description The body or URL cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key, where the service asks for one */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The body is larger than the limit (`bodyBytes` of GET /v1/limits) */
            readonly 413: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The request is invalid or physically impossible; `errors` lists every fault */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service is busy or stopping */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly assessSchedule: {
        readonly parameters: {
            readonly query?: {
                /** @description `none` leaves the trace out */
                readonly trace?: string;
                /** @description JSON Pointer into the result: only the steps behind it */
                readonly of?: string;
                /** @description Mark of a cap: the trace holds every combination of this cap, and nothing of the others */
                readonly cap?: string;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "title": "River quay warehouse, lines A to C (invented)",
                 *       "designBasis": {
                 *         "format": "overall-factor",
                 *         "factor": 2.5,
                 *         "blockFactor": 3,
                 *         "upliftFactor": 3
                 *       },
                 *       "ground": {
                 *         "BH1": {
                 *           "name": "BH1",
                 *           "waterTableDepth": 1.5,
                 *           "layers": [
                 *             {
                 *               "name": "soft clay",
                 *               "thickness": 4,
                 *               "unitWeight": 16.5,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": {
                 *                 "top": 18,
                 *                 "bottom": 30
                 *               },
                 *               "youngsModulus": 6000,
                 *               "poissonsRatio": 0.5
                 *             },
                 *             {
                 *               "name": "medium dense sand",
                 *               "thickness": 5,
                 *               "unitWeight": 19,
                 *               "soil": "granular",
                 *               "frictionAngle": 33,
                 *               "youngsModulus": 35000
                 *             },
                 *             {
                 *               "name": "stiff clay",
                 *               "unitWeight": 20,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": 130,
                 *               "youngsModulus": 55000
                 *             }
                 *           ]
                 *         },
                 *         "BH2": {
                 *           "name": "BH2",
                 *           "waterTableDepth": 1.8,
                 *           "layers": [
                 *             {
                 *               "name": "soft clay",
                 *               "thickness": 4,
                 *               "unitWeight": 16.5,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": {
                 *                 "top": 18,
                 *                 "bottom": 30
                 *               },
                 *               "youngsModulus": 6000,
                 *               "poissonsRatio": 0.5
                 *             },
                 *             {
                 *               "name": "firm clay",
                 *               "thickness": 10,
                 *               "unitWeight": 18,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": {
                 *                 "top": 35,
                 *                 "bottom": 60
                 *               },
                 *               "youngsModulus": 15000
                 *             },
                 *             {
                 *               "name": "stiff clay",
                 *               "unitWeight": 20,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": 110,
                 *               "youngsModulus": 45000
                 *             }
                 *           ]
                 *         }
                 *       },
                 *       "pileTypes": {
                 *         "B600": {
                 *           "section": {
                 *             "shape": "circular",
                 *             "diameter": 0.6
                 *           },
                 *           "length": 16,
                 *           "headDepth": 1,
                 *           "installation": "bored",
                 *           "youngsModulus": "30 GPa",
                 *           "sectionResistance": {
                 *             "compression": 3200,
                 *             "tension": 400
                 *           }
                 *         },
                 *         "P350": {
                 *           "section": {
                 *             "shape": "square",
                 *             "width": "350 mm"
                 *           },
                 *           "length": 11,
                 *           "headDepth": 1,
                 *           "installation": "driven"
                 *         }
                 *       },
                 *       "caps": [
                 *         {
                 *           "mark": "A1",
                 *           "x": 0,
                 *           "y": 0,
                 *           "ground": "BH1",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 2,
                 *             "rows": 2,
                 *             "spacing": 1.8
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "A2",
                 *           "x": 8,
                 *           "y": 0,
                 *           "ground": "BH1",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 3,
                 *             "rows": 2,
                 *             "spacing": 1.8
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "B1",
                 *           "x": 0,
                 *           "y": 9,
                 *           "ground": "BH2",
                 *           "pileType": "P350",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 6,
                 *             "rows": 6,
                 *             "spacing": 0.8
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "B2",
                 *           "x": 8,
                 *           "y": 9,
                 *           "ground": "BH2",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "ring",
                 *             "count": 5,
                 *             "radius": 2
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "C1",
                 *           "x": 0,
                 *           "y": 18,
                 *           "ground": "BH2",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 2,
                 *             "rows": 1,
                 *             "spacing": 2
                 *           },
                 *           "capWeight": 20
                 *         },
                 *         {
                 *           "mark": "C2",
                 *           "x": 8,
                 *           "y": 18,
                 *           "ground": "BH1",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "points",
                 *             "points": [
                 *               {
                 *                 "x": 0,
                 *                 "y": 0
                 *               },
                 *               {
                 *                 "x": 2,
                 *                 "y": 0
                 *               },
                 *               {
                 *                 "x": 0.6,
                 *                 "y": 1.9
                 *               }
                 *             ]
                 *           },
                 *           "capWeight": 60
                 *         }
                 *       ],
                 *       "loads": {
                 *         "signs": "right-handed-z-up",
                 *         "loadsAre": "reactions",
                 *         "combinations": {
                 *           "W1": {
                 *             "limitState": "working"
                 *           },
                 *           "W2": {
                 *             "limitState": "working"
                 *           },
                 *           "S1": {
                 *             "limitState": "serviceability"
                 *           }
                 *         },
                 *         "rows": [
                 *           {
                 *             "cap": "A1",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2100,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A1",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1680,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A1",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1785,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A2",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2900,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A2",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2320,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A2",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2465,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B1",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 4200,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B1",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 3360,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B1",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 3570,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B2",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2600,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B2",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2080,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B2",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2210,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C1",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 300,
                 *             "Mx": 0,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C1",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": -210,
                 *             "Mx": 0,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C1",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 255,
                 *             "Mx": 0,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C2",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2200,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C2",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1760,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C2",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1870,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           }
                 *         ]
                 *       },
                 *       "limits": {
                 *         "settlement": 25,
                 *         "tilt": 0.002,
                 *         "angularDistortion": 0.002
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["Schedule"];
                readonly "multipart/form-data": {
                    /** @description JSON without `loads.rows` */
                    readonly schedule: string;
                    /** @description CSV with a header */
                    readonly loads: string;
                };
            };
        };
        readonly responses: {
            /** @description The answer; with `Accept: text/html` as a page */
            readonly 200: {
                headers: {
                    /** @description Accept */
                    readonly Vary?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["AssessmentAnswer"];
                    readonly "text/html": string;
                };
            };
            /** @description The body or URL cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key, where the service asks for one */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The body is larger than the limit (`bodyBytes` of GET /v1/limits) */
            readonly 413: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The request is invalid or physically impossible; `errors` lists every fault */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service is busy or stopping */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly replayTrace: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                readonly "application/json": components["schemas"]["ReplayRequest"];
            };
        };
        readonly responses: {
            /** @description The answer */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ReplayAnswer"];
                };
            };
            /** @description The body or URL cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key, where the service asks for one */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The body is larger than the limit (`bodyBytes` of GET /v1/limits) */
            readonly 413: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The request is invalid or physically impossible; `errors` lists every fault */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service is busy or stopping */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listMethods: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The list */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["MethodList"];
                };
            };
        };
    };
    readonly listSources: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The list */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SourceList"];
                };
            };
        };
    };
    readonly listLimits: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The list */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["LimitList"];
                };
            };
        };
    };
    readonly getMethod: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description Id of a method */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The methods */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["MethodReply"];
                };
            };
            /** @description No method has this id */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listProjects: {
        readonly parameters: {
            readonly query?: {
                /** @description Rows of a page, 1 to 1000; 100 without */
                readonly limit?: string;
                /** @description `next` of the page before */
                readonly cursor?: string;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description A page */
            readonly 200: {
                headers: {
                    /** @description rel="next" where there are more rows */
                    readonly Link?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ProjectList"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getProject: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description ETag of what the client holds: 304 where nothing changed */
                readonly "If-None-Match"?: string;
            };
            readonly path: {
                /** @description The project */
                readonly slug: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The project */
            readonly 200: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Project"];
                };
            };
            /** @description The client holds it already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly putProject: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description ETag that was read: needed to change a title */
                readonly "If-Match"?: string;
                /** @description `*`: make it, change nothing */
                readonly "If-None-Match"?: string;
            };
            readonly path: {
                /** @description The project */
                readonly slug: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "title": "Quay warehouse"
                 *     }
                 */
                readonly "application/json": components["schemas"]["ProjectRequest"];
            };
        };
        readonly responses: {
            /** @description The project, changed or as it was */
            readonly 200: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Project"];
                };
            };
            /** @description The project, made */
            readonly 201: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Project"];
                };
            };
            /** @description The body cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The project is not as the request expects */
            readonly 412: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A change needs If-Match */
            readonly 428: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listAssessments: {
        readonly parameters: {
            readonly query?: {
                /** @description Rows of a page, 1 to 1000; 100 without */
                readonly limit?: string;
                /** @description `next` of the page before */
                readonly cursor?: string;
            };
            readonly header?: never;
            readonly path: {
                /** @description The project */
                readonly slug: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description A page */
            readonly 200: {
                headers: {
                    /** @description rel="next" where there are more rows */
                    readonly Link?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["AssessmentList"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly recordAssessment: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description 1 to 255 printable characters: a retry within 24 hours gets the same answer */
                readonly "Idempotency-Key"?: string;
                /** @description `respond-async`: answer as soon as the schedule stands in line; `respond-async, wait=10`: or with the record, where it comes within so many seconds, at most 60 (RFC 7240) */
                readonly Prefer?: string;
            };
            readonly path: {
                /** @description The project */
                readonly slug: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "title": "River quay warehouse, lines A to C (invented)",
                 *       "designBasis": {
                 *         "format": "overall-factor",
                 *         "factor": 2.5,
                 *         "blockFactor": 3,
                 *         "upliftFactor": 3
                 *       },
                 *       "ground": {
                 *         "BH1": {
                 *           "name": "BH1",
                 *           "waterTableDepth": 1.5,
                 *           "layers": [
                 *             {
                 *               "name": "soft clay",
                 *               "thickness": 4,
                 *               "unitWeight": 16.5,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": {
                 *                 "top": 18,
                 *                 "bottom": 30
                 *               },
                 *               "youngsModulus": 6000,
                 *               "poissonsRatio": 0.5
                 *             },
                 *             {
                 *               "name": "medium dense sand",
                 *               "thickness": 5,
                 *               "unitWeight": 19,
                 *               "soil": "granular",
                 *               "frictionAngle": 33,
                 *               "youngsModulus": 35000
                 *             },
                 *             {
                 *               "name": "stiff clay",
                 *               "unitWeight": 20,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": 130,
                 *               "youngsModulus": 55000
                 *             }
                 *           ]
                 *         },
                 *         "BH2": {
                 *           "name": "BH2",
                 *           "waterTableDepth": 1.8,
                 *           "layers": [
                 *             {
                 *               "name": "soft clay",
                 *               "thickness": 4,
                 *               "unitWeight": 16.5,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": {
                 *                 "top": 18,
                 *                 "bottom": 30
                 *               },
                 *               "youngsModulus": 6000,
                 *               "poissonsRatio": 0.5
                 *             },
                 *             {
                 *               "name": "firm clay",
                 *               "thickness": 10,
                 *               "unitWeight": 18,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": {
                 *                 "top": 35,
                 *                 "bottom": 60
                 *               },
                 *               "youngsModulus": 15000
                 *             },
                 *             {
                 *               "name": "stiff clay",
                 *               "unitWeight": 20,
                 *               "soil": "cohesive",
                 *               "undrainedShearStrength": 110,
                 *               "youngsModulus": 45000
                 *             }
                 *           ]
                 *         }
                 *       },
                 *       "pileTypes": {
                 *         "B600": {
                 *           "section": {
                 *             "shape": "circular",
                 *             "diameter": 0.6
                 *           },
                 *           "length": 16,
                 *           "headDepth": 1,
                 *           "installation": "bored",
                 *           "youngsModulus": "30 GPa",
                 *           "sectionResistance": {
                 *             "compression": 3200,
                 *             "tension": 400
                 *           }
                 *         },
                 *         "P350": {
                 *           "section": {
                 *             "shape": "square",
                 *             "width": "350 mm"
                 *           },
                 *           "length": 11,
                 *           "headDepth": 1,
                 *           "installation": "driven"
                 *         }
                 *       },
                 *       "caps": [
                 *         {
                 *           "mark": "A1",
                 *           "x": 0,
                 *           "y": 0,
                 *           "ground": "BH1",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 2,
                 *             "rows": 2,
                 *             "spacing": 1.8
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "A2",
                 *           "x": 8,
                 *           "y": 0,
                 *           "ground": "BH1",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 3,
                 *             "rows": 2,
                 *             "spacing": 1.8
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "B1",
                 *           "x": 0,
                 *           "y": 9,
                 *           "ground": "BH2",
                 *           "pileType": "P350",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 6,
                 *             "rows": 6,
                 *             "spacing": 0.8
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "B2",
                 *           "x": 8,
                 *           "y": 9,
                 *           "ground": "BH2",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "ring",
                 *             "count": 5,
                 *             "radius": 2
                 *           },
                 *           "capWeight": 60
                 *         },
                 *         {
                 *           "mark": "C1",
                 *           "x": 0,
                 *           "y": 18,
                 *           "ground": "BH2",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "grid",
                 *             "columns": 2,
                 *             "rows": 1,
                 *             "spacing": 2
                 *           },
                 *           "capWeight": 20
                 *         },
                 *         {
                 *           "mark": "C2",
                 *           "x": 8,
                 *           "y": 18,
                 *           "ground": "BH1",
                 *           "pileType": "B600",
                 *           "layout": {
                 *             "kind": "points",
                 *             "points": [
                 *               {
                 *                 "x": 0,
                 *                 "y": 0
                 *               },
                 *               {
                 *                 "x": 2,
                 *                 "y": 0
                 *               },
                 *               {
                 *                 "x": 0.6,
                 *                 "y": 1.9
                 *               }
                 *             ]
                 *           },
                 *           "capWeight": 60
                 *         }
                 *       ],
                 *       "loads": {
                 *         "signs": "right-handed-z-up",
                 *         "loadsAre": "reactions",
                 *         "combinations": {
                 *           "W1": {
                 *             "limitState": "working"
                 *           },
                 *           "W2": {
                 *             "limitState": "working"
                 *           },
                 *           "S1": {
                 *             "limitState": "serviceability"
                 *           }
                 *         },
                 *         "rows": [
                 *           {
                 *             "cap": "A1",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2100,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A1",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1680,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A1",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1785,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A2",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2900,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A2",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2320,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "A2",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2465,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B1",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 4200,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B1",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 3360,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B1",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 3570,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B2",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2600,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B2",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2080,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "B2",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2210,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C1",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 300,
                 *             "Mx": 0,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C1",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": -210,
                 *             "Mx": 0,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C1",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 255,
                 *             "Mx": 0,
                 *             "My": 30,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C2",
                 *             "combination": "W1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 2200,
                 *             "Mx": 25,
                 *             "My": 40,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C2",
                 *             "combination": "W2",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1760,
                 *             "Mx": 25,
                 *             "My": -160,
                 *             "Mz": 0
                 *           },
                 *           {
                 *             "cap": "C2",
                 *             "combination": "S1",
                 *             "Fx": 0,
                 *             "Fy": 0,
                 *             "Fz": 1870,
                 *             "Mx": 25,
                 *             "My": 30,
                 *             "Mz": 0
                 *           }
                 *         ]
                 *       },
                 *       "limits": {
                 *         "settlement": 25,
                 *         "tilt": 0.002,
                 *         "angularDistortion": 0.002
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["Schedule"];
                readonly "multipart/form-data": {
                    /** @description JSON without `loads.rows` */
                    readonly schedule: string;
                    /** @description CSV with a header */
                    readonly loads: string;
                };
            };
        };
        readonly responses: {
            /** @description The record; it is on the disk */
            readonly 201: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    /** @description The record */
                    readonly Location?: string;
                    /** @description true where this is the answer of an earlier request */
                    readonly "Idempotency-Replayed"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Assessment"];
                };
            };
            /** @description With `respond-async`: the schedule stands in line, on the disk */
            readonly 202: {
                headers: {
                    /** @description Where the record will be; till then its state */
                    readonly Location?: string;
                    /** @description rel="monitor": its progress as server-sent events */
                    readonly Link?: string;
                    /** @description Seconds to the next look */
                    readonly "Retry-After"?: string;
                    /** @description What of Prefer was heeded */
                    readonly "Preference-Applied"?: string;
                    /** @description true where this is the answer of an earlier request */
                    readonly "Idempotency-Replayed"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Job"];
                };
            };
            /** @description The body cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The first request with this Idempotency-Key is still running */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The body is larger than the limit */
            readonly 413: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly verifyProject: {
        readonly parameters: {
            readonly query?: {
                /** @description With `hash`: a checkpoint that an earlier answer gave */
                readonly revision?: string;
                /** @description Record hash of that revision */
                readonly hash?: string;
            };
            readonly header?: never;
            readonly path: {
                /** @description The project */
                readonly slug: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description What was found */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["IntegrityReply"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getAssessment: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description ETag of what the client holds: 304 where nothing changed */
                readonly "If-None-Match"?: string;
            };
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The record, or the job that is to become one */
            readonly 200: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    /** @description rel="predecessor-version" and rel="successor-version" (RFC 5829), rel="collection" */
                    readonly Link?: string;
                    /** @description Seconds to the next look, while it waits or runs */
                    readonly "Retry-After"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["AssessmentOrJob"];
                };
            };
            /** @description The client holds it already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly cancelAssessment: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description It is cancelled, now or before */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Job"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description It is completed, or has failed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly watchAssessment: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Events `progress`, then one named for the state at the end: `completed`, `failed` or `cancelled`. The data of each is a JobProgress */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    /**
                     * @example event: progress
                     *     data: {"id":"0199…","state":"running","done":12,"caps":50}
                     *
                     *     event: completed
                     *     data: {"id":"0199…","state":"completed","done":50,"caps":50}
                     */
                    readonly "text/event-stream": string;
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getContent: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description ETag of what the client holds: 304 where nothing changed */
                readonly "If-None-Match"?: string;
            };
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The content */
            readonly 200: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Content"];
                };
            };
            /** @description The client holds it already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listCaps: {
        readonly parameters: {
            readonly query?: {
                /** @description Rows of a page, 1 to 1000; 100 without */
                readonly limit?: string;
                /** @description `next` of the page before */
                readonly cursor?: string;
                /** @description Only caps with this kind of check, to which the other filters then refer */
                readonly check?: string;
                /** @description Only caps whose utilisation is at least this */
                readonly utilisationAtLeast?: string;
                /** @description `true` or `false` */
                readonly exceeded?: string;
                /** @description Only caps on this ground profile */
                readonly ground?: string;
                /** @description Only caps on piles of this type */
                readonly pileType?: string;
                /** @description Only caps whose mark contains this */
                readonly mark?: string;
                /** @description `schedule` (as without), `mark`, or largest first by `utilisation` or `settlement` */
                readonly order?: string;
            };
            readonly header?: {
                /** @description ETag of what the client holds: 304 where nothing changed */
                readonly "If-None-Match"?: string;
            };
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description A page of rows; as CSV all of them, unless a limit is given */
            readonly 200: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    /** @description rel="next" where there are more rows */
                    readonly Link?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CapList"];
                    readonly "text/csv": string;
                };
            };
            /** @description The client holds it already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getCap: {
        readonly parameters: {
            readonly query?: {
                /** @description `none` leaves the trace out */
                readonly trace?: string;
            };
            readonly header?: {
                /** @description ETag of what the client holds: 304 where nothing changed */
                readonly "If-None-Match"?: string;
            };
            readonly path: {
                /** @description The assessment */
                readonly id: string;
                /** @description Mark of the cap */
                readonly mark: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The cap */
            readonly 200: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["CapReply"];
                };
            };
            /** @description The client holds it already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listChanges: {
        readonly parameters: {
            readonly query?: {
                /** @description Id of another revision of the project; without it the one right before */
                readonly since?: string;
            };
            readonly header?: {
                /** @description ETag of what the client holds: 304 where nothing changed */
                readonly "If-None-Match"?: string;
            };
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The changes */
            readonly 200: {
                headers: {
                    /** @description Strong: the same bytes have the same tag */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ChangesReply"];
                };
            };
            /** @description The client holds it already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listSignatures: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The signatures */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SignatureList"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly signAssessment: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "role": "originator",
                 *       "meaning": "Prepared by me from the model of 4 May"
                 *     }
                 */
                readonly "application/json": components["schemas"]["SignatureRequest"];
            };
        };
        readonly responses: {
            /** @description The signature */
            readonly 201: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Signature"];
                };
            };
            /** @description The body cannot be read */
            readonly 400: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Another role is next, or this person signed before */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The content type is not accepted */
            readonly 415: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly reverifyAssessment: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Identical, or what changed */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ReverifyReply"];
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such assessment, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The running engine refuses the stored request */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter or the request is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly printPlan: {
        readonly parameters: {
            readonly query?: {
                /** @description Only this kind of check; the largest of all without */
                readonly check?: string;
                /** @description Id or revision of another assessment of the project, laid beside with what changed */
                readonly since?: string;
            };
            readonly header?: never;
            readonly path: {
                /** @description The project */
                readonly slug: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The plan */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "text/html": string;
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such record, cap or project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly printOverview: {
        readonly parameters: {
            readonly query?: {
                /** @description Only this kind of check; the largest of all without */
                readonly check?: string;
                /** @description Id or revision of another assessment of the project, laid beside with what changed */
                readonly since?: string;
            };
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The plan */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "text/html": string;
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such record, cap or project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly printCapSheet: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
                /** @description Mark of the cap */
                readonly mark: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The sheet */
            readonly 200: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "text/html": string;
                };
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such record, cap or project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly printPiles: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description One row a pile, every number in full */
            readonly 200: {
                headers: {
                    /** @description A name for the file, of project and revision */
                    readonly "Content-Disposition"?: string;
                    /** @description Strong */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "text/csv": string;
                    readonly "text/html": string;
                };
            };
            /** @description The client holds the CSV already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such record, cap or project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getPilesCsv: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @description The assessment */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description One row a pile, every number in full */
            readonly 200: {
                headers: {
                    /** @description A name for the file, of project and revision */
                    readonly "Content-Disposition"?: string;
                    /** @description Strong */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "text/csv": string;
                };
            };
            /** @description The client holds it already */
            readonly 304: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description No valid key */
            readonly 401: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The key lacks a scope */
            readonly 403: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description No such record, cap or project, or none that the key has a right to */
            readonly 404: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The route answers in no accepted type */
            readonly 406: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The assessment is not completed */
            readonly 409: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description A parameter is invalid */
            readonly 422: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The service or its store is busy or stopping; try again */
            readonly 503: {
                headers: {
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description The work took longer than the service allows */
            readonly 504: {
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
