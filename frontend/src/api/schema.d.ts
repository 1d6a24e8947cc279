type Json<T> = { headers: Record<string, unknown>; content: { 'application/json': T } };
type None = { headers: Record<string, unknown>; content?: never };
type Params<Q, P> = ([Q] extends [never] ? { query?: never } : { query?: Q }) &
  ([P] extends [never] ? { path?: never } : { path: P });
type Failures = {
  400: Json<Problem>;
  401: Json<Problem>;
  403: Json<Problem>;
  404: Json<Problem>;
  409: Json<Problem>;
};
type Get<R, Q = never, P = never> = {
  parameters: Params<Q, P>;
  requestBody?: never;
  responses: { 200: Json<R> } & Failures;
};
type Send<R, B, P = never, S extends number = 200> = {
  parameters: Params<never, P>;
  requestBody: { content: { 'application/json': B } };
  responses: { [K in S]: R extends null ? None : Json<R> } & Failures;
};
type Act<R, P = never, S extends number = 200> = {
  parameters: Params<never, P>;
  requestBody?: never;
  responses: { [K in S]: R extends null ? None : Json<R> } & Failures;
};

interface FieldProblem {
  field: string;
  value?: unknown;
  limit?: string | number;
  message: string;
}
interface Problem {
  statusCode: number;
  code: string;
  message: string;
  errors?: FieldProblem[];
  requestId: string;
  current?: unknown;
}
type Role = 'admin' | 'designer' | 'librarian' | 'purchaser' | 'viewer';
type Permission =
  | 'parts.read'
  | 'parts.edit'
  | 'briefs.read'
  | 'briefs.edit'
  | 'trains.read'
  | 'trains.edit'
  | 'bom.export'
  | 'calc.use'
  | 'people.manage'
  | 'audit.read'
  | 'rules.read';
interface Me {
  id: string;
  name: string;
  email: string;
  roles: Role[];
  permissions: Permission[];
}
interface Welcome {
  demo: boolean;
  accounts: { email: string; name: string; role: string }[];
  password: string | null;
}
interface User {
  id: string;
  name: string;
  email: string;
  roles: Role[];
  active: boolean;
  version: number;
  createdAt: string;
}
type PartKind =
  | 'gear'
  | 'pinion-shaft'
  | 'shaft'
  | 'bearing'
  | 'key'
  | 'retaining-ring'
  | 'seal'
  | 'housing'
  | 'fastener'
  | 'lubricant'
  | 'other';
