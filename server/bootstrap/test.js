require('./bare/launch').launch('runTests');
