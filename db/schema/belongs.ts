import { text } from 'drizzle-orm/pg-core';
import { user } from './auth';
import { workshop } from './workshop';

// Who a row belongs to. Three ways of removal, chosen per foreign key:
// - cascade: goes with what it belongs to. Every row goes with its workshop.
// - none given ("no action"): looked at when the whole statement has run. What somebody cut, weighed, measured or flew
//   keeps its revision and its people from being removed, yet goes along when the workshop goes as a whole.
// - restrict: refused in any case; only the frozen artefacts of a release have it.
// A key of two columns, one of them the workshop or the design, makes it impossible to point into another workshop.

export const ofWorkshop = () =>
  text('workshop_id')
    .notNull()
    .references(() => workshop.id, { onDelete: 'cascade' });

/** The record stays as long as the person: somebody who left a workshop is still named. */
export const byUser = (name: string) => text(name).references(() => user.id);
