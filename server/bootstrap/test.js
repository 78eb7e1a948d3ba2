require('./bare/launch').launch('test');
