const config = { singleQuote: true, printWidth: 110 };
export default config;
