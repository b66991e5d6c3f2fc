// The language of gnomon. LANGUAGE.md beside this file gives the meaning.
//
// Every decision needs one token of lookahead, save the comma inside a parenthesis after `at` or
// `with`, and the name after the `for` of a claim.
// Whitespace matters in three places; the token stream marks them before the parser sees them:
//   STEP    is a "[" written directly against a name, with one entry (`Delta[h]`);
//   BINDER  is Σ, ∫ or ∏ before "(name:";
//   "!="    is split into "!" and "=" outside `given` and the conditions of a claim.
grammar Gnomon;

tokens { STEP, BINDER }

statement
    : ( let | claim | given | drop | vary | arbitrary | umbra | why | names | file | help | leave | value )?
      EOF
    ;

let       : LET identifier ( OPEN identifier ( COMMA identifier )* CLOSE )? EQUALS value ;
claim     : CLAIM sum EQUALS sum ( FOR ( range | condition ( COMMA condition )* ) )? ;
given     : GIVEN condition ( COMMA condition )* ;
condition : sum ( INTEGER | ( relation sum )+ ) ;
relation  : EQUALS | UNEQUAL | LESS | AT_MOST | GREATER | AT_LEAST ;
drop      : DROP ( GIVEN | identifier ( COMMA identifier )* ) ;
vary      : VARY identifier ;
arbitrary : ARBITRARY identifier ( COMMA identifier )* ;
umbra     : UMBRA identifier ( COMMA identifier )* WITH sum ;
why       : WHY HANDLE? ;
names     : NAMES ;
file      : ( KEEP | REPLAY | RECHECK | RERECORD ) STRING ;
help      : HELP ( ~EOF )* ;
leave     : LEAVE ;

value        : ( matrix | solve | carry | recurrence | family | sum ) clause* ;
matrix       : MATRIX sum TO sum ;
solve        : SOLVE equation ( WITH equation ( COMMA equation )* )? ;
equation     : sum EQUALS sum ;
carry        : CARRY equation ( WITH equation ( COMMA equation )* )? BY sum ;
recurrence   : RECURRENCE EXPONENTIAL? sum ;
family       : FAMILY sum ;
clause
    : IN ( PARTIAL FRACTIONS | PRESENTATION | sum )    # in
    | TO sum DIGITS?                                   # to
    | AT substitution ( COMMA substitution )*          # at
    | FOR range                                        # for
    ;
substitution : identifier EQUALS sum ;
range        : identifier COLON sum DOTS sum ;

sum      : term ( ( PLUS | MINUS ) term )* ;
term     : signs factor joined* ;
joined   : ( ( TIMES | DIVIDED ) signs | OF )? factor ;
factor   : BINDER OPEN range CLOSE | power ;
power    : operand ( RAISED signs operand )* ;
operand  : atom suffix* ;
suffix   : PRIME | BANG | ( FALLING | RISING ) signs atom ;
signs    : ( PLUS | MINUS )* ;
atom     : NUMBER | name | HANDLE | parenthesis | bracket ;
name     : ( NAME | GLYPH ) SUBSCRIPT? ( STEP sum CLOSE_BRACKET )? ;
parenthesis : OPEN value ( COMMA value )* CLOSE ;
bracket     : OPEN_BRACKET ( value ( COMMA value )* )? CLOSE_BRACKET ;
identifier  : NAME | GLYPH ;

LET : 'let' ;
CLAIM : 'claim' ;
GIVEN : 'given' ;
DROP : 'drop' ;
VARY : 'vary' ;
ARBITRARY : 'arbitrary' ;
UMBRA : 'umbra' ;
WHY : 'why' ;
NAMES : 'names' ;
KEEP : 'keep' ;
REPLAY : 'replay' ;
RECHECK : 'recheck' ;
RERECORD : 'rerecord' ;
HELP : 'help' ;
LEAVE : 'leave' ;
MATRIX : 'matrix' ;
SOLVE : 'solve' ;
CARRY : 'carry' ;
BY : 'by' ;
FAMILY : 'family' ;
WITH : 'with' ;
RECURRENCE : 'recurrence' ;
EXPONENTIAL : 'exponential' ;
IN : 'in' ;
TO : 'to' ;
AT : 'at' ;
FOR : 'for' ;
DIGITS : 'digits' ;
INTEGER : 'integer' ;
PARTIAL : 'partial' ;
FRACTIONS : 'fractions' ;
PRESENTATION : 'binomials' | 'factors' | 'expanded' | 'tex' ;

OF : 'of' | '∘' ;
PLUS : '+' ;
MINUS : '-' | '−' ;
TIMES : '*' | '·' | '⋅' | '×' ;
DIVIDED : '/' ;
RAISED : '^' ;
FALLING : '|_' | '↓' ;
RISING : '|^' | '↑' ;
PRIME : '\'' | '′' | '’' ;
BANG : '!' ;
EQUALS : '=' ;
UNEQUAL : '!=' | '≠' ;
LESS : '<' ;
AT_MOST : '<=' | '≤' ;
GREATER : '>' ;
AT_LEAST : '>=' | '≥' ;
COMMA : ',' ;
COLON : ':' ;
DOTS : '..' | '…' ;
OPEN : '(' ;
CLOSE : ')' ;
OPEN_BRACKET : '[' ;
CLOSE_BRACKET : ']' ;

NUMBER : DIGIT+ ( '.' DIGIT+ )? ;
HANDLE : '@' DIGIT* ;
STRING : '"' ~["\r\n]* '"' ;
SUBSCRIPT : '_' NAME ;
NAME : LETTER ( LETTER | DIGIT | MARK )* ;
GLYPH : [Δ∆∇δμµΣ∑∫∏Πεϵπ∞] ;

COMMENT : '#' ~[\r\n]* -> channel(HIDDEN) ;
SPACE : [ \t\r\n\f\u00A0\u2002-\u200A\u202F]+ -> channel(HIDDEN) ;
OTHER : . ;

fragment DIGIT : [0-9] ;
fragment MARK : [\u0300-\u036F] ;
// Latin, Greek and Cyrillic letters, save the Greek ones that are glyphs: Δ Π Σ δ ε μ π ϵ.
fragment LETTER
    : [a-zA-Z\u00AA\u00BA\u00C0-\u00D6\u00D8-\u00F6\u00F8-\u024F]
    | [\u0370-\u0373\u0376\u0377\u037B-\u037D\u0386\u0388-\u038A\u038C\u038E\u038F\u0390-\u0393]
    | [\u0395-\u039F\u03A1\u03A4-\u03B3\u03B6-\u03BB\u03BD-\u03BF\u03C1-\u03F4\u03F7-\u03FF]
    | [\u0400-\u0481\u048A-\u052F]
    ;
