// Generated from schema/schema.graphql by schema/generate-resolver-types.ts. Do not edit.
// biome-ignore-all lint: generated
// biome-ignore-all format: generated
// biome-ignore-all assist: generated
import type { GraphQLResolveInfo, GraphQLScalarType, GraphQLScalarTypeConfig } from 'graphql';
import type { ShownProject } from '../operations/put-project.ts';
import type { ShownRecord } from '../operations/show-record.ts';
import type { CapNode } from '../operations/read-many.ts';
import type { ToldChanges } from '../operations/changes-in-thread.ts';
import type { ShownJob } from '../operations/show-job.ts';
import type { JobConnectionNode, AggregateNode, ProjectConnectionNode, AssessmentConnectionNode, CapConnectionNode, NeighbourConnectionNode } from './nodes.ts';
import type { Context } from './context.ts';
export type Maybe<T> = T | null;
export type InputMaybe<T> = Maybe<T>;
export type Omit<T, K extends keyof T> = Pick<T, Exclude<keyof T, K>>;
export type RequireFields<T, K extends keyof T> = Omit<T, K> & { [P in K]-?: NonNullable<T[P]> };
/** All built-in and custom scalars, mapped to their actual values */
export type Scalars = {
  ID: { input: string; output: string; }
  String: { input: string; output: string; }
  Boolean: { input: boolean; output: boolean; }
  Int: { input: number; output: number; }
  Float: { input: number; output: number; }
  /** A number in the unit of the field, or a string with a unit, for example "600 mm". Checked for dimension. */
  Quantity: { input: number | string; output: number | string; }
  /** A quantity that may vary linearly with depth: a Quantity, or { top, bottom } of two of them. */
  Varying: { input: unknown; output: unknown; }
  /** A whole number. */
  Count: { input: number; output: number; }
  /** The id of a method, or { method: id, ...parameters }. */
  MethodChoice: { input: unknown; output: unknown; }
  /** Any JSON value. */
  JSON: { input: unknown; output: unknown; }
};

export type Query = {
  readonly __typename?: 'Query';
  /** Projects that the key has a right to, by slug. */
  readonly projects: ProjectConnection;
  /** One project; an error where there is none, or the key has no right to it. */
  readonly project?: Maybe<Project>;
  /** Assessments of every project that the key has a right to, as one flat list. */
  readonly assessments: AssessmentConnection;
  /** One assessment; an error where there is none, or the key has no right to it. */
  readonly assessment?: Maybe<Assessment>;
  /** Assessments that are no records yet, or never will be, as one flat list, oldest first. */
  readonly jobs: JobConnection;
  /** Resistance of one pile in compression or uplift. */
  readonly singlePile: SinglePileAnswer;
  /** Resistance of the prism of soil and piles that a layout encloses. */
  readonly block: BlockAnswer;
  /** Sum of the single piles against the block: what governs. */
  readonly group: GroupAnswer;
  /** Settlement of one pile and of a group: tilt, pile loads, stiffness. */
  readonly settlement: SettlementAnswer;
  /** Every method, with its source and range of validity. */
  readonly methods: ReadonlyArray<Method>;
  /** One method; null where the id is unknown. An id may stand for several roles (shaft and base): kind tells them apart, else the first is given. */
  readonly method?: Maybe<Method>;
  /** The bibliography. */
  readonly sources: ReadonlyArray<Source>;
  /** What this endpoint accepts. */
  readonly limits: Limits;
};


export type QueryProjectsArgs = {
  first?: InputMaybe<Scalars['Int']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
};


export type QueryProjectArgs = {
  slug: Scalars['String']['input'];
};


export type QueryAssessmentsArgs = {
  project?: InputMaybe<Scalars['String']['input']>;
  from?: InputMaybe<Scalars['String']['input']>;
  to?: InputMaybe<Scalars['String']['input']>;
  exceeded?: InputMaybe<Scalars['Boolean']['input']>;
  latest?: InputMaybe<Scalars['Boolean']['input']>;
  order?: InputMaybe<AssessmentOrder>;
  first?: InputMaybe<Scalars['Int']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
};


export type QueryAssessmentArgs = {
  id: Scalars['ID']['input'];
};


export type QueryJobsArgs = {
  project?: InputMaybe<Scalars['String']['input']>;
  state?: InputMaybe<JobState>;
  from?: InputMaybe<Scalars['String']['input']>;
  to?: InputMaybe<Scalars['String']['input']>;
  first?: InputMaybe<Scalars['Int']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
};


export type QuerySinglePileArgs = {
  request: SinglePileRequestInput;
};


export type QueryBlockArgs = {
  request: GroupRequestInput;
};


export type QueryGroupArgs = {
  request: GroupRequestInput;
};


export type QuerySettlementArgs = {
  request: SettlementRequestInput;
};


export type QueryMethodArgs = {
  id: Scalars['String']['input'];
  kind?: InputMaybe<Scalars['String']['input']>;
};

/** By websocket (protocol graphql-transport-ws) at the same address; the key in the header of the request that opens it. */
export type Subscription = {
  readonly __typename?: 'Subscription';
  /** How far an assessment is: at once, then with each change, until it ends. */
  readonly assessmentProgress: AssessmentProgress;
};


/** By websocket (protocol graphql-transport-ws) at the same address; the key in the header of the request that opens it. */
export type SubscriptionAssessmentProgressArgs = {
  id: Scalars['ID']['input'];
};

export type AssessmentProgress = {
  readonly __typename?: 'AssessmentProgress';
  readonly id: Scalars['ID']['output'];
  /** queued | running | failed | cancelled | completed */
  readonly state: Scalars['String']['output'];
  /** Caps that are through. */
  readonly done: Scalars['Int']['output'];
  /** Of so many; null until the schedule has been read. */
  readonly caps?: Maybe<Scalars['Int']['output']>;
};

export type SinglePileRequestInput = {
  readonly pile: PileTypeInput;
  readonly ground: GroundProfileInput;
  /** compression | uplift. Default: compression. */
  readonly direction?: InputMaybe<Scalars['String']['input']>;
  readonly methods?: InputMaybe<MethodChoicesInput>;
  readonly designBasis?: InputMaybe<DesignBasisInput>;
};

export type GroupRequestInput = {
  readonly pile: PileTypeInput;
  readonly ground: GroundProfileInput;
  readonly layout: LayoutInput;
  /** compression | uplift. Default: compression. */
  readonly direction?: InputMaybe<Scalars['String']['input']>;
  readonly methods?: InputMaybe<MethodChoicesInput>;
  readonly designBasis?: InputMaybe<DesignBasisInput>;
};

export type SettlementRequestInput = {
  readonly pile: PileTypeInput;
  readonly ground: GroundProfileInput;
  readonly layout?: InputMaybe<LayoutInput>;
  readonly load: LoadInput;
  /** rigid | flexible. Default: rigid. */
  readonly cap?: InputMaybe<Scalars['String']['input']>;
  /** elastic-continuum | randolph-wroth-1978. Default: elastic-continuum. */
  readonly method?: InputMaybe<Scalars['String']['input']>;
  /** full: every element of every pile acts on every other (elastic-continuum, up to 64 piles). Default: superposed interaction factors. */
  readonly coupling?: InputMaybe<Scalars['String']['input']>;
  /** hyperbolic: the pile's own springs soften towards its resistance by `methods` (elastic-continuum). */
  readonly nonlinearity?: InputMaybe<Scalars['String']['input']>;
  readonly failureRatio?: InputMaybe<FailureRatioInput>;
  /** Of the resistance that a softening pile tends to. */
  readonly methods?: InputMaybe<MethodChoicesInput>;
};

export type FailureRatioInput = {
  /** R_f of the shaft. Default 0.5. */
  readonly shaft?: InputMaybe<Scalars['Quantity']['input']>;
  /** R_f of the base. Default 0.9. */
  readonly base?: InputMaybe<Scalars['Quantity']['input']>;
};

export type PileTypeInput = {
  readonly section: SectionInput;
  /** m */
  readonly length: Scalars['Quantity']['input'];
  /** Head below the surface, m. Default 0. */
  readonly headDepth?: InputMaybe<Scalars['Quantity']['input']>;
  /** driven | bored | continuous-flight-auger */
  readonly installation: Scalars['String']['input'];
  /** kPa */
  readonly youngsModulus?: InputMaybe<Scalars['Quantity']['input']>;
  /** Diameter of an enlarged base, m. */
  readonly baseDiameter?: InputMaybe<Scalars['Quantity']['input']>;
  /** kN/m3 */
  readonly unitWeight?: InputMaybe<Scalars['Quantity']['input']>;
  readonly sectionResistance?: InputMaybe<SectionResistanceInput>;
};

export type SectionResistanceInput = {
  /** kN */
  readonly compression?: InputMaybe<Scalars['Quantity']['input']>;
  /** kN */
  readonly tension?: InputMaybe<Scalars['Quantity']['input']>;
};

/** circular { diameter }, square { width }, tubular { diameter, wallThickness, toe }, h { depth, flangeWidth, area } */
export type SectionInput = {
  /** circular | square | tubular | h */
  readonly shape: Scalars['String']['input'];
  /** m */
  readonly diameter?: InputMaybe<Scalars['Quantity']['input']>;
  /** m */
  readonly width?: InputMaybe<Scalars['Quantity']['input']>;
  /** m */
  readonly wallThickness?: InputMaybe<Scalars['Quantity']['input']>;
  /** open | closed */
  readonly toe?: InputMaybe<Scalars['String']['input']>;
  /** m */
  readonly depth?: InputMaybe<Scalars['Quantity']['input']>;
  /** m */
  readonly flangeWidth?: InputMaybe<Scalars['Quantity']['input']>;
  /** m2 */
  readonly area?: InputMaybe<Scalars['Quantity']['input']>;
};

export type GroundProfileInput = {
  readonly name?: InputMaybe<Scalars['String']['input']>;
  /** m. Left out: the water table lies below all. */
  readonly waterTableDepth?: InputMaybe<Scalars['Quantity']['input']>;
  readonly layers: ReadonlyArray<LayerInput>;
  /** True: the bottom of the last layer is rigid rock. */
  readonly rigidBase?: InputMaybe<Scalars['Boolean']['input']>;
};

export type LayerInput = {
  readonly name: Scalars['String']['input'];
  /** m. Only the last layer may leave it out: it goes on. */
  readonly thickness?: InputMaybe<Scalars['Quantity']['input']>;
  /** Bulk unit weight, below water saturated, kN/m3. */
  readonly unitWeight: Scalars['Quantity']['input'];
  /** cohesive | granular | rock */
  readonly soil: Scalars['String']['input'];
  /** kPa, cohesive */
  readonly undrainedShearStrength?: InputMaybe<Scalars['Varying']['input']>;
  /** percent, cohesive */
  readonly plasticityIndex?: InputMaybe<Scalars['Quantity']['input']>;
  /** cohesive */
  readonly overconsolidationRatio?: InputMaybe<Scalars['Quantity']['input']>;
  /** deg, cohesive */
  readonly effectiveFrictionAngle?: InputMaybe<Scalars['Quantity']['input']>;
  /** deg, granular */
  readonly frictionAngle?: InputMaybe<Scalars['Quantity']['input']>;
  /** percent, granular */
  readonly relativeDensity?: InputMaybe<Scalars['Quantity']['input']>;
  /** kPa, rock */
  readonly unconfinedCompressiveStrength?: InputMaybe<Scalars['Varying']['input']>;
  /** percent, rock */
  readonly rqd?: InputMaybe<Scalars['Quantity']['input']>;
  readonly sptN60?: InputMaybe<Scalars['Quantity']['input']>;
  /** kPa */
  readonly coneResistance?: InputMaybe<Scalars['Varying']['input']>;
  /** kPa */
  readonly youngsModulus?: InputMaybe<Scalars['Varying']['input']>;
  readonly poissonsRatio?: InputMaybe<Scalars['Quantity']['input']>;
};

/** grid { columns, rows, spacing | spacingX, spacingY }, ring { count, radius }, points { points } */
export type LayoutInput = {
  /** grid | ring | points */
  readonly kind: Scalars['String']['input'];
  readonly columns?: InputMaybe<Scalars['Count']['input']>;
  readonly rows?: InputMaybe<Scalars['Count']['input']>;
  /** m */
  readonly spacing?: InputMaybe<Scalars['Quantity']['input']>;
  /** m */
  readonly spacingX?: InputMaybe<Scalars['Quantity']['input']>;
  /** m */
  readonly spacingY?: InputMaybe<Scalars['Quantity']['input']>;
  readonly count?: InputMaybe<Scalars['Count']['input']>;
  /** m */
  readonly radius?: InputMaybe<Scalars['Quantity']['input']>;
  readonly points?: InputMaybe<ReadonlyArray<PointInput>>;
};

export type PointInput = {
  /** m */
  readonly x: Scalars['Quantity']['input'];
  /** m */
  readonly y: Scalars['Quantity']['input'];
};

