CREATE DOMAIN public.member_role AS text
	CONSTRAINT member_role_check CHECK ((VALUE = ANY (ARRAY['PI'::text, 'computational chemist'::text, 'experimentalist'::text, 'guest'::text])));

CREATE FUNCTION public.account_exists() RETURNS boolean
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select exists (select 1 from users where not demo) $$;

CREATE FUNCTION public.account_for_sign_in(wanted text) RETURNS TABLE(id uuid, name text, email text, password_hash text, demo boolean)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select id, name, email, password_hash, demo from users where email = lower(wanted) $$;

CREATE FUNCTION public.app_group() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select nullif(current_setting('app.group_id', true), '')::uuid $$;

CREATE FUNCTION public.app_token() RETURNS text
    LANGUAGE sql STABLE
    AS $$ select nullif(current_setting('app.token_hash', true), '') $$;

CREATE FUNCTION public.app_user() RETURNS uuid
    LANGUAGE sql STABLE
    AS $$ select nullif(current_setting('app.user_id', true), '')::uuid $$;

CREATE FUNCTION public.count_attempt(wanted text, window_seconds integer) RETURNS integer
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ declare counted integer; begin
              insert into attempts as a (key, count, window_ends_at)
                values (wanted, 1, now() + make_interval(secs => window_seconds))
              on conflict (key) do update set
                count = case when a.window_ends_at < now() then 1 else a.count + 1 end,
                window_ends_at =
                  case when a.window_ends_at < now() then excluded.window_ends_at else a.window_ends_at end
              returning a.count into counted;
              delete from attempts where key in (
                select key from attempts where window_ends_at < now() for update skip locked limit 50);
              return counted;
            end $$;

CREATE FUNCTION public.create_account(new_email text, new_name text, new_hash text, is_demo boolean) RETURNS uuid
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ insert into users (email, name, password_hash, demo)
            values (lower(new_email), new_name, new_hash, is_demo) returning id $$;

CREATE FUNCTION public.end_session(session uuid) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ update sessions set revoked_at = now() where id = session and revoked_at is null $$;

CREATE FUNCTION public.find_password_token(hash text) RETURNS TABLE(user_id uuid, purpose text)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select user_id, purpose from password_tokens
            where token_hash = hash and used_at is null and expires_at > now() $$;

CREATE FUNCTION public.forget_attempts(wanted text) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ delete from attempts where key = wanted $$;

CREATE FUNCTION public.issue_password_token(hash text, person uuid, wanted_purpose text, until timestamp with time zone) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ insert into password_tokens (token_hash, user_id, purpose, expires_at)
            values (hash, person, wanted_purpose, until) $$;

CREATE FUNCTION public.live_session(session uuid) RETURNS TABLE(user_id uuid, name text, email text, demo boolean)
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ with seen as (
              update sessions set seen_at = now()
              where id = session and revoked_at is null and expires_at > now()
                and seen_at < now() - interval '1 minute')
            select u.id, u.name, u.email, u.demo from sessions s join users u on u.id = s.user_id
            where s.id = session and s.revoked_at is null and s.expires_at > now() $$;

CREATE FUNCTION public.set_password(person uuid, new_hash text, kept_session uuid) RETURNS void
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ update users set password_hash = new_hash where id = person;
            update password_tokens set used_at = now() where user_id = person and used_at is null;
            update sessions set revoked_at = now()
              where user_id = person and revoked_at is null and id is distinct from kept_session $$;

CREATE FUNCTION public.start_session(person uuid, agent text, until timestamp with time zone) RETURNS uuid
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ insert into sessions (user_id, user_agent, expires_at) values (person, left(agent, 400), until) returning id $$;

CREATE FUNCTION public.use_password_token(hash text) RETURNS TABLE(user_id uuid, purpose text)
    LANGUAGE sql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ update password_tokens t set used_at = now()
            where t.token_hash = hash and t.used_at is null and t.expires_at > now()
            returning t.user_id, t.purpose $$;

CREATE FUNCTION public.waiting_mails(unchanged_seconds integer) RETURNS TABLE(group_id uuid, outbox_id uuid)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select group_id, id from outbox where kind = 'mail' and sent_at is null
              and created_at < now() - make_interval(secs => unchanged_seconds)
            order by created_at limit 500 $$;

CREATE FUNCTION public.waiting_uploads(unchanged_seconds integer) RETURNS TABLE(group_id uuid, upload_id uuid)
    LANGUAGE sql STABLE SECURITY DEFINER
    SET search_path TO 'public'
    AS $$ select group_id, id from uploads where state in ('queued', 'reading')
              and changed_at < now() - make_interval(secs => unchanged_seconds)
            order by created_at limit 500 $$;

