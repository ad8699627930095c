export * from './auth';
export * from './design';
export * from './record';
export * from './review';
export * from './revision';
export * from './workshop';