export type LoadInput = {
  /** kN, positive downward */
  readonly V: Scalars['Quantity']['input'];
  /** kN.m, positive when it presses piles at +y */
  readonly Mx?: InputMaybe<Scalars['Quantity']['input']>;
  /** kN.m, positive when it presses piles at +x */
  readonly My?: InputMaybe<Scalars['Quantity']['input']>;
};

/** Each left out: the default for the soil and installation. */
export type MethodChoicesInput = {
  readonly cohesiveShaft?: InputMaybe<Scalars['MethodChoice']['input']>;
  readonly cohesiveBase?: InputMaybe<Scalars['MethodChoice']['input']>;
  readonly granularShaft?: InputMaybe<Scalars['MethodChoice']['input']>;
  readonly granularBase?: InputMaybe<Scalars['MethodChoice']['input']>;
  readonly upliftRatio?: InputMaybe<UpliftRatioInput>;
  /** Largest sublayer of the shaft sum, m. Default 1. */
  readonly sublayer?: InputMaybe<Scalars['Quantity']['input']>;
};

/** Shaft resistance in uplift over that in compression. */
export type UpliftRatioInput = {
  readonly cohesive?: InputMaybe<Scalars['Quantity']['input']>;
  readonly granular?: InputMaybe<Scalars['Quantity']['input']>;
};

/** The format of safety: the fields that belong to each format are those of the REST contract. */
export type DesignBasisInput = {
  /** overall-factor | en1997-1-2004 | aashto-lrfd-2020 | as2159-2009 | custom */
  readonly format: Scalars['String']['input'];
  readonly factor?: InputMaybe<Scalars['Quantity']['input']>;
  readonly blockFactor?: InputMaybe<Scalars['Quantity']['input']>;
  readonly upliftFactor?: InputMaybe<Scalars['Quantity']['input']>;
  readonly split?: InputMaybe<SplitInput>;
  /** DA1-1 | DA1-2 | DA2 | DA3 */
  readonly approach?: InputMaybe<Scalars['String']['input']>;
  readonly characteristic?: InputMaybe<CharacteristicInput>;
  readonly reductionFactor?: InputMaybe<Scalars['Quantity']['input']>;
  readonly shaft?: InputMaybe<Scalars['Quantity']['input']>;
  readonly base?: InputMaybe<Scalars['Quantity']['input']>;
  readonly block?: InputMaybe<Scalars['Quantity']['input']>;
  readonly uplift?: InputMaybe<Scalars['Quantity']['input']>;
};

/** Factors on shaft and base apart. */
export type SplitInput = {
  readonly shaft: Scalars['Quantity']['input'];
  readonly base: Scalars['Quantity']['input'];
};

export type CharacteristicInput = {
  /** model-factor { value } | profiles { count } */
  readonly route: Scalars['String']['input'];
  readonly value?: InputMaybe<Scalars['Quantity']['input']>;
  readonly count?: InputMaybe<Scalars['Count']['input']>;
  readonly stiffStructure?: InputMaybe<Scalars['Boolean']['input']>;
};

/** What every answer of a calculator carries. */
export type Answer = {
  readonly notices: ReadonlyArray<Notice>;
  /** Computed and sent only where it is selected. */
  readonly trace?: Maybe<Trace>;
  readonly meta: Meta;
};

export type Meta = {
  readonly __typename?: 'Meta';
  /** kentledge/<version> */
  readonly engine: Scalars['String']['output'];
  /** sha256 over the canonical JSON of the validated request. */
  readonly requestHash: Scalars['String']['output'];
};

export type Notice = {
  readonly __typename?: 'Notice';
  readonly code: Scalars['String']['output'];
  /** caution | warning | info */
  readonly level: Scalars['String']['output'];
  readonly text: Scalars['String']['output'];
  /** JSON Pointer into the request. */
  readonly pointer?: Maybe<Scalars['String']['output']>;
};

export type SinglePileAnswer = Answer & {
  readonly __typename?: 'SinglePileAnswer';
  readonly result: SinglePileResult;
  readonly notices: ReadonlyArray<Notice>;
  readonly trace?: Maybe<Trace>;
  readonly meta: Meta;
};

export type BlockAnswer = Answer & {
  readonly __typename?: 'BlockAnswer';
  readonly result: BlockResult;
  readonly notices: ReadonlyArray<Notice>;
  readonly trace?: Maybe<Trace>;
  readonly meta: Meta;
};

export type GroupAnswer = Answer & {
  readonly __typename?: 'GroupAnswer';
  readonly result: GroupResult;
  readonly notices: ReadonlyArray<Notice>;
  readonly trace?: Maybe<Trace>;
  readonly meta: Meta;
};

export type SettlementAnswer = Answer & {
  readonly __typename?: 'SettlementAnswer';
  readonly result: SettlementResult;
  readonly notices: ReadonlyArray<Notice>;
  readonly trace?: Maybe<Trace>;
  readonly meta: Meta;
};

export type SinglePileResult = {
  readonly __typename?: 'SinglePileResult';
  /** kN */
  readonly shaftResistance: Scalars['Float']['output'];
  /** kN */
  readonly baseResistance: Scalars['Float']['output'];
  /** kN */
  readonly ultimateResistance: Scalars['Float']['output'];
  /** Effective weight, kN; in uplift. */
  readonly weight?: Maybe<Scalars['Float']['output']>;
  /** kN; with a design basis of partial or resistance factors. */
  readonly designResistance?: Maybe<Scalars['Float']['output']>;
  /** kN; with an overall factor. */
  readonly allowableLoad?: Maybe<Scalars['Float']['output']>;
  readonly layers: ReadonlyArray<LayerResistance>;
  /** kPa */
  readonly unitBaseResistance: Scalars['Float']['output'];
  /** m */
  readonly toeDepth: Scalars['Float']['output'];
};

export type LayerResistance = {
  readonly __typename?: 'LayerResistance';
  readonly name: Scalars['String']['output'];
  /** m */
  readonly top: Scalars['Float']['output'];
  /** m */
  readonly bottom: Scalars['Float']['output'];
  /** kPa */
  readonly unitShaftResistance: Scalars['Float']['output'];
  /** kN */
  readonly shaftResistance: Scalars['Float']['output'];
};

export type BlockResult = {
  readonly __typename?: 'BlockResult';
  /** m */
  readonly breadth: Scalars['Float']['output'];
  /** m */
  readonly length: Scalars['Float']['output'];
  /** m */
  readonly depth: Scalars['Float']['output'];
  /** m */
  readonly perimeter: Scalars['Float']['output'];
  /** m2 */
  readonly baseArea: Scalars['Float']['output'];
  /** kN */
  readonly sideResistance: Scalars['Float']['output'];
  /** kN */
  readonly baseResistance: Scalars['Float']['output'];
  /** kN */
  readonly ultimateResistance: Scalars['Float']['output'];
  /** Effective weight, kN; in uplift. */
  readonly weight?: Maybe<Scalars['Float']['output']>;
  /** kN */
  readonly designResistance?: Maybe<Scalars['Float']['output']>;
  /** kN */
  readonly allowableLoad?: Maybe<Scalars['Float']['output']>;
};

export type GroupResult = {
  readonly __typename?: 'GroupResult';
  readonly pileCount: Scalars['Int']['output'];
  readonly single: SinglePileResult;
  /** kN */
  readonly sumOfPiles: Scalars['Float']['output'];
  readonly efficiency: Scalars['Float']['output'];
  readonly block: BlockResult;
  /** piles | block */
  readonly governing: Scalars['String']['output'];
  /** kN */
  readonly ultimateResistance: Scalars['Float']['output'];
  /** kN */
  readonly designResistance?: Maybe<Scalars['Float']['output']>;
  /** kN */
  readonly allowableLoad?: Maybe<Scalars['Float']['output']>;
};

export type SettlementResult = {
  readonly __typename?: 'SettlementResult';
  readonly single: SinglePileSettlement;
  /** Only where the request has a layout. */
  readonly group?: Maybe<GroupSettlement>;
};

export type SinglePileSettlement = {
  readonly __typename?: 'SinglePileSettlement';
  /** kN */
  readonly load: Scalars['Float']['output'];
  /** mm, of the pile head */
  readonly settlement: Scalars['Float']['output'];
  /** kN/m */
  readonly stiffness: Scalars['Float']['output'];
  readonly influenceFactor: Scalars['Float']['output'];
  readonly baseLoadShare: Scalars['Float']['output'];
  /** Along the pile from the head down (elastic-continuum). */
  readonly axial?: Maybe<ReadonlyArray<AxialLoad>>;
  /** With nonlinearity hyperbolic. */
  readonly curve?: Maybe<ReadonlyArray<CurvePoint>>;
};

export type CurvePoint = {
  readonly __typename?: 'CurvePoint';
  /** kN */
  readonly load: Scalars['Float']['output'];
  /** mm */
  readonly settlement: Scalars['Float']['output'];
};

export type AxialLoad = {
  readonly __typename?: 'AxialLoad';
  /** m, bottom of an element */
  readonly depth: Scalars['Float']['output'];
  /** kN, in the pile at this depth */
  readonly axialLoad: Scalars['Float']['output'];
  /** kPa, mean on the element above this depth */
  readonly shaftStress: Scalars['Float']['output'];
};

export type GroupSettlement = {
  readonly __typename?: 'GroupSettlement';
  /** mm, at the centroid of the piles; of a flexible cap the mean */
  readonly settlement: Scalars['Float']['output'];
  /** left out where there is no vertical load */
  readonly settlementRatio?: Maybe<Scalars['Float']['output']>;
  readonly tilt: Tilt;
  /** In the order of the layout. */
  readonly piles: ReadonlyArray<PileSettlement>;
  readonly stiffness: GroupStiffness;
  /** mm, of a flexible cap */
  readonly largest?: Maybe<Scalars['Float']['output']>;
  /** mm, of a flexible cap */
  readonly differential?: Maybe<Scalars['Float']['output']>;
  /** At the centroid, the load growing in proportion; with nonlinearity hyperbolic under a rigid cap. */
  readonly curve?: Maybe<ReadonlyArray<CurvePoint>>;
};

export type Tilt = {
  readonly __typename?: 'Tilt';
  readonly alongX: Scalars['Float']['output'];
  readonly alongY: Scalars['Float']['output'];
};

export type PileSettlement = {
  readonly __typename?: 'PileSettlement';
  /** m */
  readonly x: Scalars['Float']['output'];
  /** m */
  readonly y: Scalars['Float']['output'];
  /** kN */
  readonly load: Scalars['Float']['output'];
  /** mm */
  readonly settlement: Scalars['Float']['output'];
};

export type GroupStiffness = {
  readonly __typename?: 'GroupStiffness';
  /** kN/m */
  readonly vertical: Scalars['Float']['output'];
  /** kN.m/rad; left out where the piles cannot resist it */
  readonly rockingAlongX?: Maybe<Scalars['Float']['output']>;
  /** kN.m/rad; left out where the piles cannot resist it */
  readonly rockingAlongY?: Maybe<Scalars['Float']['output']>;
  readonly atOrigin: CapMatrices;
};

/** A rigid cap at its origin, pressing signs; rows and columns: V, My, Mx (kN, kN.m) and settlement, slope along x, slope along y (m, rad). */
export type CapMatrices = {
  readonly __typename?: 'CapMatrices';
  /** m/kN, 1/kN, rad/(kN.m) */
  readonly flexibility: ReadonlyArray<ReadonlyArray<Scalars['Float']['output']>>;
  /** kN/m, kN/rad, kN.m/rad; 0 where the piles cannot take it */
  readonly stiffness: ReadonlyArray<ReadonlyArray<Scalars['Float']['output']>>;
};

/** The ordered lines that lead from input to result. */
export type Trace = {
  readonly __typename?: 'Trace';
  readonly steps: ReadonlyArray<Step>;
  /** JSON Pointer into the result: id of the step that gives the number. */
  readonly results: Scalars['JSON']['output'];
  readonly sources: ReadonlyArray<Source>;
};

export type Step = {
  readonly __typename?: 'Step';
  readonly id: Scalars['String']['output'];
  /** input | formula | sum | lookup | choice | solution */
  readonly kind: Scalars['String']['output'];
  readonly symbol: Scalars['String']['output'];
  readonly name: Scalars['String']['output'];
  readonly value: Scalars['Float']['output'];
  /** UCUM code */
  readonly unit: Scalars['String']['output'];
  readonly quantity: Scalars['String']['output'];
  /** input: JSON Pointer into the request. */
  readonly from?: Maybe<Scalars['String']['output']>;
  /** input: true where the request is silent. */
  readonly default?: Maybe<Scalars['Boolean']['output']>;
  /** input: why this default. */
  readonly reason?: Maybe<Scalars['String']['output']>;
  readonly formula?: Maybe<Scalars['String']['output']>;
  readonly operands?: Maybe<ReadonlyArray<Operand>>;
  readonly source?: Maybe<Citation>;
  /** formula: the range of validity. */
  readonly range?: Maybe<ReadonlyArray<StepRange>>;
  /** lookup: the bracketing rows [argument, value]. */
  readonly rows?: Maybe<ReadonlyArray<ReadonlyArray<Scalars['Float']['output']>>>;
  /** choice: smallest | largest. */
  readonly rule?: Maybe<Scalars['String']['output']>;
  /** choice: id of the operand taken. */
  readonly chosen?: Maybe<Scalars['String']['output']>;
  /** solution: how it was solved. */
  readonly method?: Maybe<Scalars['String']['output']>;
  readonly unknowns?: Maybe<ReadonlyArray<Unknown>>;
  readonly residuals?: Maybe<ReadonlyArray<Residual>>;
  readonly tolerance?: Maybe<Scalars['Float']['output']>;
  /** solution: depths between elements, m. */
  readonly mesh?: Maybe<ReadonlyArray<Scalars['Float']['output']>>;
  /** solution: what it is read from. */
  readonly table?: Maybe<SolutionTable>;
};

