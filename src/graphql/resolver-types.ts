// Generated from schema/schema.graphql by schema/generate-resolver-types.ts. Do not edit.
// biome-ignore-all lint: generated
// biome-ignore-all format: generated
// biome-ignore-all assist: generated
import type { GraphQLResolveInfo, GraphQLScalarType, GraphQLScalarTypeConfig } from 'graphql';
import type { Context } from './context.ts';
export type Maybe<T> = T | null;
export type InputMaybe<T> = Maybe<T>;
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
  /** Sum of the costs of the fields at the root. */
  readonly cost: Scalars['Int']['output'];
  /** Bytes of a request. */
  readonly bodyBytes: Scalars['Int']['output'];
  /** Layers of a ground profile. */
  readonly layers: Scalars['Int']['output'];
  /** Piles of a layout. */
  readonly pilesPerCap: Scalars['Int']['output'];
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
  String: ResolverTypeWrapper<Scalars['String']['output']>;
  SinglePileRequestInput: SinglePileRequestInput;
  GroupRequestInput: GroupRequestInput;
  SettlementRequestInput: SettlementRequestInput;
  FailureRatioInput: FailureRatioInput;
  PileTypeInput: PileTypeInput;
  SectionResistanceInput: SectionResistanceInput;
  SectionInput: SectionInput;
  GroundProfileInput: GroundProfileInput;
  Boolean: ResolverTypeWrapper<Scalars['Boolean']['output']>;
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
  Int: ResolverTypeWrapper<Scalars['Int']['output']>;
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
};

/** Mapping between all available schema types and the resolvers parents */
export type ResolversParentTypes = {
  Quantity: Scalars['Quantity']['output'];
  Varying: Scalars['Varying']['output'];
  Count: Scalars['Count']['output'];
  MethodChoice: Scalars['MethodChoice']['output'];
  JSON: Scalars['JSON']['output'];
  Query: Record<PropertyKey, never>;
  String: Scalars['String']['output'];
  SinglePileRequestInput: SinglePileRequestInput;
  GroupRequestInput: GroupRequestInput;
  SettlementRequestInput: SettlementRequestInput;
  FailureRatioInput: FailureRatioInput;
  PileTypeInput: PileTypeInput;
  SectionResistanceInput: SectionResistanceInput;
  SectionInput: SectionInput;
  GroundProfileInput: GroundProfileInput;
  Boolean: Scalars['Boolean']['output'];
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
  Int: Scalars['Int']['output'];
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
  singlePile?: Resolver<ResolversTypes['SinglePileAnswer'], ParentType, ContextType, RequireFields<QuerySinglePileArgs, 'request'>>;
  block?: Resolver<ResolversTypes['BlockAnswer'], ParentType, ContextType, RequireFields<QueryBlockArgs, 'request'>>;
  group?: Resolver<ResolversTypes['GroupAnswer'], ParentType, ContextType, RequireFields<QueryGroupArgs, 'request'>>;
  settlement?: Resolver<ResolversTypes['SettlementAnswer'], ParentType, ContextType, RequireFields<QuerySettlementArgs, 'request'>>;
  methods?: Resolver<ReadonlyArray<ResolversTypes['Method']>, ParentType, ContextType>;
  method?: Resolver<Maybe<ResolversTypes['Method']>, ParentType, ContextType, RequireFields<QueryMethodArgs, 'id'>>;
  sources?: Resolver<ReadonlyArray<ResolversTypes['Source']>, ParentType, ContextType>;
  limits?: Resolver<ResolversTypes['Limits'], ParentType, ContextType>;
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

export type Resolvers<ContextType = Context> = {
  Quantity?: GraphQLScalarType;
  Varying?: GraphQLScalarType;
  Count?: GraphQLScalarType;
  MethodChoice?: GraphQLScalarType;
  JSON?: GraphQLScalarType;
  Query?: QueryResolvers<ContextType>;
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
};
