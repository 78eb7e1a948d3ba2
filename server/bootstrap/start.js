require('./bare/launch').launch('startProduct');
