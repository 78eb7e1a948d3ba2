require('./bare/launch').launch('develop');
