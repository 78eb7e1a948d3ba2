require('./bare/launch').launch('start');