export type SolutionTable = {
  readonly __typename?: 'SolutionTable';
  readonly columns: ReadonlyArray<TableColumn>;
  readonly rows: ReadonlyArray<ReadonlyArray<Scalars['Float']['output']>>;
};

export type TableColumn = {
  readonly __typename?: 'TableColumn';
  readonly symbol: Scalars['String']['output'];
  readonly unit: Scalars['String']['output'];
};

export type Operand = {
  readonly __typename?: 'Operand';
  readonly symbol: Scalars['String']['output'];
  readonly value: Scalars['Float']['output'];
  readonly unit: Scalars['String']['output'];
  /** Id of an earlier step, or a JSON Pointer into the request. */
  readonly from: Scalars['String']['output'];
};

export type StepRange = {
  readonly __typename?: 'StepRange';
  readonly symbol: Scalars['String']['output'];
  readonly min?: Maybe<Scalars['Float']['output']>;
  readonly max?: Maybe<Scalars['Float']['output']>;
  readonly inside: Scalars['Boolean']['output'];
};

export type Unknown = {
  readonly __typename?: 'Unknown';
  readonly symbol: Scalars['String']['output'];
  readonly value: Scalars['Float']['output'];
  readonly unit: Scalars['String']['output'];
};

export type Residual = {
  readonly __typename?: 'Residual';
  readonly name: Scalars['String']['output'];
  readonly value: Scalars['Float']['output'];
};

/** A place in a source. */
export type Citation = {
  readonly __typename?: 'Citation';
  readonly key: Scalars['String']['output'];
  readonly locator: Scalars['String']['output'];
};

export type Source = {
  readonly __typename?: 'Source';
  readonly key: Scalars['String']['output'];
  readonly title: Scalars['String']['output'];
  readonly author: Scalars['String']['output'];
  readonly year?: Maybe<Scalars['Int']['output']>;
  /** published | common practice | memory */
  readonly basis: Scalars['String']['output'];
};

export type Method = {
  readonly __typename?: 'Method';
  readonly id: Scalars['String']['output'];
  readonly kind: Scalars['String']['output'];
  readonly title: Scalars['String']['output'];
  readonly installations: ReadonlyArray<Scalars['String']['output']>;
  /** Layer parameters that the method needs, by their field names. */
  readonly needs: ReadonlyArray<Scalars['String']['output']>;
  readonly parameters: ReadonlyArray<MethodParameter>;
  readonly formulas: ReadonlyArray<MethodFormula>;
  readonly validity: Scalars['String']['output'];
  /** How it works, where the formulas alone do not tell. */
  readonly theory?: Maybe<Scalars['String']['output']>;
  /** How far from the truth it is known to lie. */
  readonly errorBounds?: Maybe<Scalars['String']['output']>;
  readonly source: Source;
};

/** A parameter of a method that a request may set. */
export type MethodParameter = {
  readonly __typename?: 'MethodParameter';
  /** Field name in a MethodChoice. */
  readonly key: Scalars['String']['output'];
  readonly symbol: Scalars['String']['output'];
  readonly name: Scalars['String']['output'];
  readonly unit: Scalars['String']['output'];
  readonly min: Scalars['Float']['output'];
  readonly max: Scalars['Float']['output'];
  readonly required: Scalars['Boolean']['output'];
};

export type MethodFormula = {
  readonly __typename?: 'MethodFormula';
  readonly symbol: Scalars['String']['output'];
  readonly name: Scalars['String']['output'];
  readonly unit: Scalars['String']['output'];
  readonly formula: Scalars['String']['output'];
  /** Unit of each operand by its symbol. */
  readonly operands: Scalars['JSON']['output'];
  readonly source: Citation;
  /** The range of validity: { symbol: { min, max } }. */
  readonly range?: Maybe<Scalars['JSON']['output']>;
};

export type Limits = {
  readonly __typename?: 'Limits';
  /** Fields above one another in a query. */
  readonly depth: Scalars['Int']['output'];
  /** Aliases in a query, fragments counted where they are spread. */
  readonly aliases: Scalars['Int']['output'];
  /** Tokens of a document. */
  readonly tokens: Scalars['Int']['output'];
  /** Objects of an answer, as many as its lists may hold; a calculator, a trace and a comparison count as hundreds. */
  readonly cost: Scalars['Int']['output'];
  /** Bytes of a request. */
  readonly bodyBytes: Scalars['Int']['output'];
  /** Layers of a ground profile. */
  readonly layers: Scalars['Int']['output'];
  /** Piles of a layout. */
  readonly pilesPerCap: Scalars['Int']['output'];
};

export type AssessmentOrder =
  | 'oldest'
  | 'newest'
  /** The largest utilisation first. */
  | 'utilisation';

export type CapOrder =
  /** As the schedule has them. */
  | 'schedule'
  | 'mark'
  /** The largest utilisation first; with check, that of this check. */
  | 'utilisation'
  /** The largest settlement first. */
  | 'settlement';

export type NeighbourOrder =
  | 'schedule'
  /** The largest angular distortion first. */
  | 'distortion';

export type PageInfo = {
  readonly __typename?: 'PageInfo';
  readonly hasNextPage: Scalars['Boolean']['output'];
  /** Of the last row. */
  readonly endCursor?: Maybe<Scalars['String']['output']>;
};

export type ProjectConnection = {
  readonly __typename?: 'ProjectConnection';
  readonly nodes: ReadonlyArray<Project>;
  readonly edges: ReadonlyArray<ProjectEdge>;
  readonly pageInfo: PageInfo;
  readonly totalCount: Scalars['Int']['output'];
};

export type ProjectEdge = {
  readonly __typename?: 'ProjectEdge';
  readonly cursor: Scalars['String']['output'];
  readonly node: Project;
};

export type Project = {
  readonly __typename?: 'Project';
  readonly slug: Scalars['String']['output'];
  readonly title: Scalars['String']['output'];
  readonly createdAt: Scalars['String']['output'];
  readonly updatedAt: Scalars['String']['output'];
  /** Number of its newest assessment; 0 before the first. */
  readonly revision: Scalars['Int']['output'];
  /** The newest assessment. */
  readonly latest?: Maybe<Assessment>;
  /** Its assessments: the revisions. */
  readonly assessments: AssessmentConnection;
};


export type ProjectAssessmentsArgs = {
  from?: InputMaybe<Scalars['String']['input']>;
  to?: InputMaybe<Scalars['String']['input']>;
  exceeded?: InputMaybe<Scalars['Boolean']['input']>;
  order?: InputMaybe<AssessmentOrder>;
  first?: InputMaybe<Scalars['Int']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
};

export type AssessmentConnection = {
  readonly __typename?: 'AssessmentConnection';
  readonly nodes: ReadonlyArray<Assessment>;
  readonly edges: ReadonlyArray<AssessmentEdge>;
  readonly pageInfo: PageInfo;
  readonly totalCount: Scalars['Int']['output'];
  /** Over all of the list, not only its page. */
  readonly aggregates: AssessmentAggregates;
};

export type AssessmentEdge = {
  readonly __typename?: 'AssessmentEdge';
  readonly cursor: Scalars['String']['output'];
  readonly node: Assessment;
};

export type AssessmentAggregates = {
  readonly __typename?: 'AssessmentAggregates';
  /** Assessments. */
  readonly count: Scalars['Int']['output'];
  /** Assessments with an exceeded cap. */
  readonly exceeded: Scalars['Int']['output'];
  readonly caps: Scalars['Int']['output'];
  readonly capsExceeded: Scalars['Int']['output'];
  readonly largestUtilisation?: Maybe<Scalars['Float']['output']>;
  /** By the check that is the worst of its assessment. */
  readonly byWorstCheck: ReadonlyArray<WorstCheckAggregate>;
};

export type WorstCheckAggregate = {
  readonly __typename?: 'WorstCheckAggregate';
  readonly check: Scalars['String']['output'];
  readonly count: Scalars['Int']['output'];
  readonly exceeded: Scalars['Int']['output'];
  readonly largestUtilisation: Scalars['Float']['output'];
};

/** A record: one run of all checks for a schedule. It never changes. */
export type Assessment = {
  readonly __typename?: 'Assessment';
  readonly id: Scalars['ID']['output'];
  /** Slug of its project. */
  readonly projectSlug: Scalars['String']['output'];
  readonly project: Project;
  /** 1, 2, 3 ... in its project. */
  readonly revision: Scalars['Int']['output'];
  readonly title: Scalars['String']['output'];
  /** completed */
  readonly state: Scalars['String']['output'];
  readonly createdAt: Scalars['String']['output'];
  /** The person or pipeline that the key belongs to. */
  readonly actor: Scalars['String']['output'];
  readonly actorKey?: Maybe<Scalars['String']['output']>;
  readonly engine: Scalars['String']['output'];
  readonly requestHash: Scalars['String']['output'];
  readonly contentHash: Scalars['String']['output'];
  readonly traceHash: Scalars['String']['output'];
  readonly previousHash: Scalars['String']['output'];
  readonly recordHash: Scalars['String']['output'];
  readonly summary: Summary;
  /** The revision right before, and right after. */
  readonly previous?: Maybe<Assessment>;
  readonly next?: Maybe<Assessment>;
  readonly caps: CapConnection;
  /** One cap; null where there is none of this mark. */
  readonly cap?: Maybe<Cap>;
  readonly neighbours: NeighbourConnection;
  readonly signatures: ReadonlyArray<Signature>;
  /** What differs from another revision of the project; without since from the one right before. */
  readonly changes?: Maybe<Changes>;
  readonly aggregates: CapAggregates;
};


/** A record: one run of all checks for a schedule. It never changes. */
export type AssessmentCapsArgs = {
  check?: InputMaybe<Scalars['String']['input']>;
  utilisationAtLeast?: InputMaybe<Scalars['Float']['input']>;
  exceeded?: InputMaybe<Scalars['Boolean']['input']>;
  ground?: InputMaybe<Scalars['String']['input']>;
  pileType?: InputMaybe<Scalars['String']['input']>;
  mark?: InputMaybe<Scalars['String']['input']>;
  order?: InputMaybe<CapOrder>;
  first?: InputMaybe<Scalars['Int']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
};


/** A record: one run of all checks for a schedule. It never changes. */
export type AssessmentCapArgs = {
  mark: Scalars['String']['input'];
};


/** A record: one run of all checks for a schedule. It never changes. */
export type AssessmentNeighboursArgs = {
  exceeded?: InputMaybe<Scalars['Boolean']['input']>;
  cap?: InputMaybe<Scalars['String']['input']>;
  order?: InputMaybe<NeighbourOrder>;
  first?: InputMaybe<Scalars['Int']['input']>;
  after?: InputMaybe<Scalars['String']['input']>;
};


/** A record: one run of all checks for a schedule. It never changes. */
export type AssessmentChangesArgs = {
  since?: InputMaybe<Scalars['ID']['input']>;
  first?: InputMaybe<Scalars['Int']['input']>;
};

export type Summary = {
  readonly __typename?: 'Summary';
  readonly caps: Scalars['Int']['output'];
  /** Caps with every check satisfied. */
  readonly satisfied: Scalars['Int']['output'];
  /** Caps with a check exceeded; neighbours are counted in checks alone. */
  readonly exceeded: Scalars['Int']['output'];
  /** Of all caps and neighbours. */
  readonly worst?: Maybe<WorstCheck>;
  /** The worst of each kind of check, how many were made and how many exceed. */
  readonly checks: ReadonlyArray<KindOfCheck>;
};

export type KindOfCheck = {
  readonly __typename?: 'KindOfCheck';
  readonly cap: Scalars['String']['output'];
  /** The other cap of an angular distortion. */
  readonly neighbour?: Maybe<Scalars['String']['output']>;
  readonly check: Scalars['String']['output'];
  readonly combination: Scalars['String']['output'];
  readonly utilisation: Scalars['Float']['output'];
  readonly count: Scalars['Int']['output'];
  readonly exceeded: Scalars['Int']['output'];
};

