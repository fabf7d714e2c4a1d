import {
  doublePrecision,
  foreignKey,
  integer,
  pgTable,
  primaryKey,
  text,
  timestamp,
  unique,
  uuid,
} from 'drizzle-orm/pg-core'
import { surveys } from './surveys'

/** A stored picture; its bytes are in the photo storage. */
export const photos = pgTable(
  'photos',
  {
    companyId: uuid('company_id').notNull(),
    id: uuid('id').notNull().defaultRandom(),
    surveyId: uuid('survey_id').notNull(),
    /** The id the photo has inside the survey, `F1`. */
    surveyPhotoId: text('survey_photo_id').notNull(),
    name: text('name').notNull(),
    width: integer('width').notNull(),
    height: integer('height').notNull(),
    bytes: integer('bytes').notNull(),
    /** As the camera wrote it: local time, with an offset only where the camera knew one. */
    takenAt: text('taken_at'),
    focalLength35: doublePrecision('focal_length_35'),
    /** Kept only where the company keeps the place of its photos. */
    latitude: doublePrecision('latitude'),
    longitude: doublePrecision('longitude'),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.companyId, table.id] }),
    unique('photos_survey_photo_unique').on(table.companyId, table.surveyId, table.surveyPhotoId),
    foreignKey({
      columns: [table.companyId, table.surveyId],
      foreignColumns: [surveys.companyId, surveys.id],
    }),
  ],
)
