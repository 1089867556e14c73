/*
 * The network file. A file is cut into statements before it comes here (see README.md, "Lines"), so that a slip in
 * one statement leaves the others readable: `line` is the start rule for each. Blanks, line ends and comments are gone.
 *
 * The grammar decides on the next token alone, apart from the binding of operators, so that a slip is noticed at the
 * first token that cannot stand where it stands.
 */
grammar Network;

// `nH/m` behind a number: made of its three tokens before they come here.
tokens { PER_METRE }

line : statement EOF ;
sweepOption : sweep EOF ;
valueList : expression (',' expression)* EOF ;

statement
  : 'network' STRING                                                                                   # title
  | 'let' valueName '=' expression                                                                     # let
  | kind=('resistor' | 'capacitor' | 'inductor' | 'impedance') name '=' expression (',' property)*     # part
  | 'wire' wireItem ('--' wireItem)*                                                                   # wire
  | 'port' name '=' pair (',' closure)?                                                                # port
  | 'supply' name '=' volts=expression ('behind' behind=expression)?                                   # supply
  | 'load' name placement=('shunt' | 'series') pair '=' expression                                     # load
  | 'case' name '=' loads=names (('added' 'to' | 'instead' 'of') others=names)?               # case
  | 'sweep' sweep                                                                                      # band
  | 'limit' criterion scope*                                                                           # limit
  ;

property
  : 'series' ('resistance' | 'inductance') expression
  | 'parallel' 'capacitance' expression
  | 'leakage' expression
  | 'self-resonance' expression
  | 'rated' expression
  | 'tolerance' expression 'to' expression
  ;

pair : plus=name '--' minus=name ;
wireItem : name ('.' name)? ;
names : name (',' name)* ;

closure
  : 'terminated' expression                                                                            # terminated
  | 'driven' volts=expression ('peak' | 'dc')? ('behind' behind=expression)? (',' 'mains')?            # driven
  ;

sweep
  : 'dc' ('and' range (',' density)?)?
  | range (',' density)?
  ;

range : from=expression 'to' to=expression ;
density : expression ('per' 'decade' | 'points') ;

criterion
  : 'change' bound=expression ('or' other=expression)?                                                 # change
  | 'magnitude' ('change' expression | window)                                                         # magnitude
  | 'phase' ('change' expression | window)                                                             # phase
  | 'within' first=expression (',' second=expression)? 'of' reference=expression                       # within
  | 'parallel' ('capacitance' | 'resistance') window                                                   # parallel
  | 'return' 'loss' bound=expression 'in' reference=expression                                         # returnLoss
  ;

window
  : side=('above' | 'below') expression
  | from=expression ('to' to=expression)?
  ;

scope
  : 'from' range                                                                                       # fromTo
  | 'at' ('port' name | point (',' point)*)                                                            # at
  | 'for' 'case' names                                                                                 # forCases
  ;

point : 'dc' | expression ;

// Tightest first. A minus belongs to the whole power behind it: -2^2 is -4.
expression
  : <assoc=right> expression '^' expression                                                            # power
  | sign=('-' | '+') expression                                                                        # signed
  | expression operator=('*' | '/') expression                                                         # product
  | expression PLUS_MINUS expression                                                                   # toleranced
  | expression operator='||' expression                                                                # joined
  | expression operator=('+' | '-') expression                                                         # sum
  | NUMBER unit?                                                                                       # literal
  | NAME ('(' (argument (',' argument)*)? ')')?                                                        # reference
  | STRING                                                                                             # data
  | '(' expression ')'                                                                                 # grouped
  ;

argument : expression ('=' expression)? ;
unit : NAME | PER_METRE | '%' | '°' ;

// The words of the language are free as names, except as names of values.
name : NAME | STRING | word ;
valueName : NAME | STRING | word ;
word
  : 'above' | 'added' | 'and' | 'at' | 'behind' | 'below' | 'capacitance' | 'capacitor' | 'case' | 'change' | 'dc'
  | 'decade' | 'driven' | 'for' | 'from' | 'impedance' | 'in' | 'inductance' | 'inductor' | 'instead' | 'leakage'
  | 'let' | 'limit' | 'load' | 'loss' | 'magnitude' | 'mains' | 'network' | 'of' | 'or' | 'parallel' | 'peak' | 'per'
  | 'phase' | 'points' | 'port' | 'rated' | 'resistance' | 'resistor' | 'return' | 'series' | 'shunt' | 'supply'
  | 'sweep' | 'terminated' | 'to' | 'tolerance' | 'wire' | 'within'
  ;

JOINT : '--' ;
PARALLEL : '||' ;
EQUALS : '=' ;
COMMA : ',' ;
PLUS_MINUS : '±' | '+-' | '+−' ;
PLUS : '+' ;
MINUS : '-' ;
TRUE_MINUS : '−' -> type(MINUS) ;
TIMES : '*' ;
DIVIDED : '/' ;
POWER : '^' ;
OPEN : '(' ;
CLOSE : ')' ;
POINT : '.' ;
PERCENT : '%' ;
DEGREE : '°' ;

NUMBER : Number ;
/** A slip: `1,5`. */
COMMA_NUMBER : Number (',' Number)+ ;
NAME : [\p{L}_] [\p{L}\p{M}\p{Nd}_]* ;
STRING : '"' ~["\r\n]* '"' ;
/** A slip: the closing quote is missing. */
UNCLOSED : '"' ~["\r\n]* ;
BLANK : [\p{Zs}\t\r\n\uFEFF]+ -> skip ;
COMMENT : '#' ~[\r\n]* -> skip ;
/** A slip: a character that means nothing. */
UNKNOWN : . ;

fragment Number : (Digits ('.' Digits)? | '.' Digits) ([eE] [-+−]? Digits)? ;
fragment Digits : [0-9]+ ;