export type WorstCheck = {
  readonly __typename?: 'WorstCheck';
  readonly cap: Scalars['String']['output'];
  /** The other cap of an angular distortion. */
  readonly neighbour?: Maybe<Scalars['String']['output']>;
  readonly check: Scalars['String']['output'];
  readonly combination: Scalars['String']['output'];
  readonly utilisation: Scalars['Float']['output'];
};

/** Counts over all caps of an assessment, and where the utilisation is largest. */
export type CapAggregates = {
  readonly __typename?: 'CapAggregates';
  readonly byCheck: ReadonlyArray<CapAggregate>;
  readonly byGround: ReadonlyArray<CapAggregate>;
  readonly byPileType: ReadonlyArray<CapAggregate>;
};

export type CapAggregate = {
  readonly __typename?: 'CapAggregate';
  /** The kind of check, the ground profile or the pile type. */
  readonly name: Scalars['String']['output'];
  readonly count: Scalars['Int']['output'];
  readonly exceeded: Scalars['Int']['output'];
  readonly largestUtilisation?: Maybe<Scalars['Float']['output']>;
  /** Mark of the cap, and the combination, of the largest utilisation. */
  readonly cap: Scalars['String']['output'];
  readonly combination?: Maybe<Scalars['String']['output']>;
};

export type CapConnection = {
  readonly __typename?: 'CapConnection';
  readonly nodes: ReadonlyArray<Cap>;
  readonly edges: ReadonlyArray<CapEdge>;
  readonly pageInfo: PageInfo;
  readonly totalCount: Scalars['Int']['output'];
};

export type CapEdge = {
  readonly __typename?: 'CapEdge';
  readonly cursor: Scalars['String']['output'];
  readonly node: Cap;
};

export type Cap = {
  readonly __typename?: 'Cap';
  readonly mark: Scalars['String']['output'];
  readonly ground: Scalars['String']['output'];
  readonly pileType: Scalars['String']['output'];
  readonly pileCount: Scalars['Int']['output'];
  /** m */
  readonly x: Scalars['Float']['output'];
  /** m */
  readonly y: Scalars['Float']['output'];
  readonly governingCheck?: Maybe<Scalars['String']['output']>;
  readonly governingCombination?: Maybe<Scalars['String']['output']>;
  /** Largest of its checks. */
  readonly utilisation?: Maybe<Scalars['Float']['output']>;
  readonly exceeded: Scalars['Boolean']['output'];
  /** mm, largest over the combinations */
  readonly settlement?: Maybe<Scalars['Float']['output']>;
  /** Largest over the combinations. */
  readonly tilt?: Maybe<Scalars['Float']['output']>;
  /** kN/m */
  readonly verticalStiffness: Scalars['Float']['output'];
  /** kN.m/rad */
  readonly rockingStiffnessAlongX: Scalars['Float']['output'];
  /** kN.m/rad */
  readonly rockingStiffnessAlongY: Scalars['Float']['output'];
  /** The largest utilisation first. */
  readonly checks: ReadonlyArray<Check>;
  /** The steps behind every number of this cap; its pointers lead into the result of the assessment. */
  readonly trace?: Maybe<Trace>;
};

export type Check = {
  readonly __typename?: 'Check';
  readonly check: Scalars['String']['output'];
  readonly combination: Scalars['String']['output'];
  /** ultimate | working | serviceability */
  readonly limitState: Scalars['String']['output'];
  /** kN, mm or ratio, by check */
  readonly demand: Scalars['Float']['output'];
  /** In the unit of the demand. */
  readonly resistance: Scalars['Float']['output'];
  readonly utilisation: Scalars['Float']['output'];
  readonly satisfied: Scalars['Boolean']['output'];
  /** Number of the pile, from 0. */
  readonly pile?: Maybe<Scalars['Int']['output']>;
};

export type NeighbourConnection = {
  readonly __typename?: 'NeighbourConnection';
  readonly nodes: ReadonlyArray<Neighbours>;
  readonly edges: ReadonlyArray<NeighbourEdge>;
  readonly pageInfo: PageInfo;
  readonly totalCount: Scalars['Int']['output'];
};

export type NeighbourEdge = {
  readonly __typename?: 'NeighbourEdge';
  readonly cursor: Scalars['String']['output'];
  readonly node: Neighbours;
};

/** Two neighbouring caps. */
export type Neighbours = {
  readonly __typename?: 'Neighbours';
  readonly a: Scalars['String']['output'];
  readonly b: Scalars['String']['output'];
  /** m */
  readonly distance: Scalars['Float']['output'];
  readonly combination: Scalars['String']['output'];
  /** mm */
  readonly differentialSettlement: Scalars['Float']['output'];
  readonly angularDistortion: Scalars['Float']['output'];
  /** Only where the schedule has a limit. */
  readonly utilisation?: Maybe<Scalars['Float']['output']>;
  readonly satisfied?: Maybe<Scalars['Boolean']['output']>;
};

export type Signature = {
  readonly __typename?: 'Signature';
  readonly id: Scalars['ID']['output'];
  readonly assessment: Scalars['ID']['output'];
  readonly ordinal: Scalars['Int']['output'];
  /** originator | checker | approver */
  readonly role: Scalars['String']['output'];
  readonly meaning: Scalars['String']['output'];
  readonly actor: Scalars['String']['output'];
  readonly actorKey?: Maybe<Scalars['String']['output']>;
  readonly signedAt: Scalars['String']['output'];
  readonly signedHash: Scalars['String']['output'];
  readonly previousHash: Scalars['String']['output'];
  readonly signatureHash: Scalars['String']['output'];
};

/** What differs between two revisions. Everything that is the same on both sides is left out. */
export type Changes = {
  readonly __typename?: 'Changes';
  readonly before: Assessment;
  readonly after: Assessment;
  readonly counts: ChangeCounts;
  /** Checks whose verdict turned, of a cap or of a pair of neighbours; those now exceeded first. */
  readonly verdicts: ReadonlyArray<TurnedVerdict>;
  readonly caps: ReadonlyArray<CapChange>;
  readonly added: ReadonlyArray<LoneCap>;
  readonly gone: ReadonlyArray<LoneCap>;
  readonly neighbours: ReadonlyArray<NeighbourChange>;
  readonly inputs: ReadonlyArray<InputChange>;
};

/** Of all changes, also where a list is cut. */
export type ChangeCounts = {
  readonly __typename?: 'ChangeCounts';
  readonly turnedExceeded: Scalars['Int']['output'];
  readonly turnedSatisfied: Scalars['Int']['output'];
  readonly caps: Scalars['Int']['output'];
  readonly added: Scalars['Int']['output'];
  readonly gone: Scalars['Int']['output'];
  readonly neighbours: Scalars['Int']['output'];
  /** Changed values of the schedule by part: { reaction: 3 }. */
  readonly inputs: Scalars['JSON']['output'];
};

export type Verdict = {
  readonly __typename?: 'Verdict';
  readonly combination: Scalars['String']['output'];
  readonly utilisation: Scalars['Float']['output'];
  readonly satisfied: Scalars['Boolean']['output'];
};

export type GoverningCheck = {
  readonly __typename?: 'GoverningCheck';
  readonly check: Scalars['String']['output'];
  readonly combination: Scalars['String']['output'];
  readonly utilisation: Scalars['Float']['output'];
  readonly satisfied: Scalars['Boolean']['output'];
};

export type TurnedVerdict = {
  readonly __typename?: 'TurnedVerdict';
  readonly cap?: Maybe<Scalars['String']['output']>;
  readonly a?: Maybe<Scalars['String']['output']>;
  readonly b?: Maybe<Scalars['String']['output']>;
  readonly check: Scalars['String']['output'];
  readonly before?: Maybe<Verdict>;
  readonly after?: Maybe<Verdict>;
  /** Utilisation after less before. */
  readonly by?: Maybe<Scalars['Float']['output']>;
  /** exceeded | satisfied */
  readonly turned: Scalars['String']['output'];
};

export type CapChange = {
  readonly __typename?: 'CapChange';
  readonly mark: Scalars['String']['output'];
  /** Into schedule and result. */
  readonly pointer: PointerPair;
  /** Where the verdict of the whole cap turned: exceeded | satisfied. */
  readonly turned?: Maybe<Scalars['String']['output']>;
  readonly governing: GoverningPair;
  readonly governingChanged: Scalars['Boolean']['output'];
  /** Utilisation after less before. */
  readonly by?: Maybe<Scalars['Float']['output']>;
  /** Those that changed. */
  readonly checks: ReadonlyArray<CheckChange>;
  /** mm, largest over the combinations */
  readonly settlement?: Maybe<Figure>;
  /** kN/m */
  readonly verticalStiffness?: Maybe<Figure>;
};

export type PointerPair = {
  readonly __typename?: 'PointerPair';
  readonly before?: Maybe<Scalars['String']['output']>;
  readonly after?: Maybe<Scalars['String']['output']>;
};

export type GoverningPair = {
  readonly __typename?: 'GoverningPair';
  readonly before?: Maybe<GoverningCheck>;
  readonly after?: Maybe<GoverningCheck>;
};

export type CheckChange = {
  readonly __typename?: 'CheckChange';
  readonly check: Scalars['String']['output'];
  readonly before?: Maybe<Verdict>;
  readonly after?: Maybe<Verdict>;
  /** Utilisation after less before. */
  readonly by?: Maybe<Scalars['Float']['output']>;
};

export type Figure = {
  readonly __typename?: 'Figure';
  readonly before?: Maybe<Scalars['Float']['output']>;
  readonly after?: Maybe<Scalars['Float']['output']>;
  readonly by?: Maybe<Scalars['Float']['output']>;
};

/** A cap of one side only. */
export type LoneCap = {
  readonly __typename?: 'LoneCap';
  readonly mark: Scalars['String']['output'];
  /** Into the schedule that has it. */
  readonly pointer: Scalars['String']['output'];
  readonly exceeded: Scalars['Boolean']['output'];
  readonly governing?: Maybe<GoverningCheck>;
};

export type NeighbourChange = {
  readonly __typename?: 'NeighbourChange';
  readonly a: Scalars['String']['output'];
  readonly b: Scalars['String']['output'];
  readonly check: Scalars['String']['output'];
  readonly before?: Maybe<Verdict>;
  readonly after?: Maybe<Verdict>;
  /** Utilisation after less before. */
  readonly by?: Maybe<Scalars['Float']['output']>;
  readonly angularDistortion: Figure;
};

/** One value of the schedule that changed. */
export type InputChange = {
  readonly __typename?: 'InputChange';
  /** reaction | combination | signs | ground | pile-type | cap | layout | limit | method | design-basis | title */
  readonly part: Scalars['String']['output'];
  /** Mark, ground profile, pile type or combination; empty: of the whole schedule. */
  readonly name: Scalars['String']['output'];
  readonly combination?: Maybe<Scalars['String']['output']>;
  readonly layer?: Maybe<Scalars['String']['output']>;
  /** Into the schedule of each side. */
  readonly pointer: PointerPair;
  readonly field: Scalars['String']['output'];
  readonly before?: Maybe<Scalars['JSON']['output']>;
  readonly after?: Maybe<Scalars['JSON']['output']>;
  /** After less before. */
  readonly by?: Maybe<Scalars['Float']['output']>;
  readonly unit?: Maybe<Scalars['String']['output']>;
};

export type JobState =
  | 'queued'
  | 'running'
  | 'failed'
  | 'cancelled';

export type JobConnection = {
  readonly __typename?: 'JobConnection';
  readonly nodes: ReadonlyArray<Job>;
  readonly edges: ReadonlyArray<JobEdge>;
  readonly pageInfo: PageInfo;
  readonly totalCount: Scalars['Int']['output'];
};

export type JobEdge = {
  readonly __typename?: 'JobEdge';
  readonly cursor: Scalars['String']['output'];
  readonly node: Job;
};

/** An assessment that is no record yet, or never will be; this is kept for 30 days. */
export type Job = {
  readonly __typename?: 'Job';
  /** Of the record to come. */
  readonly id: Scalars['ID']['output'];
  /** Slug of its project. */
  readonly projectSlug: Scalars['String']['output'];
  /** queued | running | failed | cancelled */
  readonly state: Scalars['String']['output'];
  readonly createdAt: Scalars['String']['output'];
  /** When it was begun last. */
  readonly startedAt?: Maybe<Scalars['String']['output']>;
  readonly finishedAt?: Maybe<Scalars['String']['output']>;
  readonly actor: Scalars['String']['output'];
  readonly actorKey?: Maybe<Scalars['String']['output']>;
  /** How often it was begun. */
  readonly attempts: Scalars['Int']['output'];
  /** Caps that are through. */
  readonly done: Scalars['Int']['output'];
  /** Of so many; null until the schedule has been read. */
  readonly caps?: Maybe<Scalars['Int']['output']>;
  /** Why there is no record: a problem document. */
  readonly problem?: Maybe<Scalars['JSON']['output']>;
};



export type ResolverTypeWrapper<T> = Promise<T> | T;


