import { createConfig } from './.tools/lint/config.mjs';

export default createConfig(import.meta.dirname);
