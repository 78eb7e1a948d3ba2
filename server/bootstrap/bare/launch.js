const path = require('node:path');
const { checkNode } = require('./checkNode');
const { installPackages } = require('./installPackages');

/**
 * The way in of `npm start`, `npm test` and `npm run dev`. Needs nothing but Node: it installs the packages, and then
 * hands over to TypeScript in this very process, so that signals need no passing on.
 */
function launch(command) {
  const root = path.dirname(require.resolve('../../../package.json'));
  process.chdir(root);
  try {
    checkNode();
    installPackages(root);
  } catch (error) {
    console.error(`\n${error.message}`);
    process.exit(1);
  }
  require('tsx/cjs');
  require(`../${command}.ts`)[command](process.argv.slice(2));
}

module.exports = { launch };