export type ResolverWithResolve<TResult, TParent, TContext, TArgs> = {
  resolve: ResolverFn<TResult, TParent, TContext, TArgs>;
};
export type Resolver<TResult, TParent = Record<PropertyKey, never>, TContext = Record<PropertyKey, never>, TArgs = Record<PropertyKey, never>> = ResolverFn<TResult, TParent, TContext, TArgs> | ResolverWithResolve<TResult, TParent, TContext, TArgs>;

export type ResolverFn<TResult, TParent, TContext, TArgs> = (
  parent: TParent,
  args: TArgs,
  context: TContext,
  info: GraphQLResolveInfo
) => Promise<TResult> | TResult;

export type SubscriptionSubscribeFn<TResult, TParent, TContext, TArgs> = (
  parent: TParent,
  args: TArgs,
  context: TContext,
  info: GraphQLResolveInfo
) => AsyncIterable<TResult> | Promise<AsyncIterable<TResult>>;

export type SubscriptionResolveFn<TResult, TParent, TContext, TArgs> = (
  parent: TParent,
  args: TArgs,
  context: TContext,
  info: GraphQLResolveInfo
) => TResult | Promise<TResult>;

export interface SubscriptionSubscriberObject<TResult, TKey extends string, TParent, TContext, TArgs> {
  subscribe: SubscriptionSubscribeFn<{ [key in TKey]: TResult }, TParent, TContext, TArgs>;
  resolve?: SubscriptionResolveFn<TResult, { [key in TKey]: TResult }, TContext, TArgs>;
}

export interface SubscriptionResolverObject<TResult, TParent, TContext, TArgs> {
  subscribe: SubscriptionSubscribeFn<any, TParent, TContext, TArgs>;
  resolve: SubscriptionResolveFn<TResult, any, TContext, TArgs>;
}

export type SubscriptionObject<TResult, TKey extends string, TParent, TContext, TArgs> =
  | SubscriptionSubscriberObject<TResult, TKey, TParent, TContext, TArgs>
  | SubscriptionResolverObject<TResult, TParent, TContext, TArgs>;

export type SubscriptionResolver<TResult, TKey extends string, TParent = Record<PropertyKey, never>, TContext = Record<PropertyKey, never>, TArgs = Record<PropertyKey, never>> =
  | ((...args: any[]) => SubscriptionObject<TResult, TKey, TParent, TContext, TArgs>)
  | SubscriptionObject<TResult, TKey, TParent, TContext, TArgs>;

export type TypeResolveFn<TTypes, TParent = Record<PropertyKey, never>, TContext = Record<PropertyKey, never>> = (
  parent: TParent,
  context: TContext,
  info: GraphQLResolveInfo
) => Maybe<TTypes> | Promise<Maybe<TTypes>>;

export type IsTypeOfResolverFn<T = Record<PropertyKey, never>, TContext = Record<PropertyKey, never>> = (obj: T, context: TContext, info: GraphQLResolveInfo) => boolean | Promise<boolean>;

export type NextResolverFn<T> = () => Promise<T>;

export type DirectiveResolverFn<TResult = Record<PropertyKey, never>, TParent = Record<PropertyKey, never>, TContext = Record<PropertyKey, never>, TArgs = Record<PropertyKey, never>> = (
  next: NextResolverFn<TResult>,
  parent: TParent,
  args: TArgs,
  context: TContext,
  info: GraphQLResolveInfo
) => TResult | Promise<TResult>;




/** Mapping of interface types */
export type ResolversInterfaceTypes<_RefType extends Record<string, unknown>> = {
  Answer:
    | ( SinglePileAnswer )
    | ( BlockAnswer )
    | ( GroupAnswer )
    | ( SettlementAnswer )
  ;
};

/** Mapping between all available schema types and the resolvers types */
export type ResolversTypes = {
  Quantity: ResolverTypeWrapper<Scalars['Quantity']['output']>;
  Varying: ResolverTypeWrapper<Scalars['Varying']['output']>;
  Count: ResolverTypeWrapper<Scalars['Count']['output']>;
  MethodChoice: ResolverTypeWrapper<Scalars['MethodChoice']['output']>;
  JSON: ResolverTypeWrapper<Scalars['JSON']['output']>;
  Query: ResolverTypeWrapper<Record<PropertyKey, never>>;
  Int: ResolverTypeWrapper<Scalars['Int']['output']>;
  String: ResolverTypeWrapper<Scalars['String']['output']>;
  Boolean: ResolverTypeWrapper<Scalars['Boolean']['output']>;
  ID: ResolverTypeWrapper<Scalars['ID']['output']>;
  Subscription: ResolverTypeWrapper<Record<PropertyKey, never>>;
  AssessmentProgress: ResolverTypeWrapper<AssessmentProgress>;
  SinglePileRequestInput: SinglePileRequestInput;
  GroupRequestInput: GroupRequestInput;
  SettlementRequestInput: SettlementRequestInput;
  FailureRatioInput: FailureRatioInput;
  PileTypeInput: PileTypeInput;
  SectionResistanceInput: SectionResistanceInput;
  SectionInput: SectionInput;
  GroundProfileInput: GroundProfileInput;
  LayerInput: LayerInput;
  LayoutInput: LayoutInput;
  PointInput: PointInput;
  LoadInput: LoadInput;
  MethodChoicesInput: MethodChoicesInput;
  UpliftRatioInput: UpliftRatioInput;
  DesignBasisInput: DesignBasisInput;
  SplitInput: SplitInput;
  CharacteristicInput: CharacteristicInput;
  Answer: ResolverTypeWrapper<ResolversInterfaceTypes<ResolversTypes>['Answer']>;
  Meta: ResolverTypeWrapper<Meta>;
  Notice: ResolverTypeWrapper<Notice>;
  SinglePileAnswer: ResolverTypeWrapper<SinglePileAnswer>;
  BlockAnswer: ResolverTypeWrapper<BlockAnswer>;
  GroupAnswer: ResolverTypeWrapper<GroupAnswer>;
  SettlementAnswer: ResolverTypeWrapper<SettlementAnswer>;
  SinglePileResult: ResolverTypeWrapper<SinglePileResult>;
  Float: ResolverTypeWrapper<Scalars['Float']['output']>;
  LayerResistance: ResolverTypeWrapper<LayerResistance>;
  BlockResult: ResolverTypeWrapper<BlockResult>;
  GroupResult: ResolverTypeWrapper<GroupResult>;
  SettlementResult: ResolverTypeWrapper<SettlementResult>;
  SinglePileSettlement: ResolverTypeWrapper<SinglePileSettlement>;
  CurvePoint: ResolverTypeWrapper<CurvePoint>;
  AxialLoad: ResolverTypeWrapper<AxialLoad>;
  GroupSettlement: ResolverTypeWrapper<GroupSettlement>;
  Tilt: ResolverTypeWrapper<Tilt>;
  PileSettlement: ResolverTypeWrapper<PileSettlement>;
  GroupStiffness: ResolverTypeWrapper<GroupStiffness>;
  CapMatrices: ResolverTypeWrapper<CapMatrices>;
  Trace: ResolverTypeWrapper<Trace>;
  Step: ResolverTypeWrapper<Step>;
  SolutionTable: ResolverTypeWrapper<SolutionTable>;
  TableColumn: ResolverTypeWrapper<TableColumn>;
  Operand: ResolverTypeWrapper<Operand>;
  StepRange: ResolverTypeWrapper<StepRange>;
  Unknown: ResolverTypeWrapper<Unknown>;
  Residual: ResolverTypeWrapper<Residual>;
  Citation: ResolverTypeWrapper<Citation>;
  Source: ResolverTypeWrapper<Source>;
  Method: ResolverTypeWrapper<Method>;
  MethodParameter: ResolverTypeWrapper<MethodParameter>;
  MethodFormula: ResolverTypeWrapper<MethodFormula>;
  Limits: ResolverTypeWrapper<Limits>;
  AssessmentOrder: AssessmentOrder;
  CapOrder: CapOrder;
  NeighbourOrder: NeighbourOrder;
  PageInfo: ResolverTypeWrapper<PageInfo>;
  ProjectConnection: ResolverTypeWrapper<ProjectConnectionNode>;
  ProjectEdge: ResolverTypeWrapper<Omit<ProjectEdge, 'node'> & { node: ResolversTypes['Project'] }>;
  Project: ResolverTypeWrapper<ShownProject>;
  AssessmentConnection: ResolverTypeWrapper<AssessmentConnectionNode>;
  AssessmentEdge: ResolverTypeWrapper<Omit<AssessmentEdge, 'node'> & { node: ResolversTypes['Assessment'] }>;
  AssessmentAggregates: ResolverTypeWrapper<AssessmentAggregates>;
  WorstCheckAggregate: ResolverTypeWrapper<WorstCheckAggregate>;
  Assessment: ResolverTypeWrapper<ShownRecord>;
  Summary: ResolverTypeWrapper<Summary>;
  KindOfCheck: ResolverTypeWrapper<KindOfCheck>;
  WorstCheck: ResolverTypeWrapper<WorstCheck>;
  CapAggregates: ResolverTypeWrapper<AggregateNode>;
  CapAggregate: ResolverTypeWrapper<CapAggregate>;
  CapConnection: ResolverTypeWrapper<CapConnectionNode>;
  CapEdge: ResolverTypeWrapper<Omit<CapEdge, 'node'> & { node: ResolversTypes['Cap'] }>;
  Cap: ResolverTypeWrapper<CapNode>;
  Check: ResolverTypeWrapper<Check>;
  NeighbourConnection: ResolverTypeWrapper<NeighbourConnectionNode>;
  NeighbourEdge: ResolverTypeWrapper<NeighbourEdge>;
  Neighbours: ResolverTypeWrapper<Neighbours>;
  Signature: ResolverTypeWrapper<Signature>;
  Changes: ResolverTypeWrapper<ToldChanges>;
  ChangeCounts: ResolverTypeWrapper<ChangeCounts>;
  Verdict: ResolverTypeWrapper<Verdict>;
  GoverningCheck: ResolverTypeWrapper<GoverningCheck>;
  TurnedVerdict: ResolverTypeWrapper<TurnedVerdict>;
  CapChange: ResolverTypeWrapper<CapChange>;
  PointerPair: ResolverTypeWrapper<PointerPair>;
  GoverningPair: ResolverTypeWrapper<GoverningPair>;
  CheckChange: ResolverTypeWrapper<CheckChange>;
  Figure: ResolverTypeWrapper<Figure>;
  LoneCap: ResolverTypeWrapper<LoneCap>;
  NeighbourChange: ResolverTypeWrapper<NeighbourChange>;
  InputChange: ResolverTypeWrapper<InputChange>;
  JobState: JobState;
  JobConnection: ResolverTypeWrapper<JobConnectionNode>;
  JobEdge: ResolverTypeWrapper<Omit<JobEdge, 'node'> & { node: ResolversTypes['Job'] }>;
  Job: ResolverTypeWrapper<ShownJob>;
};

