grammar Network;
statement: NAME EOF;
NAME: [a-z]+;
