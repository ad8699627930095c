// Addresses of the pages and of the API, by what they show.

export const paths = {
  workshop: (workshop: string) => `/w/${workshop}` as const,
  members: (workshop: string) => `/w/${workshop}/members` as const,
  board: (workshop: string, design: string) => `/w/${workshop}/d/${design}` as const,
  release: (workshop: string, design: string) => `/w/${workshop}/d/${design}/release` as const,
  revisions: (workshop: string, design: string) => `/w/${workshop}/d/${design}/revisions` as const,
  printDraft: (workshop: string, design: string) => `/w/${workshop}/d/${design}/print` as const,
  review: (workshop: string, design: string, number: number) =>
    `/w/${workshop}/d/${design}/r/${String(number)}` as const,
  print: (workshop: string, design: string, number: number) =>
    `/w/${workshop}/d/${design}/r/${String(number)}/print` as const,
  figures: (workshop: string, design: string, number: number) =>
    `/w/${workshop}/d/${design}/r/${String(number)}/figures` as const,
  setUp: (workshop: string, design: string, number: number) =>
    `/w/${workshop}/d/${design}/r/${String(number)}/set-up` as const,
  parts: (workshop: string, design: string, number: number) =>
    `/w/${workshop}/d/${design}/r/${String(number)}/parts` as const,
};

/** An address of a page inside the workshops. */
export type PagePath = '/w' | ReturnType<(typeof paths)[keyof typeof paths]>;

export const apiPaths = {
  workshops: '/api/workshops',
  members: (workshop: string) => `/api/workshops/${workshop}/members`,
  invitations: (workshop: string) => `/api/workshops/${workshop}/invitations`,
  accept: (token: string) => `/api/invitations/${encodeURIComponent(token)}/accept`,
  designs: (workshop: string) => `/api/workshops/${workshop}/designs`,
  design: (workshop: string, design: string) => `/api/workshops/${workshop}/designs/${design}`,
  revisions: (workshop: string, design: string) => `/api/workshops/${workshop}/designs/${design}/revisions`,
  revision: (workshop: string, design: string, number: number) =>
    `/api/workshops/${workshop}/designs/${design}/revisions/${number}`,
};
