/** What part a word plays in its idiom, so that only its like is set in its place. */
export type Role =
  /** noun, one or uncounted */
  | 'n'
  /** noun, many */
  | 'ns'
  /** verb: as it is, with s, past, past participle, with ing */
  | 'v'
  | 'vz'
  | 'vd'
  | 'vn'
  | 'vg'
  /** adjective, adverb, and the small words */
  | 'j'
  | 'r'
  | 'x'

/** One word of an idiom; without a role it stays as it is. */
export interface IdiomWord {
  text: string
  role: Role | null
}

/** A familiar English saying, idiom or stock phrase. */
export interface Idiom {
  phrase: string
  words: readonly IdiomWord[]
  /** 3 everybody knows it, 2 most do, 1 some do */
  known: 1 | 2 | 3
}

/**
 * Proverbs, idioms and stock phrases of everyday English, gathered here from common speech: no
 * titles, lyrics, brands or people, and nothing that is not gentle. Before each how well it is known
 * (3 everybody – 1 some); after a word that may be exchanged, its part.
 */
const LIST = `
3 stem:v the tide:n
1 turn:v the tide:n
1 swim:v against the tide:n
2 time:n and tide:n wait:v for no man:n
3 soaked to the skin:n
3 jump:v out of your skin:n
3 by the skin:n of your teeth:ns
1 comfortable in your own:j skin:n
1 save:v your skin:n
3 live:v and let:v live:v
3 live:v and learn:v
3 time:n will:x tell:v
3 time:n flies:vz
3 time:n after:x time:n
3 once upon a time:n
3 in the nick:n of time:n
3 a stitch:n in time:n saves:vz nine
3 all:x in good:j time:n
3 better:r late:r than never:r
3 make:v up for lost:j time:n
3 time:n is money:n
2 time:n heals:vz all:x wounds
1 a race:n against time:n
3 there's no:x time:n like the present:n
2 take:v your time:n
2 a sign:n of the times:ns
1 behind the times:ns
3 the time:n of your life:n
3 a matter:n of time:n
3 a matter:n of fact:n
1 a matter:n of course:n
3 no laughing:j matter:n
3 mind:n over:x matter:n
3 the heart:n of the matter:n
3 what's the matter:n
1 no matter:n what:x
3 beat:v around the bush:n
3 a bird:n in the hand:n is worth two:x in the bush:n
3 birds:ns of a feather:n
3 the early:j bird:n catches:vz the worm:n
3 a little bird:n told:vd me
1 light:j as a feather:n
1 a feather:n in your cap:n
1 free:j as a bird:n
1 a bird's eye:n view:n
1 night:n owl:n
1 as the crow:n flies:vz
1 a rare:j bird:n
3 seal:v the deal:n
3 a done:j deal:n
3 the real:j deal:n
3 a big:j deal:n
2 a great:j deal:n
1 a fair:j deal:n
1 a square:j deal:n
1 signed:vn sealed:vn and delivered:vn
3 over:x the moon:n
3 once in a blue:j moon:n
1 many:x moons:ns ago
2 ask:v for the moon:n
1 promise:v the moon:n
3 over:x and done:vn
2 over:x and over:x again:r
1 over:x and out:x
3 done:vn and dusted:vn
3 easier:r said:vn than done:vn
3 well:r done:vn
2 when all:x is said:vn and done:vn
3 head:n over:x heels:ns
3 safety:n in numbers:ns
1 a numbers:ns game:n
2 by the numbers:ns
1 days:ns are numbered:vn
3 number:n one:x
3 a friend:n in need:n
3 fair:j weather:n friend:n
3 friends:ns in high:j places:ns
1 the best:j of friends:ns
1 a man's best:j friend:n
3 wait:v and see:v
3 see:v you later:r
3 see:v eye:n to eye:n
3 see:v the light:n
3 long:j time:n no:x see:v
3 as far:r as the eye:n can see:v
1 seeing:vg is believing:vg
2 see:v you soon:r
3 made:vn to order:n
3 made:vn to measure:n
1 a match:n made:vn in heaven:n
1 self made:vn
2 tailor:n made:vn
1 home:n made:vn
2 made:vn for each:x other:x
1 made:vn of money:n
3 jack:n of all:x trades:ns
3 tricks:ns of the trade:n
1 trade:n secrets:ns
1 roaring:j trade:n
3 peace:n of mind:n
3 peace:n and quiet:n
2 hold:v your peace:n
1 peace:n on earth:n
2 make:v peace:n
1 piece:n of the action:n
3 a piece:n of cake:n
1 piece:n by piece:n
2 all:x in one:x piece:n
3 a new:j lease:n of life:n
3 practise:v what:x you preach:v
1 preach:v to the choir:n
3 reach:v for the stars:ns
3 reach:v for the sky:n
1 within easy:j reach:n
3 pearls:ns of wisdom:n
1 a string:n of pearls:ns
3 the world:n is your oyster:n
3 it's a small:j world:n
3 out of this:x world:n
3 the best:j of both:x worlds:ns
3 on top:n of the world:n
1 worlds:ns apart:r
1 a world:n of difference:n
3 give:v it a whirl:n
3 rhyme:n or reason:n
3 it stands:vz to reason:n
1 the voice:n of reason:n
3 everything happens:vz for a reason:n
1 the age:n of reason:n
3 raise:v the roof:n
3 raise:v the bar:n
1 set:v the bar:n
3 slow:r but sure:r
3 slow:j and steady:j wins:vz the race:n
3 in slow:j motion:n
1 slow:j on the uptake:n
3 for sure:j
3 a sure:j thing:n
2 sure:j enough:r
1 safe:j and sure:j
3 better:j safe:j than sorry:j
3 for better:j or worse:j
3 the sooner:r the better:r
3 the more:x the merrier:r
3 less:x is more:x
3 once more:x
3 more:x often than not:x
1 no:x more:x no:x less:x
3 bite:v off more:x than you can chew:v
3 more:x or less:x
1 what's more:x
3 give:v the devil his due:n
3 credit:n where credit's due:j
3 in due:j course:n
1 pay:v your dues:ns
1 make:v do:v and mend:v
3 do:v or die:v
3 how do:v you do:v
2 do:v your best:n
2 well:r to do:v
3 by the way:n
3 where there's a will:n there's a way:n
3 that's the way:n it goes:vz
3 lead:v the way:n
3 a long:j way:n to go:v
2 go:v a long:j way:n
1 the parting:n of the ways:ns
2 the only:j way:n is up:x
2 way:n to go:v
3 all:x the way:n
3 no:x way:n
2 out of the way:n
3 on the way:n
2 have it both:x ways:ns
2 mend:v your ways:ns
1 way:r off the mark:n
1 under:x way:n
2 rub:v someone up the wrong:j way:n
1 change:v your ways:ns
3 divide:v and conquer:v
3 love:n conquers:vz all:x
3 through thick:j and thin:j
2 thin:j on the ground:n
3 skating:vg on thin:j ice:n
3 into thin:j air:n
2 thick:j as thieves:ns
1 thick:j and fast:r
3 break:v the ice:n
3 the tip:n of the iceberg:n
3 cool:j as a cucumber:n
3 fine:j and dandy:j
3 cloud:n nine:x
3 read:v between the lines:ns
3 toe:v the line:n
3 draw:v the line:n
3 the bottom:j line:n
2 somewhere along the line:n
1 end:n of the line:n
3 drop:v me a line:n
1 top:j of the line:n
1 in the line:n of duty:n
1 hook:n line:n and sinker:n
3 cross:v the line:n
3 rain:n or shine:n
3 rise:v and shine:v
3 wine:v and dine:v
1 it's all:x fine:j by me
1 you can't have too much:x of a good:j thing:n
3 right:j as rain:n
3 come:v rain:n or shine:n
3 it never rains:vz but it pours:vz
2 take:v a rain:n check:n
3 save:v it for a rainy:j day:n
3 free:j rein:n
2 take:v the reins:ns
3 call:v it a day:n
3 seize:v the day:n
3 all:x in a day's work:n
3 every:x dog:n has its day:n
3 make:v hay:n while the sun:n shines:vz
3 the other:j day:n
3 day:n in day:n out
2 in this:x day:n and age:n
3 one:x of these:x days:ns
3 save:v the day:n
3 the good:j old:j days:ns
2 clear:j as day:n
1 tomorrow is another day:n
2 that'll be the day:n
3 make:v my day:n
3 crack:n of dawn:n
2 at the break:n of day:n
3 night:n and day:n
2 day:n by day:n
3 the light:n of day:n
1 a day:n to remember:v
2 in broad:j day:n light:n
1 early:j days:ns
1 halcyon:j days:ns
3 weather:v the storm:n
3 under:x the weather:n
3 a storm:n in a teacup:n
3 the calm:n before the storm:n
1 go:v down:x a storm:n
1 any:x port:n in a storm:n
1 lovely:j weather:n for ducks:ns
3 every:x cloud:n has a silver:j lining:n
3 head:n in the clouds:ns
1 under:x a cloud:n
3 three:x is a crowd:n
3 stand:v out from the crowd:n
3 follow:v the crowd:n
3 far:r and away:r
3 for crying:vg out loud:r
3 loud:j and clear:j
1 loud:j and proud:j
1 proud:j as a peacock:n
2 house:n proud:j
3 lost:vn and found:vn
3 lost:vn for words:ns
1 long:r lost:vn
2 get lost:vn in translation:n
3 love:n at first:j sight:n
3 first:r come:vn first:r served:vn
3 first:j things:ns first:r
3 safety:n first:r
2 first:j among equals:ns
1 first:j and foremost:r
1 in the first:j place:n
2 at first:j glance:n
3 bite:v the dust:n
3 when the dust:n settles:vz
1 gather:v dust:n
1 dust:n settles:vz
3 down:r to earth:n
3 salt:n of the earth:n
1 move:v heaven:n and earth:n
1 the ends:ns of the earth:n
3 talk:n is cheap:j
3 small:j talk:n
3 walk:v the walk:n
2 talk:v the talk:n
3 the talk:n of the town:n
1 talk:v of the devil:n
2 walk:v before you can run:v
3 a walk:n in the park:n
2 all:x walks:ns of life:n
3 worth its weight:n in gold:n
3 good:j as gold:n
3 a heart:n of gold:n
3 all:x that glitters:vz is not:x gold:n
1 strike:v gold:n
3 a pot:n of gold:n
2 worth:j your salt:n
3 home:n is where the heart:n is
3 cross:v my heart:n
3 eat:v your heart:n out
3 with all:x my heart:n
2 take:v heart:n
3 a change:n of heart:n
3 heart:n to heart:n
3 from the bottom:n of my heart:n
3 wear:v your heart:n on your sleeve:n
3 learn:v by heart:n
1 follow:v your heart:n
3 absence:n makes:vz the heart:n grow:v fonder:j
3 heart:n and soul:n
1 young:j at heart:n
1 heart:n of stone:n
1 not:x for the faint:j of heart:n
2 lose:v heart:n
3 body:n and soul:n
1 bare:v your soul:n
1 the life:n and soul:n of the party:n
1 a sole:j survivor:n
2 not:x a soul:n in sight:n
3 good:j for the soul:n
3 dear:j me
3 for dear:j life:n
3 nearest:j and dearest:j
1 hold:v dear:j
2 oh dear:j
2 yours sincerely:r
2 so near:r and yet so far:r
3 so far:r so good:j
2 near:j and dear:j
3 near:j miss:n
3 hit:n or miss:n
3 miss:v the boat:n
2 missed:vd the boat:n
1 not:x to be missed:vn
1 a miss:n is as good:j as a mile:n
3 rock:v the boat:n
3 whatever floats:vz your boat:n
3 push:v the boat:n out
2 up the creek:n without a paddle:n
3 plain:j sailing:n
3 plenty:x more:x fish:n in the sea:n
3 a fish:n out of water:n
1 a big:j fish:n in a small:j pond:n
1 an old:j sea:n dog:n
3 a drop:n in the ocean:n
3 like water:n off a duck's back:n
3 still:j waters:ns run:v deep:r
3 water:n under:x the bridge:n
3 test:v the water:n
1 blow:v out of the water:n
2 worth its weight:n in salt:n
2 take:v it with a pinch:n of salt:n
1 above the salt:n
3 turn:v over:x a new:j leaf:n
3 one:x good:j turn:n deserves:vz another
3 turn:v the tables:ns
2 turn:v the corner:n
3 leave:v no:x stone:n unturned:j
3 take:v turns:ns
3 point:n of no:x return:n
1 done:vn to a turn:n
1 turn:v of phrase:n
1 at every:x turn:n
1 a turn:n for the better:j
1 not:x know:v where to turn:v
1 turn:v of the century:n
2 take:v a leaf:n out of their book:n
1 shake:v like a leaf:n
3 take:v it or leave:v it
3 leave:v well:r alone:r
3 love:v it or leave:v it
2 make:v like a tree:n and leave:v
2 leave:v it at that:x
3 left:j right:j and centre:n
2 right:j and left:j
1 out of left:j field:n
2 a level:j playing:vg field:n
3 age:n before beauty:n
3 beauty:n is in the eye:n of the beholder:n
1 age:n is just a number:n
3 come:v of age:n
3 a golden:j age:n
1 ages:ns ago
3 act:v your age:n
1 a ripe:j old:j age:n
1 with age:n comes:vz wisdom:n
3 on the same:j page:n
3 turn:v the page:n
1 a page:n turner:n
3 centre:n stage:n
3 set:v the stage:n
1 all:x the rage:n
2 one:x and the same:j
2 same:j difference:n
2 it's all:x the same:j to me
3 meant:vn to be
1 well:r meant:vn
3 in mint:j condition:n
2 make:v a mint:n
2 put your mind:n to it
2 never:r mind:v
3 great:j minds:ns think:v alike:r
3 mind:v your own:j business:n
2 in two:x minds:ns
3 mind:v the gap:n
2 mind:v your manners:ns
3 out of sight:n out of mind:n
2 read:v my mind:n
1 bear:v in mind:n
3 make:v up your mind:n
1 presence:n of mind:n
1 an open:j mind:n
3 out of the blue:n
3 true:j blue:j
3 a dream:n come:vn true:j
2 dreams:ns come:v true:j
3 too good:j to be true:j
2 true:j to form:n
2 ring:v true:j
3 tried:vn and true:j
1 many:x a true:j word:n
1 true:j love:n
3 true:j colours:ns
2 true:j to type:n
3 good:j as new:j
3 brand:r new:j
2 happy:j new:j year:n
3 a whole:j new:j ball:n game:n
1 pastures:ns new:j
1 out with the old:n in with the new:n
3 once in a while:n
3 few:x and far:r between
2 quite a few:x
2 a man:n of few:x words:ns
2 you and me
3 you:x name:v it
3 you:x only live:v once
2 you:x know:v what:x I mean:v
3 you:x never:r know:v
3 thank:v you:x very:r much:x
3 thank:v you:x
3 after:x you:x
2 back:r to you:x
3 bless:v you:x
2 good:j for you:x
3 it takes:vz one:x to know:v one:x
3 wish:v you:x were here:r
2 wish:v you:x well:r
2 believe:v you:x me
2 lead:v you:x up the garden:n path:n
2 thank:v goodness:n
3 thank:v your lucky:j stars:ns
3 for goodness sake:n
3 laugh:v all:x the way:n to the bank:n
3 break:v the bank:n
1 bank:v on it
1 a bank:n holiday:n
3 draw:v a blank:n
2 point:n blank:j
2 to be frank:j
1 rank:n and file:n
1 pull:v rank:n
2 on the dot:n
2 not:x a lot:n
2 the whole:j lot:n
3 thanks:ns a lot:n
3 thanks:ns a million:x
3 hot:j off the press:n
3 a hot:j potato:n
2 too hot:j to handle:v
3 strike:v while the iron:n is hot:j
3 blow:v hot:j and cold:j
1 a watched:j pot:n never:r boils:vz
2 a different:j kettle:n of fish:n
1 put the kettle:n on
2 go:v to pot:n
3 tie:v the knot:n
3 waste:v not:x want:v not:x
3 ready:j or not:x
3 believe:v it or not:x
3 why:x not:x
3 forget:v me not:x
3 last:j but not:x least:j
3 not:x on my watch:n
2 not:x so fast:r
3 not:x my cup:n of tea:n
2 not:x a minute:n too soon:r
1 touch:v me not:x
2 whether or not:x
3 love:v me love:v me not:x
1 live:v to tell:v the tale:n
3 all's well:r that ends:vz well:r
2 all:x the best:n
3 all:x for one:x and one:x for all:x
3 all:x or nothing:n
2 all:x in all:x
3 after:x all:x
3 above:x all:x
3 free:j for all:x
2 one:x for all:x
3 once and for all:x
3 all's fair:j in love:n and war:n
3 fair:j and square:j
3 fair:j enough:r
2 fair:j play:n
2 fair's fair:j
1 fair:j to middling:j
1 fair:j game:n
3 all:x work:n and no:x play:n
3 child's play:n
3 play:v it by ear:n
3 play:v your cards:ns right:r
3 play:v for time:n
2 play:v the game:n
2 foul:j play:n
1 play:v second:j fiddle:n
3 a play:n on words:ns
2 power:n play:n
1 play:v to the gallery:n
3 make:v or break:v
3 shall we dance:v
3 song:n and dance:n
2 for a song:n
2 lead:v a merry:j dance:n
3 eat:v drink:v and be merry:j
2 very:r merry:j
2 merry:j go:v round:r
1 a very:r important:j person:n
3 bury:v the hatchet:n
1 bury:v your head:n in the sand:n
2 thank:v you:x very:r much:x indeed:r
1 be that:x as it may
3 so be:v it
3 be:v my guest:n
3 be:v all:x and end:v all:x
3 be:v careful:j what:x you wish:v for
2 to be:v sure:j
2 be:v good:j
2 be:v there or be:v square:j
2 be:v yourself
2 boys:ns will:x be:v boys:ns
3 let:v bygones:ns be:v bygones:ns
1 the powers:ns that be:v
3 here today:r gone:vn tomorrow:r
3 here:r and there:r
3 here:r we go:v again:r
2 here:r goes:vz nothing:n
2 there there
2 a hair's breadth:n
3 let:v your hair:n down:r
3 bad:j hair:n day:n
3 split:v hairs:ns
1 keep your hair:n on
2 rest:v in peace:n
2 rest:v assured:vn
3 no:x rest:n for the wicked:n
2 put your feet:ns up
1 the rest:n is history:n
1 a well:r earned:vn rest:n
3 a matter:n of trust:n
2 must:x try:v harder:r
2 a must:n have:v
2 just:r a minute:n
3 just:r in time:n
3 just:r in case:n
2 just:r like that:x
3 just:j deserts:ns
2 just:r the ticket:n
2 just:r what:x the doctor:n ordered:vd
2 just:r my luck:n
1 only just:r
2 just:r for fun:n
2 jump:v on the bandwagon:n
3 jump:v for joy:n
3 pride:n and joy:n
2 tears:ns of joy:n
3 make:v a move:n
3 get:v a move:n on
3 on the move:n
2 move:v over:x
2 move:v with the times:ns
1 moving:vg house:n
1 move:v the goalposts:ns
3 labour:n of love:n
2 love:n makes:vz the world:n go:v round:r
2 all's fair:j in love:n
3 fit:v like a glove:n
3 hand:n in glove:n
3 hand:n in hand:n
3 lend:v a hand:n
2 give:v a helping:j hand:n
3 a helping:j hand:n
2 out of hand:n
3 second:j hand:n
2 old:j hand:n
2 on the other:j hand:n
3 know:v it like the back:n of my hand:n
2 all:x hands:ns on deck:n
3 many:x hands:ns make:v light:j work:n
1 time:n on your hands:ns
1 show:n of hands:ns
3 stand:v up and be counted:vn
3 stand:v your ground:n
3 stand:v and deliver:v
3 stand:v the test:n of time:n
2 stand:v on ceremony:n
1 make:v a stand:n
1 the last:j stand:n
2 one:x night:n only:r
3 good:j night:n sleep:v tight:r
3 sleep:v like a log:n
3 let:v sleeping:j dogs:ns lie:v
3 sleepless:j nights:ns
3 beauty:n sleep:n
1 sleep:v on it
3 in your dreams:ns
3 sweet:j dreams:ns
2 a dream:n team:n
3 living:vg the dream:n
2 beyond your wildest:j dreams:ns
1 a pipe:n dream:n
1 dream:v on
2 work:v like a dream:n
3 let:v off steam:n
3 full:j steam:n ahead:r
1 run:v out of steam:n
2 pick:v up steam:n
3 short:j and sweet:j
3 home:n sweet:j home:n
3 sweet:j and sour:j
3 a sweet:j tooth:n
2 sweet:j nothings:ns
2 revenge:n is sweet:j
1 the sweet:j smell:n of success:n
1 meet:v in the middle:n
3 make:v ends:ns meet:v
2 meet:v and greet:v
2 fancy:v meeting:vg you:x here:r
2 nice:j to meet:v you:x
3 tickle:v your fancy:n
3 footloose:j and fancy:j free:j
2 take:v a fancy:n to
1 flight:n of fancy:n
2 fancy:v that:x
2 fancy:v free:j
3 in the heat:n of the moment:n
2 if you can't stand:v the heat:n
3 turn:v up the heat:n
3 march:v to the beat:n of your own:j drum:n
2 heart:n skips:vz a beat:n
3 off the beaten:j track:n
2 hard:j to beat:v
2 can't beat:v it
2 back:r to the beginning:n
2 neat:j and tidy:j
2 treat:v yourself
3 trick:n or treat:n
2 a treat:n in store:n
2 my treat:n
1 go:v down:x a treat:n
2 bitter:j sweet:j
2 to the bitter:j end:n
3 once bitten:vn twice shy:j
3 cold:j feet:ns
3 out in the cold:n
1 cold:j comfort:n
1 cold:j hands:ns warm:j heart:n
2 cold:j snap:n
2 leave:v me cold:j
2 you can't teach:v an old:j dog:n new:j tricks:ns
3 old:j habits:ns die:v hard:r
3 never:r say:v die:v
3 the die:n is cast:vn
2 cross:v my heart:n and hope:v to die:v
3 to die:v for
2 die:v of laughter:n
1 do:v it in style:n
2 tied:vn up in knots:ns
3 tongue:n tied:vn
3 fit:j to be tied:vn
2 my hands:ns are tied:vn
1 the ties:ns that bind:v
2 old:j school:n tie:n
2 a black:j tie:n affair:n
2 pull:v the strings:ns
2 tug:v at the heart:n strings:ns
3 hanging:vg by a thread:n
1 lose:v the thread:n
1 pick:v up the thread:n
3 the best:j thing:n since sliced:j bread:n
3 bread:n and butter:n
2 know:v which side:n your bread:n is buttered:vn
1 break:v bread:n
2 full:j speed:n ahead:r
2 quit:v while you're ahead:r
2 tread:v carefully:r
2 tread:v water:n
2 tread:v the boards:ns
2 go:v ahead:r
3 off the top:n of my head:n
2 keep a cool:j head:n
3 head:n and shoulders:ns above:x
2 two:x heads:ns are better:j than one:x
2 heads:ns up
2 over:x my head:n
3 hit the nail:n on the head:n
3 bed:n of roses:ns
2 you've made:vn your bed:n
2 early:r to bed:n early:r to rise:v
3 get:v out of bed:n on the wrong:j side:n
2 time:n for bed:n
3 bed:n and breakfast:n
3 paint:v the town:n red:j
2 a man:n about town:n
3 see:v red:j
3 roll:v out the red:j carpet:n
2 caught red:r handed:j
1 a red:j letter:n day:n
3 a red:j herring:n
3 rise:v to the occasion:n
2 give:v rise:n to
2 rise:v from the ashes:ns
1 early:j riser:n
2 keep your nose:n clean:j
3 follow:v your nose:n
3 on the nose:n
2 pay:v through the nose:n
2 by a nose:n
2 under:x your nose:n
1 nose:n to the grindstone:n
2 turn:v up your nose:n
3 keep you:x on your toes:ns
2 from head:n to toe:n
2 dip:v a toe:n in the water:n
2 on your toes:ns
3 anything goes:vz
2 that's how:x it goes:vz
3 money:n doesn't grow:v on trees:ns
3 money:n talks:vz
2 money:n makes:vz the world:n go:v round:r
3 a run:n for your money:n
2 in the money:n
2 money:n for old:j rope:n
2 pocket:n money:n
1 put your money:n where your mouth:n is
2 more:x money:n than sense:n
2 time:n and money:n
3 put your best:j foot:n forward:r
2 one:x foot:n in front:n of the other:x
2 put your foot:n down:r
3 get:v off on the wrong:j foot:n
3 foot:v the bill:n
3 follow:v suit:n
3 suit:v yourself
2 strong:j suit:n
2 suited:vn and booted:vn
3 the whole:j truth:n
2 the whole:j story:n
3 on the whole:n
2 a whole:j world:n away:r
2 the whole:j shebang:n
2 score:v a goal:n
3 own:j goal:n
2 have a ball:n
2 the ball's in your court:n
3 get:v the ball:n rolling:vg
3 on the ball:n
2 drop:v the ball:n
2 call:n of duty:n
3 a close:j call:n
2 on call:n
2 a wake:v up call:n
3 a tall:j story:n
1 a tall:j order:n
2 stand:v tall:r
3 all:x great:j and small:j
2 the small:j print:n
3 small:j change:n
2 small:j wonder:n
2 for the long:j haul:n
3 state:n of the art:n
2 state:n of play:n
2 a state:n of grace:n
2 fall:v from grace:n
3 saving:j grace:n
2 coup:n de grace:n
2 say:v grace:n
3 fall:v into place:n
3 all:x over:x the place:n
3 a place:n in the sun:n
3 there's no:x place:n like home:n
2 pride:n of place:n
2 a place:n for everything:n
2 a time:n and a place:n
2 between a rock:n and a hard:j place:n
2 out of place:n
2 in the right:j place:n at the right:j time:n
3 a home:n from home:n
3 nothing:n to write:v home:x about
3 make:v yourself at home:n
2 home:n truths:ns
2 the lights:ns are on but nobody's home:n
2 bring:v home:r the bacon:n
1 home:n and dry:j
3 high:j and dry:j
2 leave:v no:x trace:n
3 face:v the music:n
2 face:n to face:n
2 save:v face:n
2 a face:n in the crowd:n
3 put a brave:j face:n on it
3 a straight:j face:n
2 keep a straight:j face:n
3 ace:n up your sleeve:n
3 roll:v up your sleeves:ns
2 laugh:v up your sleeve:n
2 hold:v all:x the aces:ns
2 in case:n of emergency:n
3 worst:j case:n scenario:n
2 a worst:j case:n scenario:n
2 the worst:n of it
2 if the worst:n comes:vz to the worst:n
1 case:n closed:vn
2 an open:j and shut:j case:n
1 a basket:n case:n
3 rest:v my case:n
3 cut:v to the chase:n
3 a wild:j goose:n chase:n
2 the race:n is on
2 a one:x horse:n race:n
3 horses:ns for courses:ns
3 hold:v your horses:ns
3 a dark:j horse:n
3 straight:r from the horse's mouth:n
2 never:r look:v a gift:n horse:n in the mouth:n
3 put the cart:n before the horse:n
3 par:n for the course:n
3 stay:v the course:n
3 of course:n
2 run:v its course:n
2 a crash:n course:n
3 word:n of mouth:n
3 mum's the word:n
2 in a word:n
2 word:n for word:n
2 the last:j word:n
3 a word:n to the wise:n
2 words:ns fail:v me
3 in other:j words:ns
2 household:n word:n
2 my word:n
2 word:n perfect:j
2 from the word:n go:v
3 out of the frying:vg pan:n into the fire:n
3 where there's smoke:n there's fire:n
3 play:v with fire:n
2 on fire:n
2 sit:v by the fire:n
2 get on like a house:n on fire:n
3 no:x smoke:n without fire:n
3 go:v up in smoke:n
2 holy:j smoke:n
3 old:j flame:n
2 fan:v the flames:ns
2 up in flames:ns
3 what's in a name:n
2 a name:n to conjure with
3 the name:n of the game:n
2 make:v a name:n for yourself
2 a household:n name:n
3 claim:n to fame:n
2 stake:v a claim:n
3 ahead:r of the game:n
2 two:x can play:v at that:x game:n
2 the game:n is up
2 give:v the game:n away:r
2 the blame:n game:n
2 a crying:j shame:n
2 shame:n on you:x
2 something to remember:v
3 straight:j and narrow:j
3 straight:j as an arrow:n
2 a narrow:j escape:n
2 keep to the straight:j and narrow:n
2 never:r put off till tomorrow:n
2 like there's no:x tomorrow:n
3 the moral:n of the story:n
2 a cautionary:j tale:n
3 a fairy:n tale:n
2 an old:j wives' tale:n
2 tell:v tale:n signs:ns
3 beyond the pale:n
3 hale:j and hearty:j
2 hit the trail:n
2 blaze:v a trail:n
3 heads:ns or tails:ns
2 without fail:n
3 snail:n mail:n
3 at a snail's pace:n
2 set:v sail:n
2 smooth:j sailing:n
2 for sale:n
1 tip:v the scales:ns
1 on a grand:j scale:n
2 keep pace:n
2 change:n of pace:n
3 go:v to town:n
3 upside:r down:r
3 ups:ns and downs:ns
2 down:x and out:x
3 down:x the drain:n
2 down:r the hatch:n
2 down:x under:x
2 down:r in the dumps:ns
3 down:x to the wire:n
2 crowning:j glory:n
3 jewel:n in the crown:n
2 the crown:n jewels:ns
2 turn:v that:x frown:n upside:r down:r
3 round:r the clock:n
2 against the clock:n
2 like clock:n work:n
2 turn:v back:r the clock:n
2 beat:v the clock:n
3 solid:j as a rock:n
2 on the rocks:ns
2 rock:n solid:j
3 rock:n bottom:n
3 under:x lock:n and key:n
3 lock:n stock:n and barrel:n
3 knock:v on wood:n
3 knock:v your socks:ns off
3 pull:v your socks:ns up
2 stop:v the clock:n
2 school:n of hard:j knocks:ns
2 sitting:vg duck:n
3 all:x your ducks:ns in a row:n
2 lucky:j duck:n
3 pot:n luck:n
3 beginner's luck:n
3 good:j luck:n
2 as luck:n would have it
3 push:v your luck:n
2 third:j time:n lucky:j
3 stroke:n of luck:n
2 thank:v your lucky:j star:n
2 star:n struck:vn
3 written:vn in the stars:ns
3 shooting:j star:n
2 born:vn under:x a lucky:j star:n
2 a rising:j star:n
2 starry:j eyed:j
2 by far:r
3 far:r and wide:r
2 far:r from it
2 go:v too far:r
2 wide:r of the mark:n
2 on your marks:ns
2 leave:v your mark:n
2 hit the mark:n
2 a question:n mark:n
3 in the dark:n
3 a leap:n in the dark:n
2 a shot:n in the dark:n
2 whistling:vg in the dark:n
2 its bark:n is worse:j than its bite:n
3 barking:vg up the wrong:j tree:n
2 bright:j spark:n
2 sparks:ns fly:v
2 bright:j eyed:j and bushy:j tailed:j
3 look:v on the bright:j side:n
3 bright:j and early:r
3 in the near:j future:n
2 back:r in the day:n
2 back:r on track:n
2 on the right:j track:n
2 lose:v track:n of time:n
3 back:r to basics:ns
3 back:r to square:j one:x
3 back:r to the drawing:vg board:n
2 get:v your own:j back:n
2 watch:v your back:n
2 behind your back:n
2 get:v the knack:n
2 fade:v to black:j
3 in black:j and white:j
2 pitch:r black:j
3 right:j on the money:n
2 right:j as ninepence:n
2 the right:j stuff:n
2 a step:n in the right:j direction:n
2 put things:ns right:r
2 get:v it right:r
2 all:r right:j on the night:n
2 right:r away:r
2 right:r on time:n
3 right:r on cue:n
2 right:j of way:n
2 two:x wrongs:ns don't make:v a right:n
2 right:r under:x your nose:n
2 might:n is right:n
2 high:j and mighty:j
2 as right:j as rain:n
3 out like a light:n
3 light:n at the end:n of the tunnel:n
2 bring:v to light:n
2 green:j light:n
2 light:j hearted:j
2 light:n of my life:n
2 make:v light:n of it
2 shed:v some light:n
2 trip:v the light:n fantastic:j
3 ships:ns that pass:v in the night:n
2 a night:n on the tiles:ns
2 make:v a night:n of it
2 in the still:n of the night:n
3 a knight:n in shining:j armour:n
2 a white:j knight:n
1 a bite:n to eat:v
3 sight:n for sore:j eyes:ns
2 set:v your sights:ns
2 a sight:n to behold:v
2 catch:v sight:n
2 see:v the sights:ns
2 second:j sight:n
2 hindsight:n is a wonderful:j thing:n
3 sink:v or swim:v
3 everything but the kitchen:n sink:n
2 that sinking:j feeling:n
3 think:v outside the box:n
3 think:v twice
2 think:v again:r
2 come:v to think:v of it
3 food:n for thought:n
3 penny:n for your thoughts:ns
2 food:n and drink:n
2 drink:v it in
3 missing:j link:n
2 the weakest:j link:n
3 tickled:vn pink:j
3 in the pink:n
2 in the wink:n of an eye:n
2 quick:j as a wink:n
2 a nod:n and a wink:n
3 forty winks:ns
2 sleep:v a wink:n
2 on the brink:n
3 in the blink:n of an eye:n
2 on the blink:n
3 rule:n of thumb:n
2 under:x the thumb:n
3 stick:v out like a sore:j thumb:n
3 thumbs:ns up
3 easy:r come:v easy:r go:v
2 come:v what:x may
3 come:v full:j circle:n
2 come:v and get:v it
2 come:v to grief:n
2 come:v to light:n
2 come:v clean:r
3 stop:v and smell:v the roses:ns
2 rose:r tinted:j glasses:ns
2 win:v some lose:v some
2 and then some
3 from dawn:n to dusk:n
2 from here:r to eternity:n
3 from rags:ns to riches:ns
2 from scratch:n
2 up to scratch:n
3 start:v from scratch:n
3 meet:v your match:n
2 the perfect:j match:n
2 game:n set:n and match:n
2 strike:v a match:n
3 catch:v my drift:n
2 catch:v of the day:n
2 catch:v your breath:n
2 play:v catch:n up
3 watch:v this:x space:n
3 watch:v your step:n
2 watch:v the time:n
2 on my watch:n
2 night:n watch:n
2 watch:v it
2 keep watch:n
2 take:v the hint:n
2 drop:v a hint:n
2 leave:v no:x one:x behind
3 set:v in stone:n
3 a stone's throw:n
3 sticks:ns and stones:ns
3 a rolling:j stone:n gathers:vz no:x moss:n
2 carved:vn in stone:n
2 stepping:j stone:n
2 home:r alone:r
2 let:v alone:r
2 a bone:n to pick:v
3 bone:r dry:j
3 dry:j as a bone:n
2 bone:r idle:j
2 all:x on your own:n
2 in a class:n of your own:n
2 a mind:n of its own:n
2 hold:v your own:n
2 come:v into your own:n
2 on your own:n
3 reap:v what:x you sow
3 reap:v what:x you've sown:vn
2 as you sow so shall you reap:v
3 sow your wild:j oats:ns
2 feeling:vg your oats:ns
2 off your oats:ns
3 a chip:n off the old:j block:n
3 things:ns are not:x what:x they seem:v
2 it would seem:v so
2 not:x what:x it seems:vz
2 pick:v and choose:v
3 pick:n of the bunch:n
2 pick:v of the crop:n
2 take:v your pick:n
3 cream:n of the crop:n
2 crop:v up
3 every:x trick:n in the book:n
2 do:v the trick:n
2 up to your old:j tricks:ns
2 quick:r on the draw:n
3 quick:j as a flash:n
2 quick:j as lightning:n
2 kick:v up your heels:ns
2 kick:v the habit:n
2 stick:v together:r
2 more:x sticks:ns than carrots:ns
2 get:v the wrong:j end:n of the stick:n
3 by hook:n or by crook:n
3 off the hook:n
3 by the book:n
2 one:x for the books:ns
3 look:v before you leap:v
2 look:v on the bright:j side:n of life:n
2 look:v sharp:r
2 look:v and learn:v
3 don't judge:v a book:n by its cover:n
2 cover:n to cover:n
2 take:v cover:n
2 run:v for cover:n
2 sober:j as a judge:n
2 won't budge:v an inch:n
3 give:v them an inch:n and they take:v a mile:n
2 every:x inch:n
2 inch:n by inch:n
2 within an inch:n
2 feel:v the pinch:n
2 in a pinch:n
2 at a pinch:n
2 it's a cinch:n
2 when in doubt:n
3 without a shadow:n of a doubt:n
2 beyond doubt:n
2 reasonable:j doubt:n
2 no:x doubt:n about it
3 out and about:r
2 inside:r out:r
2 something to shout:v about
2 on a roll:n
2 roll:v with it
3 rock:n and roll:n
2 role:n reversal:n
2 role:n model:n
3 help:v yourself
2 a cry:n for help:n
2 a little help:n from your friends:ns
2 cry:v wolf:n
2 well:r I never:r
2 wishing:j well:n
2 all's well:j
2 well:r and truly:r
2 well:r read:vn
2 alive:j and well:j
2 oh well:r
2 well:r said:vn
2 leave:v well:r enough:r alone:r
3 clear:j as a bell:n
2 sound:j as a bell:n
3 saved:vn by the bell:n
2 ring:v a bell:n
3 bells:ns and whistles:ns
3 wet:v your whistle:n
3 clean:j as a whistle:n
2 whistle:v while you work:v
3 squeaky:r clean:j
3 a clean:j slate:n
2 a clean:j sweep:n
2 make:v a clean:j breast:n of it
2 seen:vn and not:x heard:vn
2 seen:vn better:j days:ns
2 ring:v the changes:ns
3 lean:j and mean:j
3 keen:j as mustard:n
2 by all:x means:ns
2 a means:n to an end:n
3 cut:v the mustard:n
2 pass:v muster:n
2 wear:v and tear:n
2 tear:v a strip:n off
2 there's the rub:n
2 fill:v your cup:n
2 under:x your own:j steam:n
2 under:x the radar:n
2 six of one:x half:n a dozen of the other:x
3 no:x wonder:n
2 work:v wonders:ns
2 nine:x days' wonder:n
2 steal:v a march:n
3 steal:v the show:n
3 steal:v the limelight:n
2 what:x a steal:n
2 steal:v someone's thunder:n
2 steal:v a kiss:n
3 nerves:ns of steel:n
2 show:v the way:n
2 best:j in show:n
3 show:v and tell:v
2 show:v off
2 for all:x I know:v
2 know:v your own:j mind:n
2 know:v it all:x
3 know:v the ropes:ns
2 in the know:n
2 what:x do:v you know:v
2 it's not:x what:x you know:v
2 know:v your onions:ns
3 go:v with the flow:n
2 go:v for it
2 go:v with a bang:n
2 go:v the extra:j mile:n
2 go:v against the grain:n
3 ready:j steady:j go:v
3 touch:n and go:n
2 no:x go:n
2 on the go:n
2 have a go:n
3 no:x pain:n no:x gain:n
2 a pain:n in the neck:n
3 against the grain:n
2 a grain:n of truth:n
3 train:n of thought:n
2 ill:j gotten:j gains:ns
2 once again:r
2 time:n and again:r
3 now:r and again:r
2 again:r and again:r
2 never:r again:r
2 try:v try:v and try:v again:r
2 try:v before you buy:v
2 don't try:v this:x at home:n
3 by and by
3 by and large:r
2 by the by
3 buy:v one:x get:v one:x free:j
2 a good:j buy:n
2 money:n can't buy:v happiness:n
2 bye:x for now:r
2 my oh my
2 why:x me
3 pie:n in the sky:n
3 easy:j as pie:n
2 blue:j sky:n thinking:n
3 the sky's the limit:n
3 eat:v humble:j pie:n
2 sky:n high:j
2 high:j time:n
3 high:j five:x
2 high:j hopes:ns
2 high:j and low:j
2 in high:j spirits:ns
2 on a high:j note:n
2 aim:v high:r
2 hopes:ns and dreams:ns
2 hope:n springs:vz eternal:j
2 beyond hope:n
2 a glimmer:n of hope:n
3 a ray:n of hope:n
3 a ray:n of sunshine:n
2 out of options:ns
2 top:j of the class:n
3 top:n of the morning:n
3 top:j notch:n
3 over:x the top:n
2 come:v out on top:n
2 tip:n top:j
2 the top:j brass:n
3 cherry:n on top:n
2 top:n to toe:n
3 at the drop:n of a hat:n
2 drop:v everything:n
3 shop:v till you drop:v
3 a drop:n in the bucket:n
2 stop:v at nothing:n
2 pull:v out all:x the stops:ns
3 that's that:x
3 hats:ns off to you:x
2 old:j hat:n
2 keep it under:x your hat:n
2 throw:v your hat:n in the ring:n
2 the cat's whiskers:ns
3 let:v the cat:n out of the bag:n
2 set:v the cat:n among the pigeons:ns
2 cat:n nap:n
2 fat:j chance:n
2 chew:v the fat:n
3 on the lam:n
3 jam:n packed:vn
2 jam:n tomorrow:r
2 money:n for jam:n
2 in a jam:n
2 traffic:n jam:n
2 a shadow:n of its former:j self:n
2 on the shelf:n
2 off the shelf:n
2 well:r well:r well:r
2 will:x you:x marry:v me
2 free:j will:n
3 fill:v the bill:n
2 goodwill:n to all:x
3 over:x the hill:n
2 head:v for the hills:ns
2 as old:j as the hills:ns
2 just:r for the thrill:n
2 take:v a chill:j pill:n
2 still:r going:vg strong:r
2 stand:v still:r
2 lamb:n dressed:vn as mutton:n
3 the bee's knees:ns
3 busy:j as a bee:n
2 a bee:n in your bonnet:n
3 weak:j at the knees:ns
2 down:r on one:x knee:n
3 cut:v corners:ns
2 just:r round:x the corner:n
2 corner:n the market:n
2 in my corner:n
2 tight:j corner:n
2 big:r on ideas:ns
3 the big:j picture:n
2 big:j time:n
2 dig:v deep:r
2 wide:r awake:j
2 wide:r eyed:j
3 give:v and take:v
3 icing:n on the cake:n
3 have your cake:n and eat:v it
3 takes:vz the cake:n
3 sell:v like hot:j cakes:ns
2 make:v no:x mistake:n
2 for old:j times' sake:n
2 leave:v nothing:n to chance:n
3 a second:j chance:n
2 stand:v a chance:n
2 last:j chance:n saloon:n
2 by any:x chance:n
2 tough:j as old:j boots:ns
2 tough:j cookie:n
3 call:v your bluff:n
3 enough:r said:vn
2 enough:x is enough:x
3 strut:v your stuff:n
2 know:v your stuff:n
2 the stuff:n of legend:n
3 diamond:n in the rough:n
2 take:v the rough:n with the smooth:n
3 off the cuff:n
2 in the buff:n
2 rough:j and ready:j
2 all:x the rest:n is gravy:n
2 the gravy:n train:n
2 hot:j to the touch:n
2 lose:v touch:n
2 soft:j touch:n
2 a finishing:j touch:n
2 keep in touch:n
2 the finishing:j touches:ns
2 clutch:v at straws:ns
3 the last:j straw:n
2 draw:v the short:j straw:n
2 the final:j straw:n
2 tarred:vn with the same:j brush:n
2 brush:v it off
2 brush:v up on
2 rush:n hour:n
2 no:x rush:n
2 in a rush:n
2 hush:v hush:v
2 in the flush:n of youth:n
2 first:j flush:n
2 flush:j with success:n
3 put the pedal:n to the metal:n
2 back:r pedal:v
2 settle:v for less:x
3 settle:v the score:n
2 settle:v down:r
2 know:v the score:n
2 copy:n cat:n
2 carbon:j copy:n
2 hard:j copy:n
3 sooner:r or later:r
2 see:v you:x after:x a while:n
3 happily ever:r after:r
2 after:x dark:n
2 morning:n after:x the night:n before:r
2 past:j master:n
3 easy:r does:vz it
2 easy:r peasy
2 easy:j on the eye:n
2 take:v it easy:r
3 free:j and easy:j
2 lazy:j days:ns of summer:n
2 lazy:j bones:ns
2 pop:v goes:vz the weasel:n
2 good:j as your word:n
3 good:j clean:j fun:n
2 good:j things:ns come:v in small:j packages:ns
2 good:j things:ns come:v to those who wait:v
2 all:x good:j things:ns must:x come:v to an end:n
3 a good:j egg:n
2 for good:j measure:n
2 too much:x of a good:j thing:n
2 up to no:x good:n
2 knock:v on the door:n
2 next:j door:n
2 open:j doors:ns
2 a foot:n in the door:n
3 close:r but no:x cigar:n
2 close:v the deal:n
2 close:r to home:n
2 too close:r for comfort:n
2 too little too late:r
2 too much:x too soon:r
2 none:x too soon:r
2 no:x time:n too soon:r
2 fashionably:r late:j
2 late:j in the day:n
2 never:r too late:j
2 clean:v the slate:n
2 early:j doors:ns
3 hit the road:n
2 all:x roads:ns lead:v to home:n
3 middle:n of the road:n
3 one:x for the road:n
2 the end:n of the road:n
2 road:n to nowhere:n
2 on the road:n
2 down:x the road:n
2 the high:j road:n
2 road:n to recovery:n
2 the road:n less:r travelled:vn
3 road:n trip:n
3 a load:n off my mind:n
2 get:v a load:n of this:x
2 loads:ns of fun:n
3 prodigal:j son:n
3 like father:n like son:n
2 have fun:n in the sun:n
3 fun:n and games:ns
2 under:x the sun:n
2 everything under:x the sun:n
2 second:j to none:x
3 run:v of the mill:n
2 hit the ground:n running:vg
2 up and running:vg
2 in the long:j run:n
2 cut:v and run:v
3 one:x in a million:x
2 one:x by one:x
3 one:x of a kind:n
3 one:x and only:j
2 one:x fell:j swoop:n
2 all:x in one:x
3 one:x step:n at a time:n
2 one:x thing:n leads:vz to another
2 guest:n of honour:n
2 win:v win:v
2 you:x can't win:v them all:x
2 winner:n takes:vz all:x
2 good:j for a laugh:n
2 have the last:j laugh:n
2 he who laughs:vz last:r laughs:vz longest:r
2 laughter:n is the best:j medicine:n
3 half:n and half:n
2 better:j half:n
2 my other:j half:n
2 half:j the battle:n
2 a glass:n half:r full:j
2 half:r hearted:j
2 too clever:j by half:n
2 a house:n divided:vn
2 a full:j house:n
3 full:j of beans:ns
2 full:j of surprises:ns
2 full:j to the brim:n
2 pull:v the other:x one:x
2 pull:v yourself together:r
3 nip:v it in the bud:n
2 buddy:n up
3 ship:n shape:n
2 a ship:n in full:j sail:n
3 jump:v ship:n
2 when your ship:n comes:vz in
3 in great:j shape:n
2 in good:j shape:n
3 the great:j outdoors:ns
3 great:j oaks:ns from little acorns:ns grow:v
2 the great:j unknown:n
2 no:x great:j shakes:ns
3 red:j tape:n
3 open:v sesame:n
2 lend:v me your ear:n
3 music:n to my ears:ns
2 all:x ears:ns
2 in one:x ear:n and out the other:x
2 a week:n is a long:j time:n
2 wet:j behind the ears:ns
2 grin:v and bear:v it
2 grin:n from ear:n to ear:n
2 live:v a little
3 life's a beach:n
2 not:x the only:j pebble:n on the beach:n
3 life's too short:j
3 the story:n of my life:n
3 larger:j than life:n
2 slice:n of life:n
2 get:v a life:n
3 the spice:n of life:n
2 variety:n is the spice:n of life:n
2 walk:n of life:n
2 bring:v to life:n
2 true:j to life:n
3 sugar:n and spice:n
2 the facts:ns of life:n
2 think:v nothing:n of it
2 sweet:j as honey:n
2 free:j as the wind
2 head:v in the right:j direction:n
2 cool:j calm:j and collected:j
3 at the helm:n
2 take:v the helm:n
2 beyond the realms:ns of possibility:n
3 different:j strokes:ns for different:j folks:ns
2 inside:j joke:n
2 crack:v a joke:n
3 that's all:x folks:ns
3 nothing:n ventured:vn nothing:n gained:vn
2 better:j the devil you:x know:v
3 take:v a liking:n to
2 taking:vg your chances:ns
2 take:v your chances:ns
2 on edge:n
3 over:x the edge:n
3 cutting:j edge:n
2 on the edge:n of your seat:n
2 sign:v the pledge:n
2 hedge:v your bets:ns
2 for old:j time's sake:n
3 flex:v your muscles:ns
2 pull:v a muscle:n
2 heel:n and toe:n
2 hot:j on your heels:ns
2 cool:j your heels:ns
2 kick:v your heels:ns
3 reinvent:v the wheel:n
2 a cog:n in the wheel:n
2 wheel:v and deal:v
2 wheels:ns within wheels:ns
2 put your shoulder:n to the wheel:n
3 get:v real:j
2 keep it real:j
2 feel:v the heat:n
2 feel:v free:j
2 free:j as air:n
3 a square:j meal:n
2 make:v a meal:n of it
2 seal:n of approval:n
2 stop:v press:n
2 a square:j peg:n in a round:j hole:n
3 elbow:n room:n
3 room:n for improvement:n
2 room:n at the top:n
2 room:n to spare:v
2 in full:j bloom:n
2 late:j bloomer:n
3 doom:n and gloom:n
2 gloom:n and doom:n
2 zoom:v in
2 the elephant:n in the room:n
2 clear:v the air:n
3 a breath:n of fresh:j air:n
3 walking:vg on air:n
3 castles:ns in the air:n
3 king:n of the castle:n
2 a hassle:n free:j life:n
2 up in the air:n
2 devil may care
2 bear:v with me
2 full:j of the joys:ns of spring:n
3 spring:n in your step:n
2 spring:n is in the air:n
3 spring:n clean:n
2 spring:v into action:n
2 swings:ns and roundabouts:ns
2 get:v into the swing:n
2 in full:j swing:n
2 swing:v by
2 take:v under:x your wing:n
2 wing:v it
3 spread:v your wings:ns
3 on a wing:n and a prayer:n
2 earn:v your stripes:ns
3 burn:v the midnight:n oil:n
2 burn:v your bridges:ns
2 oil:n and water:n
2 midnight:n feast:n
2 born:vn and bred:vn
2 born:vn yesterday:r
2 to the manner:n born:vn
2 born:vn with a silver:j spoon:n
3 too many:x cooks:ns spoil:v the broth:n
2 a thorn:n in your side:n
2 toot:v your own:j horn:n
3 blow:v your own:j trumpet:n
2 new:j born:vn
2 sworn:vn to secrecy:n
2 torn:vn between two:x
2 turn:v up trumps:ns
2 turn:v up for the books:ns
3 like two:x peas:ns in a pod:n
3 pleased:j as punch:n
2 pass:v the time:n
2 pass:v the buck:n
2 call:v it quits:ns
2 quite right:j
2 all:x quiet:j on the home:n front:n
2 quiet:j as a mouse:n
3 bait:n and switch:n
3 asleep:j at the switch:n
2 scratch:v an itch:n
3 fever:n pitch:n
2 perfect:j pitch:n
3 strike:v it rich:j
2 the idle:j rich:n
2 a stitch:n in time:n
3 in stitches:ns
2 waste:n of time:n
2 a taste:n of your own:j medicine:n
2 good:j taste:n
2 acquired:j taste:n
2 common:j sense:n
2 more:x haste:n less:x speed:n
2 waiting:vg in the wings:ns
3 picture:r perfect:j
3 practice:n makes:vz perfect:j
2 nobody's perfect:j
2 in perfect:j harmony:n
3 prim:j and proper:j
2 good:j and proper:j
2 cheap:j and cheerful:j
2 a bright:j idea:n
2 back:n to front:n
2 deep:j pockets:ns
2 in deep:j water:n
3 skin:n deep:j
2 jump:v in at the deep:j end:n
2 beauty:n is only skin:n deep:j
2 sleep:v tight:r
3 count:v sheep:n
3 count:v your blessings:ns
2 count:v me in
3 a blessing:n in disguise:n
2 mixed:j blessing:n
3 seventh:j heaven:n
2 for heaven's sake:n
3 thank:v heaven:n
2 good:j heavens:ns
2 heaven:n knows:vz
3 the apple:n of my eye:n
2 how do:v you like them apples:ns
3 an apple:n a day:n keeps the doctor:n away:r
2 eye:n catching:j
2 eye:n of the storm:n
2 keep an eye:n out
2 keep your eyes:ns peeled:vn
2 my eye:n
2 private:j eye:n
2 in the public:j eye:n
2 the naked:j eye:n
2 a pretty:j penny:n
3 pretty:j as a picture:n
2 sitting:vg pretty:r
2 in for a penny:n in for a pound:n
3 a penny:n saved:vn is a penny:n earned:vn
2 the penny:n drops:vz
2 ten a penny:n
2 two:x a penny:n
2 all:x dressed:vn up and nowhere:r to go:v
3 what:x goes:vz around comes:vz around
3 when in Rome
2 when it rains:vz it pours:vz
2 when pigs:ns fly:v
2 then and there:r
3 now:r and then:r
3 every:x now:r and then:r
2 method:n in the madness:n
2 sheer:j madness:n
3 sheer:j luck:n
2 sheer:j delight:n
3 sheer:j bliss:n
3 ignorance:n is bliss:n
2 red:j sky:n at night:n
2 wedded:j bliss:n
3 warm:j as toast:n
2 toast:n of the town:n
2 the most:x the merrier:r
2 make:v the most:x of it
2 coast:v along
3 the coast:n is clear:j
2 from coast:n to coast:n
2 coast:n to coast:n
2 perfect:j host:n
2 the ghost:n of a chance:n
3 happy:j as a lark:n
2 up with the lark:n
2 happy:j as a sandboy:n
2 happy:j ever:r after:r
2 happy:j go:v lucky:j
2 many:x happy:j returns:ns
2 a happy:j medium:n
2 wishful:j thinking:n
3 make:v a wish:n
3 best:j wishes:ns
2 what:x a pity:n
2 more's the pity:n
2 wise:r up
2 penny:n wise:j
2 older:j and wiser:j
2 climb:v the ladder:n
3 snakes:ns and ladders:ns
3 step:n by step:n
2 watch:v the pennies:ns
3 fly:v off the handle:n
2 fly:v by night:n
2 fly:v the nest:n
2 fly:v high:r
2 time:n to fly:v
2 fly:v on the wall:n
2 off the wall:n
2 the writing:n on the wall:n
3 fit:j as a fiddle:n
3 fit:j for a king:n
2 fit:j for a queen:n
3 keep calm:j and carry:v on
2 home:n spun:j
3 cash:n and carry:v
2 cash:n on delivery:n
2 cash:n in hand:n
2 dash:v of colour:n
2 make:v a splash:n
2 make:v a dash:n for it
3 in a flash:n
2 a flash:n in the pan:n
2 better:j luck:n next:j time:n
2 beg:v to differ:v
3 as different:j as chalk:n and cheese:n
2 by a long:j chalk:n
2 keep it simple:j
3 pure:j and simple:j
3 tie:v yourself in knots:ns
2 hidden:j depths:ns
2 rags:ns to riches:ns
2 go:v for a spin:n
2 in a spin:n
3 spin:v a yarn:n
3 hit the hay:n
3 a needle:n in a haystack:n
2 wolf:n in sheep's clothing:n
3 pull:v the wool:n over:x your eyes:ns
3 dyed:vn in the wool:n
2 cut:v from the same:j cloth:n
3 hue:n and cry:n
2 in the shade:n
2 made:vn in heaven:n
2 throw:v some shade:n
2 put in the shade:n
2 lady:n in waiting:vg
2 sitting:vg on the fence:n
2 common:j or garden:n
2 everything in the garden:n is lovely:j
2 old:j as time:n
2 next:j to nothing:n
2 sweet:j nothing:n
2 something for nothing:n
2 something is better:j than nothing:n
2 thanks:ns for nothing:n
2 early:j retirement:n
2 a new:j broom:n sweeps:vz clean:r
2 a force:n of nature:n
3 second:j nature:n
2 call:n of nature:n
2 let:v nature:n take:v its course:n
3 the grass:n is always:r greener:j
2 a snake:n in the grass:n
2 grass:n roots:ns
2 kick:v into the long:j grass:n
2 people:ns in glass:n houses:ns
2 touch:n of class:n
3 bold:j as brass:n
2 brass:n tacks:ns
2 get:v down:x to brass:n tacks:ns
2 bottom:n of the class:n
2 where there's muck:n there's brass:n
1 forever:r and a day:n
1 strange:j but true:j
1 stranger:j than fiction:n
1 a land:n of milk:n and honey:n
3 no:x use:n crying:vg over:x spilt:j milk:n
1 as good:j as it gets:vz
1 there's more:x where that:x came:vd from
1 mustn't grumble:v
1 not:x all:x it's cracked:vn up to be
1 in at the ground:n floor:n
1 neck:n and neck:n
1 the bare:j necessities:ns
1 keep your chin:n up
1 chin:n wag:n
1 a whale:n of a time:n
1 as pure:j as the driven:j snow:n
3 on cloud:n nine:x
`

function readIdiom(line: string): Idiom {
  const words = line
    .slice(2)
    .split(' ')
    .map((word): IdiomWord => {
      const [text, role] = word.split(':')
      return { text: text!, role: (role as Role | undefined) ?? null }
    })
  return {
    phrase: words.map(({ text }) => text).join(' '),
    words,
    known: Number(line[0]) as Idiom['known'],
  }
}

/** Our idioms, each once. */
export const IDIOMS: readonly Idiom[] = [
  ...new Map(
    LIST.trim()
      .split('\n')
      .map(readIdiom)
      .map((idiom) => [idiom.phrase, idiom]),
  ).values(),
]