type PartStanding = 'draft' | 'cleared' | 'withdrawn';
interface Part {
  id: string;
  number: string;
  kind: PartKind;
  description: string;
  standing: PartStanding;
  successorNumber: string | null;
  material: string | null;
  mass: number | null;
  supply: 'made' | 'bought';
  supplier: string | null;
  note: string;
  attributes: Record<string, unknown>;
  computed: GearGeometry | null;
  version: number;
  createdAt: string;
  updatedAt: string;
  updatedBy: string;
}
interface PartInput {
  number?: string;
  kind: PartKind;
  description: string;
  material?: string | null;
  mass?: number | null;
  supply: 'made' | 'bought';
  supplier?: string | null;
  note?: string;
  attributes: Record<string, unknown>;
}
type PartPatch = Partial<Omit<PartInput, 'number' | 'kind'>> & {
  version: number;
  standing?: PartStanding;
  successorNumber?: string | null;
};
interface Facets {
  kinds: { value: PartKind; count: number }[];
  modules: { value: number; count: number }[];
  materials: { value: string; count: number }[];
}
interface Page<T> {
  items: T[];
  total: number;
  page: number;
  size: number;
}
interface PartPage extends Page<Part> {}
interface Change {
  id: string;
  at: string;
  by: string;
  action: string;
  entity: string;
  entityId: string;
  summary: string;
  before: Record<string, unknown> | null;
  after: Record<string, unknown> | null;
}
interface ChangePage extends Page<Change> {}
interface Range {
  min: number;
  max: number;
}
interface Requirement {
  ratio: { target: string; tolerancePercent: number };
  stages: Range;
  teeth: { pinion: Range; wheel: Range };
  modules: number[];
  pressureAngleDeg?: number;
  helixAngleDeg?: number;
  faceWidthFactor?: number;
  shiftPolicy?: 'none' | 'clear-undercut';
  leastContactRatio?: number;
  centreDistanceAllowance?: number;
  undercut?: 'allow' | 'refuse';
  stageRatio?: { min?: number; max?: number };
  envelope?: { length: number; width: number; height: number; wall: number };
  direction?: 'same' | 'opposite' | 'any';
  objective: 'centre-distance' | 'ratio-error' | 'mass';
  limit?: number;
  duty?: { inputSpeed?: number; outputTorque?: number; applicationFactor?: number };
}
interface OptionStage {
  pinionTeeth: number;
  wheelTeeth: number;
  module: number;
  faceWidth: number;
  pinionShift: number;
  wheelShift: number;
  pinionTipDiameter: number;
  wheelTipDiameter: number;
  centreDistance: number;
  contactRatio: number;
  contactRatioWorst: number | null;
}
interface TrainOption {
  key: string;
  stages: OptionStage[];
  ratio: { numerator: string; denominator: string; value: number; errorPercent: number };
  centreDistanceSum: number;
  mass: number;
  box: { length: number; width: number; height: number };
  backlashArcmin: number;
  lossPercent: number | null;
  cost: number | null;
  newParts: number | null;
}
interface WhyNot {
  stages: number;
  limit: string;
  message: string;
  nearest: number | string | null;
  relaxed?: Partial<Requirement>;
}
interface SearchOutcome {
  options: TrainOption[];
  search: { complete: boolean; combinations: number; elapsedMs: number };
  whyNot: WhyNot[];
}
type SearchState = 'queued' | 'running' | 'done' | 'stopped' | 'failed';
interface SearchProgress {
  phase: string;
  stages: number;
  settled: number;
  total: number;
  found: number;
}
interface SearchSummary {
  id: string;
  briefId: string;
  state: SearchState;
  startedAt: string;
  finishedAt: string | null;
  progress: SearchProgress | null;
  message: string | null;
  by: string;
}
interface Search extends SearchSummary {
  request: Requirement;
  outcome: SearchOutcome | null;
}
interface Pin {
  key: string;
  searchId: string;
  option: TrainOption;
  pinnedAt: string;
  by: string;
}
interface BriefSummary {
  id: string;
  code: string;
  title: string;
  owner: string;
  version: number;
  createdAt: string;
  updatedAt: string;
  latestSearch: SearchSummary | null;
}
interface Brief extends BriefSummary {
  note: string;
  requirement: Requirement;
  pins: Pin[];
}
interface BriefPage extends Page<BriefSummary> {}
interface BriefInput {
  title: string;
  note?: string;
  requirement: Requirement;
}
type BriefPatch = Partial<BriefInput> & { version: number };
interface GearGeometry {
  referenceDiameter: number;
  baseDiameter: number;
  tipDiameter: number;
  rootDiameter: number;
  formDiameter: number;
  undercut: boolean;
  leastShiftWithoutUndercut: number;
  tipThickness: number;
  toothThickness: number;
  basePitch: number;
  spanTeeth: number;
  spanLength: number;
}
interface Finding {
  code: string;
  severity: 'fail' | 'marginal' | 'note';
  message: string;
  value?: number;
  limit?: number;
  stage?: number;
}
interface MeshGeometry {
  ratio: number;
  zeroBacklashCentreDistance: number;
  referenceCentreDistance: number;
  centreDistance: number;
  operatingPressureAngleDeg: number;
  tangentPointDistance: number;
  approachLength: number;
  recessLength: number;
  pathOfContact: number;
  basePitch: number;
  contactRatio: number;
  contactRatioIgnoringUndercut: number;
  overlapRatio: number;
  totalContactRatio: number;
  normalBacklash: number;
  circumferentialBacklash: number;
  angularBacklashArcmin: number;
  tipClearancePinion: number;
  tipClearanceWheel: number;
  allowanceAtContactRatioOne: number | null;
  allowanceAtLeastContactRatio: number | null;
  gear: { pinion: GearGeometry; wheel: GearGeometry };
  findings: Finding[];
}
interface SpecGear {
  teeth: number;
  profileShift: number;
  faceWidth: number;
  hand?: 'left' | 'right';
  density?: number;
  partNumber?: string | null;
}
interface TrainSpec {
  pressureAngleDeg: number;
  helixAngleDeg: number;
  target?: { ratio: string; tolerancePercent: number | string };
  leastContactRatio: number;
  inputSpeed?: number;
  inputTorque?: number;
  outputTorque?: number;
  applicationFactor?: number;
  envelope?: { length: number; width: number; height: number; wall: number };
  gap?: number;
  stages: { module: number; centreDistance: number; pinion: SpecGear; wheel: SpecGear }[];
  shafts: { diameter: number | null }[];
}
interface TrainFigures {
  ratio: { numerator: string; denominator: string; value: number; errorPercent: number | null };
  centreDistanceSum: number;
  mass: number;
  box: { length: number; width: number; height: number };
  backlashArcmin: number;
  direction: 'same' | 'opposite';
  shafts: {
    index: number;
    x: number;
    y: number;
    z1: number;
    z2: number;
    speed: number | null;
    torque: number | null;
    power: number | null;
    direction: number;
    leastDiameter: number | null;
  }[];
  meshes: MeshGeometry[];
  findings: Finding[];
  checks: {
    code: string;
    label: string;
    value: number;
    limit: number;
    unit: string;
    verdict: 'passes' | 'marginal' | 'fails';
    stage?: number;
    message: string;
  }[];
}
interface TrainSummary {
  code: string;
  title: string;
  revision: string;
  state: string;
  brief: { id: string; code: string; title: string } | null;
  owner: string;
  version: number;
  createdAt: string;
  updatedAt: string;
  spec: TrainSpec;
}
interface Train extends TrainSummary {
  note: string;
  figures: TrainFigures;
}
interface TrainPage extends Page<TrainSummary> {}
interface TrainInput {
  briefId: string;
  searchId: string;
  optionKey: string;
  title?: string;
}
interface TrainPatch {
  version: number;
  title?: string;
  note?: string;
  stages?: { pinion?: GearChoice; wheel?: GearChoice }[];
  shaftDiameters?: (number | null)[];
}
interface GearChoice {
  partNumber?: string | null;
  hand?: 'left' | 'right';
}
interface BomLine {
  findNumber: string;
  partNumber: string | null;
  kind: string;
  description: string;
  quantity: number;
  unit: 'pcs' | 'l' | 'm';
  material: string;
  supply: 'made' | 'bought';
  supplier: string | null;
  mass: number | null;
  source: string[];
  note: string;
  flags: string[];
}
interface Bom {
  lines: BomLine[];
  totals: { lines: number; made: number; bought: number; massKg: number };
  flags: string[];
}
interface Overview {
  counts: { briefs: number; trains: number; parts: number };
  briefs: BriefSummary[];
  trains: TrainSummary[];
  draftParts: Part[];
}
interface FinderResult {
  parts: { number: string; description: string }[];
  briefs: { id: string; code: string; title: string }[];
  trains: { code: string; title: string }[];
}
interface ListQuery {
  page?: number;
  size?: number;
  sort?: string;
  text?: string;
}
interface PartQuery extends ListQuery {
  kind?: PartKind;
  standing?: PartStanding;
  teethMin?: number;
  teethMax?: number;
  module?: number;
  pressureAngleDeg?: number;
  helixAngleDeg?: number;
  hand?: 'left' | 'right';
  material?: string;
  boreMin?: number;
  boreMax?: number;
  faceWidthMin?: number;
  faceWidthMax?: number;
}