CREATE TABLE public.assignments (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    complex_id uuid NOT NULL,
    candidate_id uuid NOT NULL,
    wording text DEFAULT ''::text NOT NULL,
    confidence text NOT NULL,
    state text NOT NULL,
    proposed_by uuid,
    proposed_at timestamp with time zone DEFAULT now() NOT NULL,
    signed_by uuid,
    signed_at timestamp with time zone,
    snapshot jsonb,
    CONSTRAINT assignments_check CHECK (((state <> 'signed'::text) OR ((signed_by IS NOT NULL) AND (signed_at IS NOT NULL) AND (snapshot IS NOT NULL)))),
    CONSTRAINT assignments_confidence_check CHECK ((confidence = ANY (ARRAY['tentative'::text, 'probable'::text, 'firm'::text]))),
    CONSTRAINT assignments_state_check CHECK ((state = ANY (ARRAY['proposed'::text, 'signed'::text, 'withdrawn'::text, 'superseded'::text]))),
    CONSTRAINT assignments_wording_check CHECK ((length(wording) <= 2000))
);

ALTER TABLE ONLY public.assignments FORCE ROW LEVEL SECURITY;

CREATE TABLE public.attempts (
    key text NOT NULL,
    count integer NOT NULL,
    window_ends_at timestamp with time zone NOT NULL,
    CONSTRAINT attempts_key_check CHECK ((length(key) <= 400))
);

CREATE TABLE public.candidates (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    complex_id uuid NOT NULL,
    geometry text NOT NULL,
    multiplicity integer NOT NULL,
    origin text NOT NULL,
    note text DEFAULT ''::text NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT candidates_geometry_check CHECK ((geometry ~ '^[A-Z]{1,5}-[0-9]{1,2}$'::text)),
    CONSTRAINT candidates_multiplicity_check CHECK (((multiplicity >= 1) AND (multiplicity <= 40))),
    CONSTRAINT candidates_note_check CHECK ((length(note) <= 500)),
    CONSTRAINT candidates_origin_check CHECK ((origin = ANY (ARRAY['planned'::text, 'from a returned output'::text])))
);

ALTER TABLE ONLY public.candidates FORCE ROW LEVEL SECURITY;

CREATE TABLE public.centres (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    structure_id uuid NOT NULL,
    atom_index integer NOT NULL,
    element text NOT NULL,
    coordination_number integer NOT NULL,
    nearest text,
    mean_distance_angstrom double precision,
    baur_distortion double precision,
    tau4 double precision,
    spin_population double precision,
    description jsonb NOT NULL,
    CONSTRAINT centres_atom_index_check CHECK ((atom_index >= 0))
);

ALTER TABLE ONLY public.centres FORCE ROW LEVEL SECURITY;

CREATE TABLE public.complexes (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    study_id uuid NOT NULL,
    "position" integer DEFAULT 0 NOT NULL,
    section text DEFAULT ''::text NOT NULL,
    formula text NOT NULL,
    name text DEFAULT ''::text NOT NULL,
    composition text NOT NULL,
    charge integer NOT NULL,
    metal text NOT NULL,
    oxidation_state integer NOT NULL,
    note text DEFAULT ''::text NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT complexes_charge_check CHECK (((charge >= '-20'::integer) AND (charge <= 20))),
    CONSTRAINT complexes_composition_check CHECK (((length(composition) >= 1) AND (length(composition) <= 200))),
    CONSTRAINT complexes_formula_check CHECK (((length(formula) >= 1) AND (length(formula) <= 200))),
    CONSTRAINT complexes_metal_check CHECK ((metal ~ '^[A-Z][a-z]{0,1}$'::text)),
    CONSTRAINT complexes_name_check CHECK ((length(name) <= 300)),
    CONSTRAINT complexes_note_check CHECK ((length(note) <= 2000)),
    CONSTRAINT complexes_oxidation_state_check CHECK (((oxidation_state >= '-4'::integer) AND (oxidation_state <= 9))),
    CONSTRAINT complexes_section_check CHECK ((length(section) <= 120))
);

ALTER TABLE ONLY public.complexes FORCE ROW LEVEL SECURITY;

CREATE TABLE public.earlier_records (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    run_id uuid NOT NULL,
    reader_version text NOT NULL,
    record jsonb NOT NULL,
    read_at timestamp with time zone NOT NULL
);

ALTER TABLE ONLY public.earlier_records FORCE ROW LEVEL SECURITY;

