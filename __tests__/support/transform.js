const path = require('node:path');

const { transformSync } = require('esbuild');

/** Babel would rewrite what browser tests hand to `page.evaluate`; esbuild leaves it as written. */
module.exports = {
  process(source, filename) {
    const extension = path.extname(filename).slice(1).replace(/^[cm]/, '');
    const { code, map } = transformSync(source, {
      format: 'cjs',
      target: 'node20',
      platform: 'node',
      loader: extension === 'js' ? 'jsx' : extension,
      jsx: 'automatic',
      sourcemap: true,
      sourcefile: filename,
    });
    return { code, map };
  },
};
