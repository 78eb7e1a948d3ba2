require('./bare/launch').launch('buildWeb');
