// Jest reads TypeScript through swc: decorators need their metadata for Nest and TypeORM.
module.exports = {
  jsc: {
    parser: { syntax: 'typescript', decorators: true },
    transform: { legacyDecorator: true, decoratorMetadata: true },
    target: 'es2022',
    keepClassNames: true,
  },
  module: { type: 'commonjs' },
};