CREATE TABLE public.events (
    id bigint NOT NULL,
    group_id uuid NOT NULL,
    study_id uuid,
    actor_id uuid,
    subject text NOT NULL,
    subject_id uuid,
    kind text NOT NULL,
    before jsonb,
    after jsonb,
    at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.events FORCE ROW LEVEL SECURITY;

ALTER TABLE public.events ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.events_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.files (
    group_id uuid NOT NULL,
    sha256 text NOT NULL,
    bytes bigint NOT NULL,
    line_index jsonb,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT files_bytes_check CHECK ((bytes >= 0)),
    CONSTRAINT files_sha256_check CHECK ((sha256 ~ '^[0-9a-f]{64}$'::text))
);

ALTER TABLE ONLY public.files FORCE ROW LEVEL SECURITY;

CREATE TABLE public.groups (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    name text NOT NULL,
    demo boolean DEFAULT false NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT groups_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120)))
);

ALTER TABLE ONLY public.groups FORCE ROW LEVEL SECURITY;

CREATE TABLE public.invitations (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    email text NOT NULL,
    role public.member_role NOT NULL,
    token_hash text NOT NULL,
    invited_by uuid NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    accepted_at timestamp with time zone,
    withdrawn_at timestamp with time zone,
    CONSTRAINT invitations_email_check CHECK ((email = lower(email)))
);

ALTER TABLE ONLY public.invitations FORCE ROW LEVEL SECURITY;

CREATE TABLE public.measurements (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    sample_id uuid NOT NULL,
    technique text NOT NULL,
    temperature_k double precision NOT NULL,
    u_temperature_k double precision DEFAULT 0 NOT NULL,
    u_systematic_bohr double precision NOT NULL,
    measured_on date NOT NULL,
    reference text DEFAULT ''::text NOT NULL,
    note text DEFAULT ''::text NOT NULL,
    invented boolean DEFAULT false NOT NULL,
    entered_by uuid,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    withdrawn_at timestamp with time zone,
    withdrawn_because text,
    CONSTRAINT measurements_note_check CHECK ((length(note) <= 2000)),
    CONSTRAINT measurements_reference_check CHECK ((length(reference) <= 500)),
    CONSTRAINT measurements_technique_check CHECK ((technique = ANY (ARRAY['Gouy balance'::text, 'susceptibility balance'::text, 'NMR shift'::text, 'magnetometer'::text, 'paper or another laboratory'::text]))),
    CONSTRAINT measurements_temperature_k_check CHECK (((temperature_k > (0)::double precision) AND (temperature_k < (2000)::double precision))),
    CONSTRAINT measurements_u_systematic_bohr_check CHECK ((u_systematic_bohr >= (0)::double precision)),
    CONSTRAINT measurements_u_temperature_k_check CHECK ((u_temperature_k >= (0)::double precision))
);

ALTER TABLE ONLY public.measurements FORCE ROW LEVEL SECURITY;

