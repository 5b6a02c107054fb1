export * from './estimates';
export * from './people';
export * from './practice';
export * from './sets';
