import type { Knex } from 'knex';
import type { ObjectStorage } from '@/lib/storage/object-storage';

/** What reading needs around it. `report` tells whoever watches the study that something changed. */
export interface ReadContext {
  db: Knex;
  storage: ObjectStorage;
  report: (groupId: string, studyId: string) => Promise<void>;
}