/** Mapping between all available schema types and the resolvers parents */
export type ResolversParentTypes = {
  Quantity: Scalars['Quantity']['output'];
  Varying: Scalars['Varying']['output'];
  Count: Scalars['Count']['output'];
  MethodChoice: Scalars['MethodChoice']['output'];
  JSON: Scalars['JSON']['output'];
  Query: Record<PropertyKey, never>;
  Int: Scalars['Int']['output'];
  String: Scalars['String']['output'];
  Boolean: Scalars['Boolean']['output'];
  ID: Scalars['ID']['output'];
  Subscription: Record<PropertyKey, never>;
  AssessmentProgress: AssessmentProgress;
  SinglePileRequestInput: SinglePileRequestInput;
  GroupRequestInput: GroupRequestInput;
  SettlementRequestInput: SettlementRequestInput;
  FailureRatioInput: FailureRatioInput;
  PileTypeInput: PileTypeInput;
  SectionResistanceInput: SectionResistanceInput;
  SectionInput: SectionInput;
  GroundProfileInput: GroundProfileInput;
  LayerInput: LayerInput;
  LayoutInput: LayoutInput;
  PointInput: PointInput;
  LoadInput: LoadInput;
  MethodChoicesInput: MethodChoicesInput;
  UpliftRatioInput: UpliftRatioInput;
  DesignBasisInput: DesignBasisInput;
  SplitInput: SplitInput;
  CharacteristicInput: CharacteristicInput;
  Answer: ResolversInterfaceTypes<ResolversParentTypes>['Answer'];
  Meta: Meta;
  Notice: Notice;
  SinglePileAnswer: SinglePileAnswer;
  BlockAnswer: BlockAnswer;
  GroupAnswer: GroupAnswer;
  SettlementAnswer: SettlementAnswer;
  SinglePileResult: SinglePileResult;
  Float: Scalars['Float']['output'];
  LayerResistance: LayerResistance;
  BlockResult: BlockResult;
  GroupResult: GroupResult;
  SettlementResult: SettlementResult;
  SinglePileSettlement: SinglePileSettlement;
  CurvePoint: CurvePoint;
  AxialLoad: AxialLoad;
  GroupSettlement: GroupSettlement;
  Tilt: Tilt;
  PileSettlement: PileSettlement;
  GroupStiffness: GroupStiffness;
  CapMatrices: CapMatrices;
  Trace: Trace;
  Step: Step;
  SolutionTable: SolutionTable;
  TableColumn: TableColumn;
  Operand: Operand;
  StepRange: StepRange;
  Unknown: Unknown;
  Residual: Residual;
  Citation: Citation;
  Source: Source;
  Method: Method;
  MethodParameter: MethodParameter;
  MethodFormula: MethodFormula;
  Limits: Limits;
  PageInfo: PageInfo;
  ProjectConnection: ProjectConnectionNode;
  ProjectEdge: Omit<ProjectEdge, 'node'> & { node: ResolversParentTypes['Project'] };
  Project: ShownProject;
  AssessmentConnection: AssessmentConnectionNode;
  AssessmentEdge: Omit<AssessmentEdge, 'node'> & { node: ResolversParentTypes['Assessment'] };
  AssessmentAggregates: AssessmentAggregates;
  WorstCheckAggregate: WorstCheckAggregate;
  Assessment: ShownRecord;
  Summary: Summary;
  KindOfCheck: KindOfCheck;
  WorstCheck: WorstCheck;
  CapAggregates: AggregateNode;
  CapAggregate: CapAggregate;
  CapConnection: CapConnectionNode;
  CapEdge: Omit<CapEdge, 'node'> & { node: ResolversParentTypes['Cap'] };
  Cap: CapNode;
  Check: Check;
  NeighbourConnection: NeighbourConnectionNode;
  NeighbourEdge: NeighbourEdge;
  Neighbours: Neighbours;
  Signature: Signature;
  Changes: ToldChanges;
  ChangeCounts: ChangeCounts;
  Verdict: Verdict;
  GoverningCheck: GoverningCheck;
  TurnedVerdict: TurnedVerdict;
  CapChange: CapChange;
  PointerPair: PointerPair;
  GoverningPair: GoverningPair;
  CheckChange: CheckChange;
  Figure: Figure;
  LoneCap: LoneCap;
  NeighbourChange: NeighbourChange;
  InputChange: InputChange;
  JobConnection: JobConnectionNode;
  JobEdge: Omit<JobEdge, 'node'> & { node: ResolversParentTypes['Job'] };
  Job: ShownJob;
};

export interface QuantityScalarConfig extends GraphQLScalarTypeConfig<ResolversTypes['Quantity'], any> {
  name: 'Quantity';
}

export interface VaryingScalarConfig extends GraphQLScalarTypeConfig<ResolversTypes['Varying'], any> {
  name: 'Varying';
}

export interface CountScalarConfig extends GraphQLScalarTypeConfig<ResolversTypes['Count'], any> {
  name: 'Count';
}

export interface MethodChoiceScalarConfig extends GraphQLScalarTypeConfig<ResolversTypes['MethodChoice'], any> {
  name: 'MethodChoice';
}

export interface JsonScalarConfig extends GraphQLScalarTypeConfig<ResolversTypes['JSON'], any> {
  name: 'JSON';
}

export type QueryResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Query'] = ResolversParentTypes['Query']> = {
  projects?: Resolver<ResolversTypes['ProjectConnection'], ParentType, ContextType, RequireFields<QueryProjectsArgs, 'first'>>;
  project?: Resolver<Maybe<ResolversTypes['Project']>, ParentType, ContextType, RequireFields<QueryProjectArgs, 'slug'>>;
  assessments?: Resolver<ResolversTypes['AssessmentConnection'], ParentType, ContextType, RequireFields<QueryAssessmentsArgs, 'order' | 'first'>>;
  assessment?: Resolver<Maybe<ResolversTypes['Assessment']>, ParentType, ContextType, RequireFields<QueryAssessmentArgs, 'id'>>;
  jobs?: Resolver<ResolversTypes['JobConnection'], ParentType, ContextType, RequireFields<QueryJobsArgs, 'first'>>;
  singlePile?: Resolver<ResolversTypes['SinglePileAnswer'], ParentType, ContextType, RequireFields<QuerySinglePileArgs, 'request'>>;
  block?: Resolver<ResolversTypes['BlockAnswer'], ParentType, ContextType, RequireFields<QueryBlockArgs, 'request'>>;
  group?: Resolver<ResolversTypes['GroupAnswer'], ParentType, ContextType, RequireFields<QueryGroupArgs, 'request'>>;
  settlement?: Resolver<ResolversTypes['SettlementAnswer'], ParentType, ContextType, RequireFields<QuerySettlementArgs, 'request'>>;
  methods?: Resolver<ReadonlyArray<ResolversTypes['Method']>, ParentType, ContextType>;
  method?: Resolver<Maybe<ResolversTypes['Method']>, ParentType, ContextType, RequireFields<QueryMethodArgs, 'id'>>;
  sources?: Resolver<ReadonlyArray<ResolversTypes['Source']>, ParentType, ContextType>;
  limits?: Resolver<ResolversTypes['Limits'], ParentType, ContextType>;
};

export type SubscriptionResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Subscription'] = ResolversParentTypes['Subscription']> = {
  assessmentProgress?: SubscriptionResolver<ResolversTypes['AssessmentProgress'], "assessmentProgress", ParentType, ContextType, RequireFields<SubscriptionAssessmentProgressArgs, 'id'>>;
};

export type AssessmentProgressResolvers<ContextType = Context, ParentType extends ResolversParentTypes['AssessmentProgress'] = ResolversParentTypes['AssessmentProgress']> = {
  id?: Resolver<ResolversTypes['ID'], ParentType, ContextType>;
  state?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  done?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  caps?: Resolver<Maybe<ResolversTypes['Int']>, ParentType, ContextType>;
};

export type AnswerResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Answer'] = ResolversParentTypes['Answer']> = {
  __resolveType: TypeResolveFn<'SinglePileAnswer' | 'BlockAnswer' | 'GroupAnswer' | 'SettlementAnswer', ParentType, ContextType>;
};

export type MetaResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Meta'] = ResolversParentTypes['Meta']> = {
  engine?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  requestHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type NoticeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Notice'] = ResolversParentTypes['Notice']> = {
  code?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  level?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  text?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  pointer?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
};

export type SinglePileAnswerResolvers<ContextType = Context, ParentType extends ResolversParentTypes['SinglePileAnswer'] = ResolversParentTypes['SinglePileAnswer']> = {
  result?: Resolver<ResolversTypes['SinglePileResult'], ParentType, ContextType>;
  notices?: Resolver<ReadonlyArray<ResolversTypes['Notice']>, ParentType, ContextType>;
  trace?: Resolver<Maybe<ResolversTypes['Trace']>, ParentType, ContextType>;
  meta?: Resolver<ResolversTypes['Meta'], ParentType, ContextType>;
  __isTypeOf?: IsTypeOfResolverFn<ParentType, ContextType>;
};

export type BlockAnswerResolvers<ContextType = Context, ParentType extends ResolversParentTypes['BlockAnswer'] = ResolversParentTypes['BlockAnswer']> = {
  result?: Resolver<ResolversTypes['BlockResult'], ParentType, ContextType>;
  notices?: Resolver<ReadonlyArray<ResolversTypes['Notice']>, ParentType, ContextType>;
  trace?: Resolver<Maybe<ResolversTypes['Trace']>, ParentType, ContextType>;
  meta?: Resolver<ResolversTypes['Meta'], ParentType, ContextType>;
  __isTypeOf?: IsTypeOfResolverFn<ParentType, ContextType>;
};

export type GroupAnswerResolvers<ContextType = Context, ParentType extends ResolversParentTypes['GroupAnswer'] = ResolversParentTypes['GroupAnswer']> = {
  result?: Resolver<ResolversTypes['GroupResult'], ParentType, ContextType>;
  notices?: Resolver<ReadonlyArray<ResolversTypes['Notice']>, ParentType, ContextType>;
  trace?: Resolver<Maybe<ResolversTypes['Trace']>, ParentType, ContextType>;
  meta?: Resolver<ResolversTypes['Meta'], ParentType, ContextType>;
  __isTypeOf?: IsTypeOfResolverFn<ParentType, ContextType>;
};

export type SettlementAnswerResolvers<ContextType = Context, ParentType extends ResolversParentTypes['SettlementAnswer'] = ResolversParentTypes['SettlementAnswer']> = {
  result?: Resolver<ResolversTypes['SettlementResult'], ParentType, ContextType>;
  notices?: Resolver<ReadonlyArray<ResolversTypes['Notice']>, ParentType, ContextType>;
  trace?: Resolver<Maybe<ResolversTypes['Trace']>, ParentType, ContextType>;
  meta?: Resolver<ResolversTypes['Meta'], ParentType, ContextType>;
  __isTypeOf?: IsTypeOfResolverFn<ParentType, ContextType>;
};

