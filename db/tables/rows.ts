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
  password_hash: string;
  created_at: Date;
}

export interface MembershipRow {
  organisation_id: string;
  person_id: string;
  role: 'operator' | 'consultant' | 'manager' | 'owner';
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
