const READS =
  /^\s*(select|show|set|reset|begin|start|commit|end|rollback|savepoint|release|values|table|explain|discard|deallocate)\b/i;
const WRITES = /\b(insert|update|delete|merge|truncate|create|alter|drop|copy|call|nextval|setval)\b/i;

/**
 * Whether this statement may write to the database. Errs on the side of yes, which costs a synchronisation of nothing;
 * a name such as "updatedAt" is no verb. A function that writes behind a plain `select` would escape: the schema has none.
 */
export const mayWrite = (sql: string): boolean => !READS.test(sql) || WRITES.test(sql);