export interface paths {
  '/api/auth/me': { get: Get<Me> };
  '/api/auth/welcome': { get: Get<Welcome> };
  '/api/auth/sign-in': { post: Send<Me, { email: string; password: string }> };
  '/api/auth/sign-out': { post: Act<null, never, 204> };
  '/api/auth/first-admin': {
    post: Send<Me, { token: string; name: string; email: string; password: string }>;
  };
  '/api/users': {
    get: Get<User[]>;
    post: Send<User, { name: string; email: string; password: string; roles: Role[] }, never, 201>;
  };
  '/api/users/{id}': {
    patch: Send<
      User,
      { version: number; name?: string; roles?: Role[]; active?: boolean; password?: string },
      { id: string }
    >;
  };
  '/api/finder': { get: Get<FinderResult, { text: string }> };
  '/api/overview': { get: Get<Overview> };
  '/api/parts': { get: Get<PartPage, PartQuery>; post: Send<Part, PartInput, never, 201> };
  '/api/parts/facets': { get: Get<Facets> };
  '/api/parts/{number}': {
    get: Get<Part, never, { number: string }>;
    patch: Send<Part, PartPatch, { number: string }>;
  };
  '/api/parts/{number}/changes': { get: Get<ChangePage, ListQuery, { number: string }> };
  '/api/briefs': {
    get: Get<BriefPage, ListQuery & { mine?: boolean }>;
    post: Send<Brief, BriefInput, never, 201>;
  };
  '/api/briefs/{id}': {
    get: Get<Brief, never, { id: string }>;
    patch: Send<Brief, BriefPatch, { id: string }>;
  };
  '/api/briefs/{id}/changes': { get: Get<ChangePage, ListQuery, { id: string }> };
  '/api/briefs/{id}/searches': {
    get: Get<SearchSummary[], never, { id: string }>;
    post: Act<Search, { id: string }, 201>;
  };
  '/api/briefs/{id}/pins/{optionKey}': {
    put: Send<Brief, { searchId: string }, { id: string; optionKey: string }>;
    delete: Act<Brief, { id: string; optionKey: string }>;
  };
  '/api/searches/{id}': { get: Get<Search, never, { id: string }> };
  '/api/searches/{id}/stop': { post: Act<null, { id: string }, 202> };
  '/api/trains': {
    get: Get<TrainPage, ListQuery & { mine?: boolean; revisionState?: string }>;
    post: Send<Train, TrainInput, never, 201>;
  };
  '/api/trains/{code}': {
    get: Get<Train, never, { code: string }>;
    patch: Send<Train, TrainPatch, { code: string }>;
  };
  '/api/trains/{code}/bom': { get: Get<Bom, never, { code: string }> };
  '/api/trains/{code}/changes': { get: Get<ChangePage, ListQuery, { code: string }> };
}

export interface components {
  schemas: {
    Me: Me;
    Welcome: Welcome;
    User: User;
    Part: Part;
    PartPage: PartPage;
    PartInput: PartInput;
    PartPatch: PartPatch;
    Facets: Facets;
    Change: Change;
    ChangePage: ChangePage;
    Requirement: Requirement;
    Brief: Brief;
    BriefSummary: BriefSummary;
    BriefPage: BriefPage;
    BriefInput: BriefInput;
    BriefPatch: BriefPatch;
    Search: Search;
    SearchSummary: SearchSummary;
    Pin: Pin;
    TrainOption: TrainOption;
    SearchOutcome: SearchOutcome;
    WhyNot: WhyNot;
    Train: Train;
    TrainSummary: TrainSummary;
    TrainPage: TrainPage;
    TrainInput: TrainInput;
    TrainPatch: TrainPatch;
    TrainFigures: TrainFigures;
    TrainSpec: TrainSpec;
    MeshGeometry: MeshGeometry;
    GearGeometry: GearGeometry;
    Finding: Finding;
    Bom: Bom;
    BomLine: BomLine;
    Overview: Overview;
    FinderResult: FinderResult;
    Problem: Problem;
  };
}
