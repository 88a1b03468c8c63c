### A few sentences of Catalan, for the fixture of a seventh language.

chat-greeting = Bon dia. Envia-m’ho tot, com ara: T4 20 hl pH 3,5 lliure 18.
language-changed = Has escrit en català: contesto en català.
language-set = Contesto en català.
