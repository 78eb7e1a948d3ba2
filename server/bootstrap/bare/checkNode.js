/** Is a version such as 20.19.1 at least the one of a range such as `>=20.19`? */
function atLeast(version, range) {
  const wanted = range.replace('>=', '').split('.').map(Number);
  const given = version.split('.').map(Number);
  for (let i = 0; i < wanted.length; i++) {
    if (given[i] !== wanted[i]) return given[i] > wanted[i];
  }
  return true;
}

/** Throws where this Node is older than the product needs. */
function checkNode(
  version = process.versions.node,
  range = require('../../../package.json').engines.node,
) {
  if (!atLeast(version, range))
    throw new Error(
      `Spate needs Node ${range}, and this is ${version}. Install a newer Node and start again.`,
    );
}

module.exports = { atLeast, checkNode };
