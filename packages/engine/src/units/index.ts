export * from './flow';
export * from './fuel-gas';
export * from './line-rate';
export * from './moist-air';
export * from './pressure';
export * from './temperature';
export * from './vacuum';
