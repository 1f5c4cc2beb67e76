/** Rows as PostgreSQL holds them. snake_case never leaves `db/`. */

export interface OrganisationRow {
  id: string;
  slug: string;
  name: string;
  is_demo: boolean;
  created_at: Date;
}

export interface PersonRow {
  id: string;
  email: string;
  name: string;
  password_hash: string | null;
  created_at: Date;
  email_verified_at: Date | null;
  totp_secret: string | null;
  totp_confirmed_at: Date | null;
  totp_last_step: number;
}

export interface MembershipRow {
  organisation_id: string;
  person_id: string;
  role: 'operator' | 'consultant' | 'manager' | 'owner';
  all_plants: boolean;
  created_at: Date;
  left_at: Date | null;
}

export interface MembershipPlantRow {
  organisation_id: string;
  person_id: string;
  plant_id: string;
}

export interface SessionRow {
  session_hash: string;
  person_id: string;
  started_at: Date;
  last_seen_at: Date;
  ended_at: Date | null;
  browser: string;
}

export interface OneTimeTokenRow {
  token_hash: string;
  person_id: string;
  purpose: 'verify-email' | 'reset-password';
  expires_at: Date;
  used_at: Date | null;
  created_at: Date;
}

export interface RecoveryCodeRow {
  person_id: string;
  code_hash: string;
  used_at: Date | null;
}

export interface ExternalIdentityRow {
  identity_hash: string;
  person_id: string;
  provider: string;
  linked_at: Date;
}

export interface InvitationRow {
  id: string;
  organisation_id: string;
  email: string;
  role: MembershipRow['role'];
  plant_ids: string[] | null;
  token_hash: string;
  invited_by: string;
  created_at: Date;
  expires_at: Date;
  accepted_at: Date | null;
  revoked_at: Date | null;
}

export interface ApiTokenRow {
  id: string;
  organisation_id: string;
  name: string;
  prefix: string;
  token_hash: string;
  scopes: string[];
  plant_ids: string[] | null;
  made_by: string;
  created_at: Date;
  expires_at: Date;
  last_used_at: Date | null;
  revoked_at: Date | null;
}

export interface IdempotencyKeyRow {
  organisation_id: string;
  actor_id: string;
  key: string;
  request_hash: string;
  status: number | null;
  body: unknown;
  created_at: Date;
}

export interface FeedLogRow {
  id: string;
  organisation_id: string;
  plant_id: string;
  dosing_point_id: string;
  client_key: string;
  fed_from: Date;
  fed_to: Date;
  product_kg: number;
  water_treated_ml: number | null;
  note: string;
  logged_by: string;
  logged_at: Date;
}

export interface PlantRow {
  id: string;
  organisation_id: string;
  slug: string;
  name: string;
  source_summary: string;
  time_zone: string;
  design_flow_ml_per_d: number;
  position: number;
}

export interface SamplingPointRow {
  id: string;
  organisation_id: string;
  plant_id: string;
  slug: string;
  name: string;
  kind: 'raw' | 'clarified' | 'filtered' | 'finished' | 'network';
  position: number;
  sample_every_h: number | null;
}

export interface PointQuantityRow {
  organisation_id: string;
  point_id: string;
  quantity: string;
  unit: string;
  decimals: number;
  position: number;
  usual_low: number | null;
  usual_high: number | null;
}

export interface TargetRow {
  id: string;
  organisation_id: string;
  point_id: string;
  quantity: string;
  lowest: number | null;
  highest: number | null;
  preferred: number | null;
  basis: string;
  version: number;
  changed_at: Date;
}

export interface TrainStepRow {
  id: string;
  organisation_id: string;
  plant_id: string;
  position: number;
  kind:
    | 'intake'
    | 'aeration'
    | 'rapid-mix'
    | 'clarifier'
    | 'softening'
    | 'recarbonation'
    | 'filter'
    | 'contact-tank'
    | 'clearwell'
    | 'network';
  name: string;
}

export interface DosingPointRow {
  id: string;
  organisation_id: string;
  plant_id: string;
  train_step_id: string;
  position: number;
  reagent: string | null;
  product_name: string;
  dose_basis: string;
}

export interface FeedSettingRow {
  id: string;
  organisation_id: string;
  dosing_point_id: string;
  dose_mg_per_l: number;
  set_by: string;
  set_at: Date;
}

export interface ShiftNoteRow {
  id: string;
  organisation_id: string;
  plant_id: string;
  written_by: string;
  written_at: Date;
  body: string;
}

export interface SampleRow {
  id: string;
  organisation_id: string;
  plant_id: string;
  point_id: string;
  client_key: string;
  taken_at: Date;
  entered_at: Date;
  entered_by: string;
  comment: string;
}

export interface ResultRow {
  organisation_id: string;
  sample_id: string;
  quantity: string;
  entered_text: string;
  entered_unit: string;
  qualifier: '' | '<' | '>' | 'nd' | 'e';
  value: number;
}

export interface SolutionRow {
  sample_id: string;
  organisation_id: string;
  engine_version: string;
  constants_hash: string;
  /** jsonb: sent as JSON text, received parsed. */
  analysis: unknown;
  assumptions: unknown;
  refusal: string | null;
  solved_at: Date;
}

export interface SampleIndexRow {
  organisation_id: string;
  sample_id: string;
  quantity: string;
  value: number;
}

export interface PlanRow {
  id: string;
  organisation_id: string;
  plant_id: string;
  sample_id: string;
  client_key: string;
  status: 'draft';
  target_quantity: string;
  target_value: number;
  engine_version: string;
  constants_hash: string;
  analysis: unknown;
  predicted: unknown;
  reason: string;
  created_by: string;
  created_at: Date;
}

export interface PlanDoseRow {
  organisation_id: string;
  plan_id: string;
  position: number;
  reagent: string;
  dose_mg_per_l: number;
}

export interface AuditEntryRow {
  organisation_id: string;
  position: number;
  at: Date;
  actor_id: string;
  actor_name: string;
  action: string;
  subject_id: string;
  detail: unknown;
  previous_hash: string;
  hash: string;
}