CREATE TABLE public.memberships (
    group_id uuid NOT NULL,
    user_id uuid NOT NULL,
    role public.member_role NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.memberships FORCE ROW LEVEL SECURITY;

CREATE TABLE public.migrations (
    id integer NOT NULL,
    name character varying(255),
    batch integer,
    migration_time timestamp with time zone
);

CREATE SEQUENCE public.migrations_id_seq
    AS integer
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1;

ALTER SEQUENCE public.migrations_id_seq OWNED BY public.migrations.id;

CREATE TABLE public.migrations_lock (
    index integer NOT NULL,
    is_locked integer
);

CREATE SEQUENCE public.migrations_lock_index_seq
    AS integer
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1;

ALTER SEQUENCE public.migrations_lock_index_seq OWNED BY public.migrations_lock.index;

CREATE TABLE public.outbox (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    kind text NOT NULL,
    payload jsonb NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    attempts integer DEFAULT 0 NOT NULL,
    sent_at timestamp with time zone,
    CONSTRAINT outbox_kind_check CHECK ((kind = ANY (ARRAY['read upload'::text, 'mail'::text])))
);

ALTER TABLE ONLY public.outbox FORCE ROW LEVEL SECURITY;

CREATE TABLE public.password_tokens (
    token_hash text NOT NULL,
    user_id uuid,
    purpose text NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    used_at timestamp with time zone,
    CONSTRAINT password_tokens_check CHECK (((purpose = 'first PI'::text) OR (user_id IS NOT NULL))),
    CONSTRAINT password_tokens_purpose_check CHECK ((purpose = ANY (ARRAY['reset'::text, 'first PI'::text])))
);

CREATE TABLE public.replicates (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    measurement_id uuid NOT NULL,
    ordinal integer NOT NULL,
    mu_eff_bohr double precision NOT NULL,
    CONSTRAINT replicates_mu_eff_bohr_check CHECK (((mu_eff_bohr >= (0)::double precision) AND (mu_eff_bohr < (30)::double precision))),
    CONSTRAINT replicates_ordinal_check CHECK ((ordinal >= 1))
);

ALTER TABLE ONLY public.replicates FORCE ROW LEVEL SECURITY;

CREATE TABLE public.runs (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    study_id uuid NOT NULL,
    sha256 text NOT NULL,
    file_name text NOT NULL,
    reader_version text NOT NULL,
    complex_id uuid,
    candidate_id uuid,
    matched_by text,
    program text,
    program_version text,
    outcome text NOT NULL,
    formula text,
    charge integer,
    multiplicity integer,
    functional text,
    basis text,
    reference text,
    dispersion text,
    solvation text,
    relativity text,
    tasks text[] DEFAULT '{}'::text[] NOT NULL,
    atom_count integer,
    energy_hartree double precision,
    zero_point_hartree double precision,
    enthalpy_hartree double precision,
    gibbs_hartree double precision,
    s2 double precision,
    s2_ideal double precision,
    scf_converged boolean,
    optimisation_converged boolean,
    imaginary_count integer,
    record jsonb NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    read_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT runs_check CHECK (((complex_id IS NULL) = (matched_by IS NULL))),
    CONSTRAINT runs_check1 CHECK (((candidate_id IS NULL) OR (complex_id IS NOT NULL))),
    CONSTRAINT runs_matched_by_check CHECK ((matched_by = ANY (ARRAY['job key'::text, 'composition'::text, 'hand'::text]))),
    CONSTRAINT runs_outcome_check CHECK ((outcome = ANY (ARRAY['finished'::text, 'failed'::text, 'cut off'::text])))
);

ALTER TABLE ONLY public.runs FORCE ROW LEVEL SECURITY;

CREATE TABLE public.samples (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    complex_id uuid NOT NULL,
    code text NOT NULL,
    description text DEFAULT ''::text NOT NULL,
    created_by uuid,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT samples_code_check CHECK (((length(code) >= 1) AND (length(code) <= 60))),
    CONSTRAINT samples_description_check CHECK ((length(description) <= 1000))
);

ALTER TABLE ONLY public.samples FORCE ROW LEVEL SECURITY;

CREATE TABLE public.sessions (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    user_id uuid NOT NULL,
    user_agent text DEFAULT ''::text NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    seen_at timestamp with time zone DEFAULT now() NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    revoked_at timestamp with time zone,
    CONSTRAINT sessions_user_agent_check CHECK ((length(user_agent) <= 400))
);

CREATE TABLE public.structures (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    study_id uuid NOT NULL,
    run_id uuid,
    sha256 text NOT NULL,
    frame integer DEFAULT 0 NOT NULL,
    complex_id uuid,
    title text DEFAULT ''::text NOT NULL,
    formula text NOT NULL,
    elements text[] NOT NULL,
    positions_angstrom jsonb NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL
);

ALTER TABLE ONLY public.structures FORCE ROW LEVEL SECURITY;

CREATE TABLE public.studies (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    title text NOT NULL,
    question text DEFAULT ''::text NOT NULL,
    notice text DEFAULT ''::text NOT NULL,
    created_by uuid,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT studies_notice_check CHECK ((length(notice) <= 2000)),
    CONSTRAINT studies_question_check CHECK ((length(question) <= 2000)),
    CONSTRAINT studies_title_check CHECK (((length(title) >= 1) AND (length(title) <= 200)))
);

ALTER TABLE ONLY public.studies FORCE ROW LEVEL SECURITY;

CREATE TABLE public.uploads (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    group_id uuid NOT NULL,
    study_id uuid NOT NULL,
    drop_id uuid NOT NULL,
    uploaded_by uuid,
    file_name text NOT NULL,
    sha256 text,
    bytes bigint DEFAULT 0 NOT NULL,
    kind text,
    state text NOT NULL,
    known boolean DEFAULT false NOT NULL,
    problem jsonb,
    bytes_read bigint DEFAULT 0 NOT NULL,
    attempts integer DEFAULT 0 NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    changed_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT uploads_check CHECK (((state = 'refused'::text) OR ((sha256 IS NOT NULL) AND (kind IS NOT NULL)))),
    CONSTRAINT uploads_check1 CHECK (((state <> ALL (ARRAY['refused'::text, 'failed'::text])) OR (problem IS NOT NULL))),
    CONSTRAINT uploads_file_name_check CHECK (((length(file_name) >= 1) AND (length(file_name) <= 500))),
    CONSTRAINT uploads_kind_check CHECK ((kind = ANY (ARRAY['program output'::text, 'xyz'::text, 'csv'::text]))),
    CONSTRAINT uploads_state_check CHECK ((state = ANY (ARRAY['queued'::text, 'reading'::text, 'read'::text, 'failed'::text, 'refused'::text])))
);

ALTER TABLE ONLY public.uploads FORCE ROW LEVEL SECURITY;

CREATE TABLE public.users (
    id uuid DEFAULT gen_random_uuid() NOT NULL,
    email text NOT NULL,
    name text NOT NULL,
    password_hash text,
    demo boolean DEFAULT false NOT NULL,
    created_at timestamp with time zone DEFAULT now() NOT NULL,
    CONSTRAINT users_email_check CHECK (((email = lower(email)) AND (email ~~ '%_@_%'::text) AND (length(email) <= 254))),
    CONSTRAINT users_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120)))
);

