export * from './people';
export * from './workshops';
export * from './sessions';
export * from './commissions';
export * from './layouts';
export * from './versions';
export * from './presence';