export type SinglePileResultResolvers<ContextType = Context, ParentType extends ResolversParentTypes['SinglePileResult'] = ResolversParentTypes['SinglePileResult']> = {
  shaftResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  baseResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  ultimateResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  weight?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  designResistance?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  allowableLoad?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  layers?: Resolver<ReadonlyArray<ResolversTypes['LayerResistance']>, ParentType, ContextType>;
  unitBaseResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  toeDepth?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type LayerResistanceResolvers<ContextType = Context, ParentType extends ResolversParentTypes['LayerResistance'] = ResolversParentTypes['LayerResistance']> = {
  name?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  top?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  bottom?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  unitShaftResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  shaftResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type BlockResultResolvers<ContextType = Context, ParentType extends ResolversParentTypes['BlockResult'] = ResolversParentTypes['BlockResult']> = {
  breadth?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  length?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  depth?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  perimeter?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  baseArea?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  sideResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  baseResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  ultimateResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  weight?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  designResistance?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  allowableLoad?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
};

export type GroupResultResolvers<ContextType = Context, ParentType extends ResolversParentTypes['GroupResult'] = ResolversParentTypes['GroupResult']> = {
  pileCount?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  single?: Resolver<ResolversTypes['SinglePileResult'], ParentType, ContextType>;
  sumOfPiles?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  efficiency?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  block?: Resolver<ResolversTypes['BlockResult'], ParentType, ContextType>;
  governing?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  ultimateResistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  designResistance?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  allowableLoad?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
};

export type SettlementResultResolvers<ContextType = Context, ParentType extends ResolversParentTypes['SettlementResult'] = ResolversParentTypes['SettlementResult']> = {
  single?: Resolver<ResolversTypes['SinglePileSettlement'], ParentType, ContextType>;
  group?: Resolver<Maybe<ResolversTypes['GroupSettlement']>, ParentType, ContextType>;
};

export type SinglePileSettlementResolvers<ContextType = Context, ParentType extends ResolversParentTypes['SinglePileSettlement'] = ResolversParentTypes['SinglePileSettlement']> = {
  load?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  settlement?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  stiffness?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  influenceFactor?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  baseLoadShare?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  axial?: Resolver<Maybe<ReadonlyArray<ResolversTypes['AxialLoad']>>, ParentType, ContextType>;
  curve?: Resolver<Maybe<ReadonlyArray<ResolversTypes['CurvePoint']>>, ParentType, ContextType>;
};

export type CurvePointResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CurvePoint'] = ResolversParentTypes['CurvePoint']> = {
  load?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  settlement?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type AxialLoadResolvers<ContextType = Context, ParentType extends ResolversParentTypes['AxialLoad'] = ResolversParentTypes['AxialLoad']> = {
  depth?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  axialLoad?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  shaftStress?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type GroupSettlementResolvers<ContextType = Context, ParentType extends ResolversParentTypes['GroupSettlement'] = ResolversParentTypes['GroupSettlement']> = {
  settlement?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  settlementRatio?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  tilt?: Resolver<ResolversTypes['Tilt'], ParentType, ContextType>;
  piles?: Resolver<ReadonlyArray<ResolversTypes['PileSettlement']>, ParentType, ContextType>;
  stiffness?: Resolver<ResolversTypes['GroupStiffness'], ParentType, ContextType>;
  largest?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  differential?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  curve?: Resolver<Maybe<ReadonlyArray<ResolversTypes['CurvePoint']>>, ParentType, ContextType>;
};

export type TiltResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Tilt'] = ResolversParentTypes['Tilt']> = {
  alongX?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  alongY?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type PileSettlementResolvers<ContextType = Context, ParentType extends ResolversParentTypes['PileSettlement'] = ResolversParentTypes['PileSettlement']> = {
  x?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  y?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  load?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  settlement?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type GroupStiffnessResolvers<ContextType = Context, ParentType extends ResolversParentTypes['GroupStiffness'] = ResolversParentTypes['GroupStiffness']> = {
  vertical?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  rockingAlongX?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  rockingAlongY?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  atOrigin?: Resolver<ResolversTypes['CapMatrices'], ParentType, ContextType>;
};

export type CapMatricesResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CapMatrices'] = ResolversParentTypes['CapMatrices']> = {
  flexibility?: Resolver<ReadonlyArray<ReadonlyArray<ResolversTypes['Float']>>, ParentType, ContextType>;
  stiffness?: Resolver<ReadonlyArray<ReadonlyArray<ResolversTypes['Float']>>, ParentType, ContextType>;
};

export type TraceResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Trace'] = ResolversParentTypes['Trace']> = {
  steps?: Resolver<ReadonlyArray<ResolversTypes['Step']>, ParentType, ContextType>;
  results?: Resolver<ResolversTypes['JSON'], ParentType, ContextType>;
  sources?: Resolver<ReadonlyArray<ResolversTypes['Source']>, ParentType, ContextType>;
};

export type StepResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Step'] = ResolversParentTypes['Step']> = {
  id?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  kind?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  symbol?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  name?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  value?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  unit?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  quantity?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  from?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  default?: Resolver<Maybe<ResolversTypes['Boolean']>, ParentType, ContextType>;
  reason?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  formula?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  operands?: Resolver<Maybe<ReadonlyArray<ResolversTypes['Operand']>>, ParentType, ContextType>;
  source?: Resolver<Maybe<ResolversTypes['Citation']>, ParentType, ContextType>;
  range?: Resolver<Maybe<ReadonlyArray<ResolversTypes['StepRange']>>, ParentType, ContextType>;
  rows?: Resolver<Maybe<ReadonlyArray<ReadonlyArray<ResolversTypes['Float']>>>, ParentType, ContextType>;
  rule?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  chosen?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  method?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  unknowns?: Resolver<Maybe<ReadonlyArray<ResolversTypes['Unknown']>>, ParentType, ContextType>;
  residuals?: Resolver<Maybe<ReadonlyArray<ResolversTypes['Residual']>>, ParentType, ContextType>;
  tolerance?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  mesh?: Resolver<Maybe<ReadonlyArray<ResolversTypes['Float']>>, ParentType, ContextType>;
  table?: Resolver<Maybe<ResolversTypes['SolutionTable']>, ParentType, ContextType>;
};

export type SolutionTableResolvers<ContextType = Context, ParentType extends ResolversParentTypes['SolutionTable'] = ResolversParentTypes['SolutionTable']> = {
  columns?: Resolver<ReadonlyArray<ResolversTypes['TableColumn']>, ParentType, ContextType>;
  rows?: Resolver<ReadonlyArray<ReadonlyArray<ResolversTypes['Float']>>, ParentType, ContextType>;
};

export type TableColumnResolvers<ContextType = Context, ParentType extends ResolversParentTypes['TableColumn'] = ResolversParentTypes['TableColumn']> = {
  symbol?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  unit?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type OperandResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Operand'] = ResolversParentTypes['Operand']> = {
  symbol?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  value?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  unit?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  from?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type StepRangeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['StepRange'] = ResolversParentTypes['StepRange']> = {
  symbol?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  min?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  max?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  inside?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
};

export type UnknownResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Unknown'] = ResolversParentTypes['Unknown']> = {
  symbol?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  value?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  unit?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type ResidualResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Residual'] = ResolversParentTypes['Residual']> = {
  name?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  value?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type CitationResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Citation'] = ResolversParentTypes['Citation']> = {
  key?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  locator?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type SourceResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Source'] = ResolversParentTypes['Source']> = {
  key?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  title?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  author?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  year?: Resolver<Maybe<ResolversTypes['Int']>, ParentType, ContextType>;
  basis?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type MethodResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Method'] = ResolversParentTypes['Method']> = {
  id?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  kind?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  title?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  installations?: Resolver<ReadonlyArray<ResolversTypes['String']>, ParentType, ContextType>;
  needs?: Resolver<ReadonlyArray<ResolversTypes['String']>, ParentType, ContextType>;
  parameters?: Resolver<ReadonlyArray<ResolversTypes['MethodParameter']>, ParentType, ContextType>;
  formulas?: Resolver<ReadonlyArray<ResolversTypes['MethodFormula']>, ParentType, ContextType>;
  validity?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  theory?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  errorBounds?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  source?: Resolver<ResolversTypes['Source'], ParentType, ContextType>;
};

export type MethodParameterResolvers<ContextType = Context, ParentType extends ResolversParentTypes['MethodParameter'] = ResolversParentTypes['MethodParameter']> = {
  key?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  symbol?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  name?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  unit?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  min?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  max?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  required?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
};

export type MethodFormulaResolvers<ContextType = Context, ParentType extends ResolversParentTypes['MethodFormula'] = ResolversParentTypes['MethodFormula']> = {
  symbol?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  name?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  unit?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  formula?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  operands?: Resolver<ResolversTypes['JSON'], ParentType, ContextType>;
  source?: Resolver<ResolversTypes['Citation'], ParentType, ContextType>;
  range?: Resolver<Maybe<ResolversTypes['JSON']>, ParentType, ContextType>;
};

export type LimitsResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Limits'] = ResolversParentTypes['Limits']> = {
  depth?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  aliases?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  tokens?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  cost?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  bodyBytes?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  layers?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  pilesPerCap?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
};

export type PageInfoResolvers<ContextType = Context, ParentType extends ResolversParentTypes['PageInfo'] = ResolversParentTypes['PageInfo']> = {
  hasNextPage?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
  endCursor?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
};

export type ProjectConnectionResolvers<ContextType = Context, ParentType extends ResolversParentTypes['ProjectConnection'] = ResolversParentTypes['ProjectConnection']> = {
  nodes?: Resolver<ReadonlyArray<ResolversTypes['Project']>, ParentType, ContextType>;
  edges?: Resolver<ReadonlyArray<ResolversTypes['ProjectEdge']>, ParentType, ContextType>;
  pageInfo?: Resolver<ResolversTypes['PageInfo'], ParentType, ContextType>;
  totalCount?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
};

export type ProjectEdgeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['ProjectEdge'] = ResolversParentTypes['ProjectEdge']> = {
  cursor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  node?: Resolver<ResolversTypes['Project'], ParentType, ContextType>;
};

export type ProjectResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Project'] = ResolversParentTypes['Project']> = {
  slug?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  title?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  createdAt?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  updatedAt?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  revision?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  latest?: Resolver<Maybe<ResolversTypes['Assessment']>, ParentType, ContextType>;
  assessments?: Resolver<ResolversTypes['AssessmentConnection'], ParentType, ContextType, RequireFields<ProjectAssessmentsArgs, 'order' | 'first'>>;
};

export type AssessmentConnectionResolvers<ContextType = Context, ParentType extends ResolversParentTypes['AssessmentConnection'] = ResolversParentTypes['AssessmentConnection']> = {
  nodes?: Resolver<ReadonlyArray<ResolversTypes['Assessment']>, ParentType, ContextType>;
  edges?: Resolver<ReadonlyArray<ResolversTypes['AssessmentEdge']>, ParentType, ContextType>;
  pageInfo?: Resolver<ResolversTypes['PageInfo'], ParentType, ContextType>;
  totalCount?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  aggregates?: Resolver<ResolversTypes['AssessmentAggregates'], ParentType, ContextType>;
};

export type AssessmentEdgeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['AssessmentEdge'] = ResolversParentTypes['AssessmentEdge']> = {
  cursor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  node?: Resolver<ResolversTypes['Assessment'], ParentType, ContextType>;
};

export type AssessmentAggregatesResolvers<ContextType = Context, ParentType extends ResolversParentTypes['AssessmentAggregates'] = ResolversParentTypes['AssessmentAggregates']> = {
  count?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  exceeded?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  caps?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  capsExceeded?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  largestUtilisation?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  byWorstCheck?: Resolver<ReadonlyArray<ResolversTypes['WorstCheckAggregate']>, ParentType, ContextType>;
};

export type WorstCheckAggregateResolvers<ContextType = Context, ParentType extends ResolversParentTypes['WorstCheckAggregate'] = ResolversParentTypes['WorstCheckAggregate']> = {
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  count?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  exceeded?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  largestUtilisation?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type AssessmentResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Assessment'] = ResolversParentTypes['Assessment']> = {
  id?: Resolver<ResolversTypes['ID'], ParentType, ContextType>;
  projectSlug?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  project?: Resolver<ResolversTypes['Project'], ParentType, ContextType>;
  revision?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  title?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  state?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  createdAt?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  actor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  actorKey?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  engine?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  requestHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  contentHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  traceHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  previousHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  recordHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  summary?: Resolver<ResolversTypes['Summary'], ParentType, ContextType>;
  previous?: Resolver<Maybe<ResolversTypes['Assessment']>, ParentType, ContextType>;
  next?: Resolver<Maybe<ResolversTypes['Assessment']>, ParentType, ContextType>;
  caps?: Resolver<ResolversTypes['CapConnection'], ParentType, ContextType, RequireFields<AssessmentCapsArgs, 'order' | 'first'>>;
  cap?: Resolver<Maybe<ResolversTypes['Cap']>, ParentType, ContextType, RequireFields<AssessmentCapArgs, 'mark'>>;
  neighbours?: Resolver<ResolversTypes['NeighbourConnection'], ParentType, ContextType, RequireFields<AssessmentNeighboursArgs, 'order' | 'first'>>;
  signatures?: Resolver<ReadonlyArray<ResolversTypes['Signature']>, ParentType, ContextType>;
  changes?: Resolver<Maybe<ResolversTypes['Changes']>, ParentType, ContextType, RequireFields<AssessmentChangesArgs, 'first'>>;
  aggregates?: Resolver<ResolversTypes['CapAggregates'], ParentType, ContextType>;
};

export type SummaryResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Summary'] = ResolversParentTypes['Summary']> = {
  caps?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  satisfied?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  exceeded?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  worst?: Resolver<Maybe<ResolversTypes['WorstCheck']>, ParentType, ContextType>;
  checks?: Resolver<ReadonlyArray<ResolversTypes['KindOfCheck']>, ParentType, ContextType>;
};

export type KindOfCheckResolvers<ContextType = Context, ParentType extends ResolversParentTypes['KindOfCheck'] = ResolversParentTypes['KindOfCheck']> = {
  cap?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  neighbour?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  combination?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  utilisation?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  count?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  exceeded?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
};

export type WorstCheckResolvers<ContextType = Context, ParentType extends ResolversParentTypes['WorstCheck'] = ResolversParentTypes['WorstCheck']> = {
  cap?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  neighbour?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  combination?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  utilisation?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
};

export type CapAggregatesResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CapAggregates'] = ResolversParentTypes['CapAggregates']> = {
  byCheck?: Resolver<ReadonlyArray<ResolversTypes['CapAggregate']>, ParentType, ContextType>;
  byGround?: Resolver<ReadonlyArray<ResolversTypes['CapAggregate']>, ParentType, ContextType>;
  byPileType?: Resolver<ReadonlyArray<ResolversTypes['CapAggregate']>, ParentType, ContextType>;
};

export type CapAggregateResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CapAggregate'] = ResolversParentTypes['CapAggregate']> = {
  name?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  count?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  exceeded?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  largestUtilisation?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  cap?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  combination?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
};

export type CapConnectionResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CapConnection'] = ResolversParentTypes['CapConnection']> = {
  nodes?: Resolver<ReadonlyArray<ResolversTypes['Cap']>, ParentType, ContextType>;
  edges?: Resolver<ReadonlyArray<ResolversTypes['CapEdge']>, ParentType, ContextType>;
  pageInfo?: Resolver<ResolversTypes['PageInfo'], ParentType, ContextType>;
  totalCount?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
};

export type CapEdgeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CapEdge'] = ResolversParentTypes['CapEdge']> = {
  cursor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  node?: Resolver<ResolversTypes['Cap'], ParentType, ContextType>;
};

export type CapResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Cap'] = ResolversParentTypes['Cap']> = {
  mark?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  ground?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  pileType?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  pileCount?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  x?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  y?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  governingCheck?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  governingCombination?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  utilisation?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  exceeded?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
  settlement?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  tilt?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  verticalStiffness?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  rockingStiffnessAlongX?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  rockingStiffnessAlongY?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  checks?: Resolver<ReadonlyArray<ResolversTypes['Check']>, ParentType, ContextType>;
  trace?: Resolver<Maybe<ResolversTypes['Trace']>, ParentType, ContextType>;
};

export type CheckResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Check'] = ResolversParentTypes['Check']> = {
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  combination?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  limitState?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  demand?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  resistance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  utilisation?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  satisfied?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
  pile?: Resolver<Maybe<ResolversTypes['Int']>, ParentType, ContextType>;
};

export type NeighbourConnectionResolvers<ContextType = Context, ParentType extends ResolversParentTypes['NeighbourConnection'] = ResolversParentTypes['NeighbourConnection']> = {
  nodes?: Resolver<ReadonlyArray<ResolversTypes['Neighbours']>, ParentType, ContextType>;
  edges?: Resolver<ReadonlyArray<ResolversTypes['NeighbourEdge']>, ParentType, ContextType>;
  pageInfo?: Resolver<ResolversTypes['PageInfo'], ParentType, ContextType>;
  totalCount?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
};