ALTER TABLE ONLY public.migrations ALTER COLUMN id SET DEFAULT nextval('public.migrations_id_seq'::regclass);

ALTER TABLE ONLY public.migrations_lock ALTER COLUMN index SET DEFAULT nextval('public.migrations_lock_index_seq'::regclass);

ALTER TABLE ONLY public.assignments
    ADD CONSTRAINT assignments_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.assignments
    ADD CONSTRAINT assignments_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.attempts
    ADD CONSTRAINT attempts_pkey PRIMARY KEY (key);

ALTER TABLE ONLY public.candidates
    ADD CONSTRAINT candidates_complex_id_geometry_multiplicity_note_key UNIQUE (complex_id, geometry, multiplicity, note);

ALTER TABLE ONLY public.candidates
    ADD CONSTRAINT candidates_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.candidates
    ADD CONSTRAINT candidates_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.centres
    ADD CONSTRAINT centres_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.centres
    ADD CONSTRAINT centres_structure_id_atom_index_key UNIQUE (structure_id, atom_index);

ALTER TABLE ONLY public.complexes
    ADD CONSTRAINT complexes_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.complexes
    ADD CONSTRAINT complexes_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.complexes
    ADD CONSTRAINT complexes_study_id_formula_key UNIQUE (study_id, formula);

ALTER TABLE ONLY public.earlier_records
    ADD CONSTRAINT earlier_records_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.earlier_records
    ADD CONSTRAINT earlier_records_run_id_reader_version_key UNIQUE (run_id, reader_version);

ALTER TABLE ONLY public.events
    ADD CONSTRAINT events_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_pkey PRIMARY KEY (group_id, sha256);

ALTER TABLE ONLY public.groups
    ADD CONSTRAINT groups_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.invitations
    ADD CONSTRAINT invitations_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.invitations
    ADD CONSTRAINT invitations_token_hash_key UNIQUE (token_hash);

ALTER TABLE ONLY public.measurements
    ADD CONSTRAINT measurements_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.measurements
    ADD CONSTRAINT measurements_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_pkey PRIMARY KEY (group_id, user_id);

ALTER TABLE ONLY public.migrations_lock
    ADD CONSTRAINT migrations_lock_pkey PRIMARY KEY (index);

ALTER TABLE ONLY public.migrations
    ADD CONSTRAINT migrations_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.password_tokens
    ADD CONSTRAINT password_tokens_pkey PRIMARY KEY (token_hash);

ALTER TABLE ONLY public.replicates
    ADD CONSTRAINT replicates_measurement_id_ordinal_key UNIQUE (measurement_id, ordinal);

ALTER TABLE ONLY public.replicates
    ADD CONSTRAINT replicates_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.runs
    ADD CONSTRAINT runs_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.runs
    ADD CONSTRAINT runs_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.runs
    ADD CONSTRAINT runs_study_id_sha256_key UNIQUE (study_id, sha256);

ALTER TABLE ONLY public.samples
    ADD CONSTRAINT samples_complex_id_code_key UNIQUE (complex_id, code);

ALTER TABLE ONLY public.samples
    ADD CONSTRAINT samples_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.samples
    ADD CONSTRAINT samples_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.sessions
    ADD CONSTRAINT sessions_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_run_id_key UNIQUE (run_id);

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_study_id_sha256_frame_key UNIQUE (study_id, sha256, frame);

ALTER TABLE ONLY public.studies
    ADD CONSTRAINT studies_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.studies
    ADD CONSTRAINT studies_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_group_id_id_key UNIQUE (group_id, id);

ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.users
    ADD CONSTRAINT users_email_key UNIQUE (email);

ALTER TABLE ONLY public.users
    ADD CONSTRAINT users_pkey PRIMARY KEY (id);

CREATE INDEX assignments_complex_id_idx ON public.assignments USING btree (complex_id);

CREATE INDEX complexes_study_id_position_idx ON public.complexes USING btree (study_id, "position");

CREATE INDEX events_group_id_id_idx ON public.events USING btree (group_id, id DESC);

CREATE UNIQUE INDEX invitations_group_id_email_idx ON public.invitations USING btree (group_id, email) WHERE ((accepted_at IS NULL) AND (withdrawn_at IS NULL));

