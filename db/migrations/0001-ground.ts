import type { Knex } from 'knex';

/**
 * The ground: accounts, groups, studies, complexes, candidates, files, uploads, runs, structures,
 * centres, samples, measurements, assignments, history, outbox.
 *
 * Tenancy. Every table that belongs to a group carries `group_id` and has forced row-level security:
 * a row is visible and writable only in a transaction whose `app.group_id` is its group. Composite
 * foreign keys (group_id, id) keep a row from pointing into another group. The application's role
 * owns nothing; grants are at the foot.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create function app_group() returns uuid language sql stable
      as $$ select nullif(current_setting('app.group_id', true), '')::uuid $$;
    create function app_user() returns uuid language sql stable
      as $$ select nullif(current_setting('app.user_id', true), '')::uuid $$;
    create function app_token() returns text language sql stable
      as $$ select nullif(current_setting('app.token_hash', true), '') $$;

    create domain member_role as text
      check (value in ('PI', 'computational chemist', 'experimentalist', 'guest'));

    -- Accounts: people, not tenants. Password hashes never leave the functions below.
    create table users (
      id uuid primary key default gen_random_uuid(),
      email text not null check (email = lower(email) and email like '%_@_%' and length(email) <= 254),
      name text not null check (length(name) between 1 and 120),
      password_hash text,
      demo boolean not null default false,
      created_at timestamptz not null default now(),
      unique (email)
    );
    create table sessions (
      id uuid primary key default gen_random_uuid(),
      user_id uuid not null references users on delete cascade,
      user_agent text not null default '' check (length(user_agent) <= 400),
      created_at timestamptz not null default now(),
      seen_at timestamptz not null default now(),
      expires_at timestamptz not null,
      revoked_at timestamptz
    );
    create index on sessions (user_id);
    create table password_tokens (
      token_hash text primary key,
      user_id uuid references users on delete cascade,
      purpose text not null check (purpose in ('reset', 'first PI')),
      expires_at timestamptz not null,
      used_at timestamptz,
      check (purpose = 'first PI' or user_id is not null)
    );

    create table groups (
      id uuid primary key default gen_random_uuid(),
      name text not null check (length(name) between 1 and 120),
      demo boolean not null default false,
      created_at timestamptz not null default now()
    );
    create table memberships (
      group_id uuid not null references groups on delete cascade,
      user_id uuid not null references users on delete cascade,
      role member_role not null,
      created_at timestamptz not null default now(),
      primary key (group_id, user_id)
    );
    create index on memberships (user_id);
    create table invitations (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null references groups on delete cascade,
      email text not null check (email = lower(email)),
      role member_role not null,
      token_hash text not null unique,
      invited_by uuid not null references users,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      accepted_at timestamptz,
      withdrawn_at timestamptz
    );
    -- One open invitation per address and group: inviting again replaces the link.
    create unique index on invitations (group_id, email) where accepted_at is null and withdrawn_at is null;
    -- How often something was tried in the current window, such as signing in to one address.
    create table attempts (
      key text primary key check (length(key) <= 400),
      count integer not null,
      window_ends_at timestamptz not null
    );

    create table studies (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null references groups on delete cascade,
      title text not null check (length(title) between 1 and 200),
      question text not null default '' check (length(question) <= 2000),
      notice text not null default '' check (length(notice) <= 2000),
      created_by uuid references users,
      created_at timestamptz not null default now(),
      unique (group_id, id)
    );
    create table complexes (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      study_id uuid not null,
      position integer not null default 0,
      section text not null default '' check (length(section) <= 120),
      formula text not null check (length(formula) between 1 and 200),
      name text not null default '' check (length(name) <= 300),
      composition text not null check (length(composition) between 1 and 200),
      charge integer not null check (charge between -20 and 20),
      metal text not null check (metal ~ '^[A-Z][a-z]{0,1}$'),
      oxidation_state integer not null check (oxidation_state between -4 and 9),
      note text not null default '' check (length(note) <= 2000),
      created_at timestamptz not null default now(),
      unique (group_id, id),
      unique (study_id, formula),
      foreign key (group_id, study_id) references studies (group_id, id) on delete cascade
    );
    create index on complexes (study_id, position);
    create table candidates (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      complex_id uuid not null,
      geometry text not null check (geometry ~ '^[A-Z]{1,5}-[0-9]{1,2}$'),
      multiplicity integer not null check (multiplicity between 1 and 40),
      origin text not null check (origin in ('planned', 'from a returned output')),
      note text not null default '' check (length(note) <= 500),
      created_at timestamptz not null default now(),
      unique (group_id, id),
      unique (complex_id, geometry, multiplicity, note),
      foreign key (group_id, complex_id) references complexes (group_id, id) on delete cascade
    );

    -- A stored file: the bytes once per group, under their SHA-256.
    create table files (
      group_id uuid not null references groups on delete cascade,
      sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$'),
      bytes bigint not null check (bytes >= 0),
      line_index jsonb,
      created_at timestamptz not null default now(),
      primary key (group_id, sha256)
    );
    create table uploads (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      study_id uuid not null,
      drop_id uuid not null,
      uploaded_by uuid references users,
      file_name text not null check (length(file_name) between 1 and 500),
      sha256 text,
      bytes bigint not null default 0,
      kind text check (kind in ('program output', 'xyz', 'csv')),
      state text not null check (state in ('queued', 'reading', 'read', 'failed', 'refused')),
      known boolean not null default false,
      problem jsonb,
      bytes_read bigint not null default 0,
      attempts integer not null default 0,
      created_at timestamptz not null default now(),
      changed_at timestamptz not null default now(),
      unique (group_id, id),
      foreign key (group_id, study_id) references studies (group_id, id) on delete cascade,
      foreign key (group_id, sha256) references files (group_id, sha256),
      check (state = 'refused' or (sha256 is not null and kind is not null)),
      check (state not in ('refused', 'failed') or problem is not null)
    );
    create index on uploads (study_id, created_at desc);
    create index on uploads (state, changed_at) where state in ('queued', 'reading');

    create table runs (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      study_id uuid not null,
      sha256 text not null,
      file_name text not null,
      reader_version text not null,
      complex_id uuid,
      candidate_id uuid,
      matched_by text check (matched_by in ('job key', 'composition', 'hand')),
      program text,
      program_version text,
      outcome text not null check (outcome in ('finished', 'failed', 'cut off')),
      formula text,
      charge integer,
      multiplicity integer,
      functional text,
      basis text,
      reference text,
      dispersion text,
      solvation text,
      relativity text,
      tasks text[] not null default '{}',
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
      record jsonb not null,
      created_at timestamptz not null default now(),
      read_at timestamptz not null default now(),
      unique (group_id, id),
      unique (study_id, sha256),
      foreign key (group_id, study_id) references studies (group_id, id) on delete cascade,
      foreign key (group_id, sha256) references files (group_id, sha256),
      foreign key (group_id, complex_id) references complexes (group_id, id) on delete set null (complex_id),
      foreign key (group_id, candidate_id) references candidates (group_id, id) on delete set null (candidate_id),
      check ((complex_id is null) = (matched_by is null)),
      check (candidate_id is null or complex_id is not null)
    );
    create index on runs (study_id, created_at desc);
    create index on runs (complex_id);
    create table earlier_records (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      run_id uuid not null,
      reader_version text not null,
      record jsonb not null,
      read_at timestamptz not null,
      unique (run_id, reader_version),
      foreign key (group_id, run_id) references runs (group_id, id) on delete cascade
    );

    create table structures (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      study_id uuid not null,
      run_id uuid,
      sha256 text not null,
      frame integer not null default 0,
      complex_id uuid,
      title text not null default '',
      formula text not null,
      elements text[] not null,
      positions_angstrom jsonb not null,
      created_at timestamptz not null default now(),
      unique (group_id, id),
      unique (study_id, sha256, frame),
      unique (run_id),
      foreign key (group_id, study_id) references studies (group_id, id) on delete cascade,
      foreign key (group_id, run_id) references runs (group_id, id) on delete cascade,
      foreign key (group_id, sha256) references files (group_id, sha256),
      foreign key (group_id, complex_id) references complexes (group_id, id) on delete set null (complex_id)
    );
    create index on structures (complex_id);
    create table centres (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      structure_id uuid not null,
      atom_index integer not null check (atom_index >= 0),
      element text not null,
      coordination_number integer not null,
      nearest text,
      mean_distance_angstrom double precision,
      baur_distortion double precision,
      tau4 double precision,
      spin_population double precision,
      description jsonb not null,
      unique (structure_id, atom_index),
      foreign key (group_id, structure_id) references structures (group_id, id) on delete cascade
    );

    create table samples (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      complex_id uuid not null,
      code text not null check (length(code) between 1 and 60),
      description text not null default '' check (length(description) <= 1000),
      created_by uuid references users,
      created_at timestamptz not null default now(),
      unique (group_id, id),
      unique (complex_id, code),
      foreign key (group_id, complex_id) references complexes (group_id, id) on delete cascade
    );
    create table measurements (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      sample_id uuid not null,
      technique text not null check (technique in
        ('Gouy balance', 'susceptibility balance', 'NMR shift', 'magnetometer', 'paper or another laboratory')),
      temperature_k double precision not null check (temperature_k > 0 and temperature_k < 2000),
      u_temperature_k double precision not null default 0 check (u_temperature_k >= 0),
      -- standard uncertainty of everything that repeats do not show (calibration, diamagnetic correction)
      u_systematic_bohr double precision not null check (u_systematic_bohr >= 0),
      measured_on date not null,
      reference text not null default '' check (length(reference) <= 500),
      note text not null default '' check (length(note) <= 2000),
      invented boolean not null default false,
      entered_by uuid references users,
      created_at timestamptz not null default now(),
      withdrawn_at timestamptz,
      withdrawn_because text,
      unique (group_id, id),
      foreign key (group_id, sample_id) references samples (group_id, id) on delete cascade
    );
    create index on measurements (sample_id);
    create table replicates (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      measurement_id uuid not null,
      ordinal integer not null check (ordinal >= 1),
      mu_eff_bohr double precision not null check (mu_eff_bohr >= 0 and mu_eff_bohr < 30),
      unique (measurement_id, ordinal),
      foreign key (group_id, measurement_id) references measurements (group_id, id) on delete cascade
    );

    create table assignments (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null,
      complex_id uuid not null,
      candidate_id uuid not null,
      wording text not null default '' check (length(wording) <= 2000),
      confidence text not null check (confidence in ('tentative', 'probable', 'firm')),
      state text not null check (state in ('proposed', 'signed', 'withdrawn', 'superseded')),
      proposed_by uuid references users,
      proposed_at timestamptz not null default now(),
      signed_by uuid references users,
      signed_at timestamptz,
      snapshot jsonb,
      unique (group_id, id),
      foreign key (group_id, complex_id) references complexes (group_id, id) on delete cascade,
      foreign key (group_id, candidate_id) references candidates (group_id, id),
      check (state <> 'signed' or (signed_by is not null and signed_at is not null and snapshot is not null))
    );
    create index on assignments (complex_id);

    create table events (
      id bigint generated always as identity primary key,
      group_id uuid not null references groups on delete cascade,
      study_id uuid,
      actor_id uuid references users,
      subject text not null,
      subject_id uuid,
      kind text not null,
      before jsonb,
      after jsonb,
      at timestamptz not null default now()
    );
    create index on events (group_id, id desc);

    -- What has been decided in a transaction but must still reach the queue or a mail server.
    create table outbox (
      id uuid primary key default gen_random_uuid(),
      group_id uuid not null references groups on delete cascade,
      kind text not null check (kind in ('read upload', 'mail')),
      payload jsonb not null,
      created_at timestamptz not null default now(),
      attempts integer not null default 0,
      sent_at timestamptz
    );
    create index on outbox (created_at) where sent_at is null;
  `);

  const tenantTables = [
    'studies',
    'complexes',
    'candidates',
    'files',
    'uploads',
    'runs',
    'earlier_records',
    'structures',
    'centres',
    'samples',
    'measurements',
    'replicates',
    'assignments',
    'events',
    'outbox',
  ];
  for (const table of tenantTables) {
    await knex.raw(`
      alter table ${table} enable row level security;
      alter table ${table} force row level security;
      create policy own_group on ${table} using (group_id = app_group()) with check (group_id = app_group());
    `);
  }

  await knex.raw(`
    alter table groups enable row level security;
    alter table groups force row level security;
    -- A person sees the names of the groups they are in; only the current one may change.
    create policy own_group on groups using (id = app_group()) with check (id = app_group());
    create policy groups_of_person on groups for select
      using (exists (select 1 from memberships m where m.group_id = groups.id and m.user_id = app_user()));
    -- The holder of an invitation sees which group invites.
    create policy group_of_invitation on groups for select
      using (exists (select 1 from invitations i where i.group_id = groups.id and i.token_hash = app_token()));

    alter table memberships enable row level security;
    alter table memberships force row level security;
    create policy own_group on memberships using (group_id = app_group()) with check (group_id = app_group());
    create policy memberships_of_person on memberships for select using (user_id = app_user());

    alter table invitations enable row level security;
    alter table invitations force row level security;
    create policy own_group on invitations using (group_id = app_group()) with check (group_id = app_group());
    create policy invitation_by_token on invitations for select using (token_hash = app_token());

    -- Accounts are no tenants: the owner is exempt, so that the functions below can reach them;
    -- the application sees itself and the people of its group, and never a password hash.
    alter table users enable row level security;
    create policy person_or_colleague on users for select using (
      id = app_user() or exists (
        select 1 from memberships m where m.user_id = users.id and m.group_id = app_group()));
    create policy own_person on users for update using (id = app_user()) with check (id = app_user());
    alter table sessions enable row level security;
    create policy own_sessions on sessions using (user_id = app_user()) with check (user_id = app_user());
    alter table password_tokens enable row level security;
    alter table attempts enable row level security;

    create function account_for_sign_in(wanted text)
      returns table (id uuid, name text, email text, password_hash text, demo boolean)
      language sql stable security definer set search_path = public
      as $$ select id, name, email, password_hash, demo from users where email = lower(wanted) $$;

    -- Demo accounts do not count: outside demo mode nobody can sign in with them.
    create function account_exists() returns boolean
      language sql stable security definer set search_path = public
      as $$ select exists (select 1 from users where not demo) $$;

    create function create_account(new_email text, new_name text, new_hash text, is_demo boolean) returns uuid
      language sql security definer set search_path = public
      as $$ insert into users (email, name, password_hash, demo)
            values (lower(new_email), new_name, new_hash, is_demo) returning id $$;

    -- Setting a password ends every session of that person, save the one it was changed from,
    -- and spends every reset link that is still open.
    create function set_password(person uuid, new_hash text, kept_session uuid) returns void
      language sql security definer set search_path = public
      as $$ update users set password_hash = new_hash where id = person;
            update password_tokens set used_at = now() where user_id = person and used_at is null;
            update sessions set revoked_at = now()
              where user_id = person and revoked_at is null and id is distinct from kept_session $$;

    create function issue_password_token(hash text, person uuid, wanted_purpose text, until timestamptz) returns void
      language sql security definer set search_path = public
      as $$ insert into password_tokens (token_hash, user_id, purpose, expires_at)
            values (hash, person, wanted_purpose, until) $$;

    create function find_password_token(hash text) returns table (user_id uuid, purpose text)
      language sql stable security definer set search_path = public
      as $$ select user_id, purpose from password_tokens
            where token_hash = hash and used_at is null and expires_at > now() $$;

    -- Uses the token up: of two at once, one gets a row and the other none.
    create function use_password_token(hash text) returns table (user_id uuid, purpose text)
      language sql security definer set search_path = public
      as $$ update password_tokens t set used_at = now()
            where t.token_hash = hash and t.used_at is null and t.expires_at > now()
            returning t.user_id, t.purpose $$;

    -- Asked on every request, so it writes at most once a minute.
    create function live_session(session uuid) returns table (user_id uuid, name text, email text, demo boolean)
      language sql security definer set search_path = public
      as $$ with seen as (
              update sessions set seen_at = now()
              where id = session and revoked_at is null and expires_at > now()
                and seen_at < now() - interval '1 minute')
            select u.id, u.name, u.email, u.demo from sessions s join users u on u.id = s.user_id
            where s.id = session and s.revoked_at is null and s.expires_at > now() $$;

    -- Counts one more attempt and returns how many the current window holds. Old rows are swept after the
    -- count and past locked ones, so that two callers never wait for each other's rows.
    create function count_attempt(wanted text, window_seconds integer) returns integer
      language plpgsql security definer set search_path = public
      as $$ declare counted integer; begin
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

    create function forget_attempts(wanted text) returns void
      language sql security definer set search_path = public
      as $$ delete from attempts where key = wanted $$;

    create function start_session(person uuid, agent text, until timestamptz) returns uuid
      language sql security definer set search_path = public
      as $$ insert into sessions (user_id, user_agent, expires_at) values (person, left(agent, 400), until) returning id $$;

    create function end_session(session uuid) returns void
      language sql security definer set search_path = public
      as $$ update sessions set revoked_at = now() where id = session and revoked_at is null $$;

    -- What the worker must find again in every group after the queue lost it: ids only.
    create policy waiting_for_owner on uploads for select to spinstead_owner using (true);
    create policy waiting_for_owner on outbox for select to spinstead_owner using (true);
    create function waiting_uploads(unchanged_seconds integer) returns table (group_id uuid, upload_id uuid)
      language sql stable security definer set search_path = public
      as $$ select group_id, id from uploads where state in ('queued', 'reading')
              and changed_at < now() - make_interval(secs => unchanged_seconds)
            order by created_at limit 500 $$;
    create function waiting_mails(unchanged_seconds integer) returns table (group_id uuid, outbox_id uuid)
      language sql stable security definer set search_path = public
      as $$ select group_id, id from outbox where kind = 'mail' and sent_at is null
              and created_at < now() - make_interval(secs => unchanged_seconds)
            order by created_at limit 500 $$;

    grant usage on schema public to spinstead_app;
    grant select (id, email, name, demo, created_at), update (name) on users to spinstead_app;
    grant select on sessions to spinstead_app;
    grant update (revoked_at) on sessions to spinstead_app;
    grant select, insert, update on groups, invitations, files, uploads, runs, structures, samples,
      measurements, assignments, outbox, studies, complexes, candidates to spinstead_app;
    grant select, insert, update, delete on memberships, centres, replicates to spinstead_app;
    grant delete on structures, candidates to spinstead_app;
    grant select, insert on events, earlier_records to spinstead_app;
    revoke execute on all functions in schema public from public;
    grant execute on all functions in schema public to spinstead_app;
  `);
}

export async function down(): Promise<void> {
  throw new Error('Migrations go forward only; restore a backup to go back.');
}
