require('./bare/launch').launch('dev');
