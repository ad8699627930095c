// Names of the lines of the mass list.

export const texts = {
  covering: '{covering} on {element}',
  glue: 'Glue on {part}',
  glueTube: 'Glue along {tube}',
  glueShare: 'Glue, as a share of the foam',
  tape: 'Tape on {part}',
  motor: '{drive}, motor',
  propeller: '{drive}, propeller',
  side: '{name}, {side}',
  stbd: 'starboard',
  port: 'port',
} as const;
