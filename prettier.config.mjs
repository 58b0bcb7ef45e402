const config = { singleQuote: true, printWidth: 110, trailingComma: 'all' };

export default config;
