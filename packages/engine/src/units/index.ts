export * from './flow';
export * from './moist-air';
export * from './pressure';
export * from './temperature';