CREATE INDEX measurements_sample_id_idx ON public.measurements USING btree (sample_id);

CREATE INDEX memberships_user_id_idx ON public.memberships USING btree (user_id);

CREATE INDEX outbox_created_at_idx ON public.outbox USING btree (created_at) WHERE (sent_at IS NULL);

CREATE INDEX runs_complex_id_idx ON public.runs USING btree (complex_id);

CREATE INDEX runs_study_id_created_at_idx ON public.runs USING btree (study_id, created_at DESC);

CREATE INDEX sessions_user_id_idx ON public.sessions USING btree (user_id);

CREATE INDEX structures_complex_id_idx ON public.structures USING btree (complex_id);

CREATE INDEX uploads_state_changed_at_idx ON public.uploads USING btree (state, changed_at) WHERE (state = ANY (ARRAY['queued'::text, 'reading'::text]));

CREATE INDEX uploads_study_id_created_at_idx ON public.uploads USING btree (study_id, created_at DESC);

ALTER TABLE ONLY public.assignments
    ADD CONSTRAINT assignments_group_id_candidate_id_fkey FOREIGN KEY (group_id, candidate_id) REFERENCES public.candidates(group_id, id);

ALTER TABLE ONLY public.assignments
    ADD CONSTRAINT assignments_group_id_complex_id_fkey FOREIGN KEY (group_id, complex_id) REFERENCES public.complexes(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.assignments
    ADD CONSTRAINT assignments_proposed_by_fkey FOREIGN KEY (proposed_by) REFERENCES public.users(id);

ALTER TABLE ONLY public.assignments
    ADD CONSTRAINT assignments_signed_by_fkey FOREIGN KEY (signed_by) REFERENCES public.users(id);

ALTER TABLE ONLY public.candidates
    ADD CONSTRAINT candidates_group_id_complex_id_fkey FOREIGN KEY (group_id, complex_id) REFERENCES public.complexes(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.centres
    ADD CONSTRAINT centres_group_id_structure_id_fkey FOREIGN KEY (group_id, structure_id) REFERENCES public.structures(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.complexes
    ADD CONSTRAINT complexes_group_id_study_id_fkey FOREIGN KEY (group_id, study_id) REFERENCES public.studies(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.earlier_records
    ADD CONSTRAINT earlier_records_group_id_run_id_fkey FOREIGN KEY (group_id, run_id) REFERENCES public.runs(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.events
    ADD CONSTRAINT events_actor_id_fkey FOREIGN KEY (actor_id) REFERENCES public.users(id);

ALTER TABLE ONLY public.events
    ADD CONSTRAINT events_group_id_fkey FOREIGN KEY (group_id) REFERENCES public.groups(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.files
    ADD CONSTRAINT files_group_id_fkey FOREIGN KEY (group_id) REFERENCES public.groups(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.invitations
    ADD CONSTRAINT invitations_group_id_fkey FOREIGN KEY (group_id) REFERENCES public.groups(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.invitations
    ADD CONSTRAINT invitations_invited_by_fkey FOREIGN KEY (invited_by) REFERENCES public.users(id);

ALTER TABLE ONLY public.measurements
    ADD CONSTRAINT measurements_entered_by_fkey FOREIGN KEY (entered_by) REFERENCES public.users(id);

ALTER TABLE ONLY public.measurements
    ADD CONSTRAINT measurements_group_id_sample_id_fkey FOREIGN KEY (group_id, sample_id) REFERENCES public.samples(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_group_id_fkey FOREIGN KEY (group_id) REFERENCES public.groups(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.memberships
    ADD CONSTRAINT memberships_user_id_fkey FOREIGN KEY (user_id) REFERENCES public.users(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.outbox
    ADD CONSTRAINT outbox_group_id_fkey FOREIGN KEY (group_id) REFERENCES public.groups(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.password_tokens
    ADD CONSTRAINT password_tokens_user_id_fkey FOREIGN KEY (user_id) REFERENCES public.users(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.replicates
    ADD CONSTRAINT replicates_group_id_measurement_id_fkey FOREIGN KEY (group_id, measurement_id) REFERENCES public.measurements(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.runs
    ADD CONSTRAINT runs_group_id_candidate_id_fkey FOREIGN KEY (group_id, candidate_id) REFERENCES public.candidates(group_id, id) ON DELETE SET NULL (candidate_id);

ALTER TABLE ONLY public.runs
    ADD CONSTRAINT runs_group_id_complex_id_fkey FOREIGN KEY (group_id, complex_id) REFERENCES public.complexes(group_id, id) ON DELETE SET NULL (complex_id);

ALTER TABLE ONLY public.runs
    ADD CONSTRAINT runs_group_id_sha256_fkey FOREIGN KEY (group_id, sha256) REFERENCES public.files(group_id, sha256);

ALTER TABLE ONLY public.runs
    ADD CONSTRAINT runs_group_id_study_id_fkey FOREIGN KEY (group_id, study_id) REFERENCES public.studies(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.samples
    ADD CONSTRAINT samples_created_by_fkey FOREIGN KEY (created_by) REFERENCES public.users(id);

ALTER TABLE ONLY public.samples
    ADD CONSTRAINT samples_group_id_complex_id_fkey FOREIGN KEY (group_id, complex_id) REFERENCES public.complexes(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.sessions
    ADD CONSTRAINT sessions_user_id_fkey FOREIGN KEY (user_id) REFERENCES public.users(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_group_id_complex_id_fkey FOREIGN KEY (group_id, complex_id) REFERENCES public.complexes(group_id, id) ON DELETE SET NULL (complex_id);

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_group_id_run_id_fkey FOREIGN KEY (group_id, run_id) REFERENCES public.runs(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_group_id_sha256_fkey FOREIGN KEY (group_id, sha256) REFERENCES public.files(group_id, sha256);

ALTER TABLE ONLY public.structures
    ADD CONSTRAINT structures_group_id_study_id_fkey FOREIGN KEY (group_id, study_id) REFERENCES public.studies(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.studies
    ADD CONSTRAINT studies_created_by_fkey FOREIGN KEY (created_by) REFERENCES public.users(id);

ALTER TABLE ONLY public.studies
    ADD CONSTRAINT studies_group_id_fkey FOREIGN KEY (group_id) REFERENCES public.groups(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_group_id_sha256_fkey FOREIGN KEY (group_id, sha256) REFERENCES public.files(group_id, sha256);

ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_group_id_study_id_fkey FOREIGN KEY (group_id, study_id) REFERENCES public.studies(group_id, id) ON DELETE CASCADE;

ALTER TABLE ONLY public.uploads
    ADD CONSTRAINT uploads_uploaded_by_fkey FOREIGN KEY (uploaded_by) REFERENCES public.users(id);

ALTER TABLE public.assignments ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.attempts ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.candidates ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.centres ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.complexes ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.earlier_records ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.events ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.files ENABLE ROW LEVEL SECURITY;

CREATE POLICY group_of_invitation ON public.groups FOR SELECT USING ((EXISTS ( SELECT 1
   FROM public.invitations i
  WHERE ((i.group_id = groups.id) AND (i.token_hash = public.app_token())))));

ALTER TABLE public.groups ENABLE ROW LEVEL SECURITY;

CREATE POLICY groups_of_person ON public.groups FOR SELECT USING ((EXISTS ( SELECT 1
   FROM public.memberships m
  WHERE ((m.group_id = groups.id) AND (m.user_id = public.app_user())))));

CREATE POLICY invitation_by_token ON public.invitations FOR SELECT USING ((token_hash = public.app_token()));

ALTER TABLE public.invitations ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.measurements ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.memberships ENABLE ROW LEVEL SECURITY;

CREATE POLICY memberships_of_person ON public.memberships FOR SELECT USING ((user_id = public.app_user()));

ALTER TABLE public.outbox ENABLE ROW LEVEL SECURITY;

CREATE POLICY own_group ON public.assignments USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.candidates USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.centres USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.complexes USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.earlier_records USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.events USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.files USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.groups USING ((id = public.app_group())) WITH CHECK ((id = public.app_group()));

CREATE POLICY own_group ON public.invitations USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.measurements USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.memberships USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.outbox USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.replicates USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.runs USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.samples USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.structures USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.studies USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_group ON public.uploads USING ((group_id = public.app_group())) WITH CHECK ((group_id = public.app_group()));

CREATE POLICY own_person ON public.users FOR UPDATE USING ((id = public.app_user())) WITH CHECK ((id = public.app_user()));

CREATE POLICY own_sessions ON public.sessions USING ((user_id = public.app_user())) WITH CHECK ((user_id = public.app_user()));

ALTER TABLE public.password_tokens ENABLE ROW LEVEL SECURITY;

CREATE POLICY person_or_colleague ON public.users FOR SELECT USING (((id = public.app_user()) OR (EXISTS ( SELECT 1
   FROM public.memberships m
  WHERE ((m.user_id = users.id) AND (m.group_id = public.app_group()))))));

ALTER TABLE public.replicates ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.runs ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.samples ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.sessions ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.structures ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.studies ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.uploads ENABLE ROW LEVEL SECURITY;

ALTER TABLE public.users ENABLE ROW LEVEL SECURITY;

CREATE POLICY waiting_for_owner ON public.outbox FOR SELECT TO spinstead_owner USING (true);

CREATE POLICY waiting_for_owner ON public.uploads FOR SELECT TO spinstead_owner USING (true);

GRANT USAGE ON SCHEMA public TO spinstead_app;

REVOKE ALL ON FUNCTION public.account_exists() FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_exists() TO spinstead_app;

REVOKE ALL ON FUNCTION public.account_for_sign_in(wanted text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.account_for_sign_in(wanted text) TO spinstead_app;

REVOKE ALL ON FUNCTION public.app_group() FROM PUBLIC;
GRANT ALL ON FUNCTION public.app_group() TO spinstead_app;

REVOKE ALL ON FUNCTION public.app_token() FROM PUBLIC;
GRANT ALL ON FUNCTION public.app_token() TO spinstead_app;

REVOKE ALL ON FUNCTION public.app_user() FROM PUBLIC;
GRANT ALL ON FUNCTION public.app_user() TO spinstead_app;

REVOKE ALL ON FUNCTION public.count_attempt(wanted text, window_seconds integer) FROM PUBLIC;
GRANT ALL ON FUNCTION public.count_attempt(wanted text, window_seconds integer) TO spinstead_app;

REVOKE ALL ON FUNCTION public.create_account(new_email text, new_name text, new_hash text, is_demo boolean) FROM PUBLIC;
GRANT ALL ON FUNCTION public.create_account(new_email text, new_name text, new_hash text, is_demo boolean) TO spinstead_app;

REVOKE ALL ON FUNCTION public.end_session(session uuid) FROM PUBLIC;
GRANT ALL ON FUNCTION public.end_session(session uuid) TO spinstead_app;

REVOKE ALL ON FUNCTION public.find_password_token(hash text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.find_password_token(hash text) TO spinstead_app;

REVOKE ALL ON FUNCTION public.forget_attempts(wanted text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.forget_attempts(wanted text) TO spinstead_app;

REVOKE ALL ON FUNCTION public.issue_password_token(hash text, person uuid, wanted_purpose text, until timestamp with time zone) FROM PUBLIC;
GRANT ALL ON FUNCTION public.issue_password_token(hash text, person uuid, wanted_purpose text, until timestamp with time zone) TO spinstead_app;

REVOKE ALL ON FUNCTION public.live_session(session uuid) FROM PUBLIC;
GRANT ALL ON FUNCTION public.live_session(session uuid) TO spinstead_app;

REVOKE ALL ON FUNCTION public.set_password(person uuid, new_hash text, kept_session uuid) FROM PUBLIC;
GRANT ALL ON FUNCTION public.set_password(person uuid, new_hash text, kept_session uuid) TO spinstead_app;

REVOKE ALL ON FUNCTION public.start_session(person uuid, agent text, until timestamp with time zone) FROM PUBLIC;
GRANT ALL ON FUNCTION public.start_session(person uuid, agent text, until timestamp with time zone) TO spinstead_app;

REVOKE ALL ON FUNCTION public.use_password_token(hash text) FROM PUBLIC;
GRANT ALL ON FUNCTION public.use_password_token(hash text) TO spinstead_app;

REVOKE ALL ON FUNCTION public.waiting_mails(unchanged_seconds integer) FROM PUBLIC;
GRANT ALL ON FUNCTION public.waiting_mails(unchanged_seconds integer) TO spinstead_app;

REVOKE ALL ON FUNCTION public.waiting_uploads(unchanged_seconds integer) FROM PUBLIC;
GRANT ALL ON FUNCTION public.waiting_uploads(unchanged_seconds integer) TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.assignments TO spinstead_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.candidates TO spinstead_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.centres TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.complexes TO spinstead_app;

GRANT SELECT,INSERT ON TABLE public.earlier_records TO spinstead_app;

GRANT SELECT,INSERT ON TABLE public.events TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.files TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.groups TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.invitations TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.measurements TO spinstead_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.memberships TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.outbox TO spinstead_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.replicates TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.runs TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.samples TO spinstead_app;

GRANT SELECT ON TABLE public.sessions TO spinstead_app;

GRANT UPDATE(revoked_at) ON TABLE public.sessions TO spinstead_app;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.structures TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.studies TO spinstead_app;

GRANT SELECT,INSERT,UPDATE ON TABLE public.uploads TO spinstead_app;

GRANT SELECT(id) ON TABLE public.users TO spinstead_app;

GRANT SELECT(email) ON TABLE public.users TO spinstead_app;

GRANT SELECT(name),UPDATE(name) ON TABLE public.users TO spinstead_app;

GRANT SELECT(demo) ON TABLE public.users TO spinstead_app;

GRANT SELECT(created_at) ON TABLE public.users TO spinstead_app;