export type NeighbourEdgeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['NeighbourEdge'] = ResolversParentTypes['NeighbourEdge']> = {
  cursor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  node?: Resolver<ResolversTypes['Neighbours'], ParentType, ContextType>;
};

export type NeighboursResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Neighbours'] = ResolversParentTypes['Neighbours']> = {
  a?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  b?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  distance?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  combination?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  differentialSettlement?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  angularDistortion?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  utilisation?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  satisfied?: Resolver<Maybe<ResolversTypes['Boolean']>, ParentType, ContextType>;
};

export type SignatureResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Signature'] = ResolversParentTypes['Signature']> = {
  id?: Resolver<ResolversTypes['ID'], ParentType, ContextType>;
  assessment?: Resolver<ResolversTypes['ID'], ParentType, ContextType>;
  ordinal?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  role?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  meaning?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  actor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  actorKey?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  signedAt?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  signedHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  previousHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  signatureHash?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type ChangesResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Changes'] = ResolversParentTypes['Changes']> = {
  before?: Resolver<ResolversTypes['Assessment'], ParentType, ContextType>;
  after?: Resolver<ResolversTypes['Assessment'], ParentType, ContextType>;
  counts?: Resolver<ResolversTypes['ChangeCounts'], ParentType, ContextType>;
  verdicts?: Resolver<ReadonlyArray<ResolversTypes['TurnedVerdict']>, ParentType, ContextType>;
  caps?: Resolver<ReadonlyArray<ResolversTypes['CapChange']>, ParentType, ContextType>;
  added?: Resolver<ReadonlyArray<ResolversTypes['LoneCap']>, ParentType, ContextType>;
  gone?: Resolver<ReadonlyArray<ResolversTypes['LoneCap']>, ParentType, ContextType>;
  neighbours?: Resolver<ReadonlyArray<ResolversTypes['NeighbourChange']>, ParentType, ContextType>;
  inputs?: Resolver<ReadonlyArray<ResolversTypes['InputChange']>, ParentType, ContextType>;
};

export type ChangeCountsResolvers<ContextType = Context, ParentType extends ResolversParentTypes['ChangeCounts'] = ResolversParentTypes['ChangeCounts']> = {
  turnedExceeded?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  turnedSatisfied?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  caps?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  added?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  gone?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  neighbours?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  inputs?: Resolver<ResolversTypes['JSON'], ParentType, ContextType>;
};

export type VerdictResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Verdict'] = ResolversParentTypes['Verdict']> = {
  combination?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  utilisation?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  satisfied?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
};

export type GoverningCheckResolvers<ContextType = Context, ParentType extends ResolversParentTypes['GoverningCheck'] = ResolversParentTypes['GoverningCheck']> = {
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  combination?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  utilisation?: Resolver<ResolversTypes['Float'], ParentType, ContextType>;
  satisfied?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
};

export type TurnedVerdictResolvers<ContextType = Context, ParentType extends ResolversParentTypes['TurnedVerdict'] = ResolversParentTypes['TurnedVerdict']> = {
  cap?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  a?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  b?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  before?: Resolver<Maybe<ResolversTypes['Verdict']>, ParentType, ContextType>;
  after?: Resolver<Maybe<ResolversTypes['Verdict']>, ParentType, ContextType>;
  by?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  turned?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
};

export type CapChangeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CapChange'] = ResolversParentTypes['CapChange']> = {
  mark?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  pointer?: Resolver<ResolversTypes['PointerPair'], ParentType, ContextType>;
  turned?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  governing?: Resolver<ResolversTypes['GoverningPair'], ParentType, ContextType>;
  governingChanged?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
  by?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  checks?: Resolver<ReadonlyArray<ResolversTypes['CheckChange']>, ParentType, ContextType>;
  settlement?: Resolver<Maybe<ResolversTypes['Figure']>, ParentType, ContextType>;
  verticalStiffness?: Resolver<Maybe<ResolversTypes['Figure']>, ParentType, ContextType>;
};

export type PointerPairResolvers<ContextType = Context, ParentType extends ResolversParentTypes['PointerPair'] = ResolversParentTypes['PointerPair']> = {
  before?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  after?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
};

export type GoverningPairResolvers<ContextType = Context, ParentType extends ResolversParentTypes['GoverningPair'] = ResolversParentTypes['GoverningPair']> = {
  before?: Resolver<Maybe<ResolversTypes['GoverningCheck']>, ParentType, ContextType>;
  after?: Resolver<Maybe<ResolversTypes['GoverningCheck']>, ParentType, ContextType>;
};

export type CheckChangeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['CheckChange'] = ResolversParentTypes['CheckChange']> = {
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  before?: Resolver<Maybe<ResolversTypes['Verdict']>, ParentType, ContextType>;
  after?: Resolver<Maybe<ResolversTypes['Verdict']>, ParentType, ContextType>;
  by?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
};

export type FigureResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Figure'] = ResolversParentTypes['Figure']> = {
  before?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  after?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  by?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
};

export type LoneCapResolvers<ContextType = Context, ParentType extends ResolversParentTypes['LoneCap'] = ResolversParentTypes['LoneCap']> = {
  mark?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  pointer?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  exceeded?: Resolver<ResolversTypes['Boolean'], ParentType, ContextType>;
  governing?: Resolver<Maybe<ResolversTypes['GoverningCheck']>, ParentType, ContextType>;
};

export type NeighbourChangeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['NeighbourChange'] = ResolversParentTypes['NeighbourChange']> = {
  a?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  b?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  check?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  before?: Resolver<Maybe<ResolversTypes['Verdict']>, ParentType, ContextType>;
  after?: Resolver<Maybe<ResolversTypes['Verdict']>, ParentType, ContextType>;
  by?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  angularDistortion?: Resolver<ResolversTypes['Figure'], ParentType, ContextType>;
};

export type InputChangeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['InputChange'] = ResolversParentTypes['InputChange']> = {
  part?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  name?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  combination?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  layer?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  pointer?: Resolver<ResolversTypes['PointerPair'], ParentType, ContextType>;
  field?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  before?: Resolver<Maybe<ResolversTypes['JSON']>, ParentType, ContextType>;
  after?: Resolver<Maybe<ResolversTypes['JSON']>, ParentType, ContextType>;
  by?: Resolver<Maybe<ResolversTypes['Float']>, ParentType, ContextType>;
  unit?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
};

export type JobConnectionResolvers<ContextType = Context, ParentType extends ResolversParentTypes['JobConnection'] = ResolversParentTypes['JobConnection']> = {
  nodes?: Resolver<ReadonlyArray<ResolversTypes['Job']>, ParentType, ContextType>;
  edges?: Resolver<ReadonlyArray<ResolversTypes['JobEdge']>, ParentType, ContextType>;
  pageInfo?: Resolver<ResolversTypes['PageInfo'], ParentType, ContextType>;
  totalCount?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
};

export type JobEdgeResolvers<ContextType = Context, ParentType extends ResolversParentTypes['JobEdge'] = ResolversParentTypes['JobEdge']> = {
  cursor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  node?: Resolver<ResolversTypes['Job'], ParentType, ContextType>;
};

export type JobResolvers<ContextType = Context, ParentType extends ResolversParentTypes['Job'] = ResolversParentTypes['Job']> = {
  id?: Resolver<ResolversTypes['ID'], ParentType, ContextType>;
  projectSlug?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  state?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  createdAt?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  startedAt?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  finishedAt?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  actor?: Resolver<ResolversTypes['String'], ParentType, ContextType>;
  actorKey?: Resolver<Maybe<ResolversTypes['String']>, ParentType, ContextType>;
  attempts?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  done?: Resolver<ResolversTypes['Int'], ParentType, ContextType>;
  caps?: Resolver<Maybe<ResolversTypes['Int']>, ParentType, ContextType>;
  problem?: Resolver<Maybe<ResolversTypes['JSON']>, ParentType, ContextType>;
};

export type Resolvers<ContextType = Context> = {
  Quantity?: GraphQLScalarType;
  Varying?: GraphQLScalarType;
  Count?: GraphQLScalarType;
  MethodChoice?: GraphQLScalarType;
  JSON?: GraphQLScalarType;
  Query?: QueryResolvers<ContextType>;
  Subscription?: SubscriptionResolvers<ContextType>;
  AssessmentProgress?: AssessmentProgressResolvers<ContextType>;
  Answer?: AnswerResolvers<ContextType>;
  Meta?: MetaResolvers<ContextType>;
  Notice?: NoticeResolvers<ContextType>;
  SinglePileAnswer?: SinglePileAnswerResolvers<ContextType>;
  BlockAnswer?: BlockAnswerResolvers<ContextType>;
  GroupAnswer?: GroupAnswerResolvers<ContextType>;
  SettlementAnswer?: SettlementAnswerResolvers<ContextType>;
  SinglePileResult?: SinglePileResultResolvers<ContextType>;
  LayerResistance?: LayerResistanceResolvers<ContextType>;
  BlockResult?: BlockResultResolvers<ContextType>;
  GroupResult?: GroupResultResolvers<ContextType>;
  SettlementResult?: SettlementResultResolvers<ContextType>;
  SinglePileSettlement?: SinglePileSettlementResolvers<ContextType>;
  CurvePoint?: CurvePointResolvers<ContextType>;
  AxialLoad?: AxialLoadResolvers<ContextType>;
  GroupSettlement?: GroupSettlementResolvers<ContextType>;
  Tilt?: TiltResolvers<ContextType>;
  PileSettlement?: PileSettlementResolvers<ContextType>;
  GroupStiffness?: GroupStiffnessResolvers<ContextType>;
  CapMatrices?: CapMatricesResolvers<ContextType>;
  Trace?: TraceResolvers<ContextType>;
  Step?: StepResolvers<ContextType>;
  SolutionTable?: SolutionTableResolvers<ContextType>;
  TableColumn?: TableColumnResolvers<ContextType>;
  Operand?: OperandResolvers<ContextType>;
  StepRange?: StepRangeResolvers<ContextType>;
  Unknown?: UnknownResolvers<ContextType>;
  Residual?: ResidualResolvers<ContextType>;
  Citation?: CitationResolvers<ContextType>;
  Source?: SourceResolvers<ContextType>;
  Method?: MethodResolvers<ContextType>;
  MethodParameter?: MethodParameterResolvers<ContextType>;
  MethodFormula?: MethodFormulaResolvers<ContextType>;
  Limits?: LimitsResolvers<ContextType>;
  PageInfo?: PageInfoResolvers<ContextType>;
  ProjectConnection?: ProjectConnectionResolvers<ContextType>;
  ProjectEdge?: ProjectEdgeResolvers<ContextType>;
  Project?: ProjectResolvers<ContextType>;
  AssessmentConnection?: AssessmentConnectionResolvers<ContextType>;
  AssessmentEdge?: AssessmentEdgeResolvers<ContextType>;
  AssessmentAggregates?: AssessmentAggregatesResolvers<ContextType>;
  WorstCheckAggregate?: WorstCheckAggregateResolvers<ContextType>;
  Assessment?: AssessmentResolvers<ContextType>;
  Summary?: SummaryResolvers<ContextType>;
  KindOfCheck?: KindOfCheckResolvers<ContextType>;
  WorstCheck?: WorstCheckResolvers<ContextType>;
  CapAggregates?: CapAggregatesResolvers<ContextType>;
  CapAggregate?: CapAggregateResolvers<ContextType>;
  CapConnection?: CapConnectionResolvers<ContextType>;
  CapEdge?: CapEdgeResolvers<ContextType>;
  Cap?: CapResolvers<ContextType>;
  Check?: CheckResolvers<ContextType>;
  NeighbourConnection?: NeighbourConnectionResolvers<ContextType>;
  NeighbourEdge?: NeighbourEdgeResolvers<ContextType>;
  Neighbours?: NeighboursResolvers<ContextType>;
  Signature?: SignatureResolvers<ContextType>;
  Changes?: ChangesResolvers<ContextType>;
  ChangeCounts?: ChangeCountsResolvers<ContextType>;
  Verdict?: VerdictResolvers<ContextType>;
  GoverningCheck?: GoverningCheckResolvers<ContextType>;
  TurnedVerdict?: TurnedVerdictResolvers<ContextType>;
  CapChange?: CapChangeResolvers<ContextType>;
  PointerPair?: PointerPairResolvers<ContextType>;
  GoverningPair?: GoverningPairResolvers<ContextType>;
  CheckChange?: CheckChangeResolvers<ContextType>;
  Figure?: FigureResolvers<ContextType>;
  LoneCap?: LoneCapResolvers<ContextType>;
  NeighbourChange?: NeighbourChangeResolvers<ContextType>;
  InputChange?: InputChangeResolvers<ContextType>;
  JobConnection?: JobConnectionResolvers<ContextType>;
  JobEdge?: JobEdgeResolvers<ContextType>;
  Job?: JobResolvers<ContextType>;
};
