/** What is added to the lifting surfaces. */
export interface Corrections {
  readonly bodies: boolean;
  readonly propellers: boolean;
}

export const ALL_COUNTED: Corrections = { bodies: true, propellers: true };
