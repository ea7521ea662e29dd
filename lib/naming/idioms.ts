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
3 a piece:n of cake:n
1 piece:n by piece:n
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
3 for better:n or worse:n
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
3 through thick:n and thin:n
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
3 fit:v like a glove:n
3 hand:n in glove:n
3 hand:n in hand:n
3 lend:v a hand:n
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
3 shooting:j star:n
2 born:vn under:x a lucky:j star:n
2 a rising:j star:n
2 starry:j eyed:j
2 by far:r
3 far:r and wide:r
2 far:r from it
2 go:v too far:r
2 wide:r of the mark:n
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
1 on the lam:n
3 jam:n packed:vn
2 jam:n tomorrow:r
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
2 over:x the hill:n
2 head:v for the hills:ns
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
3 nothing:n ventured:vn nothing:n gained:vn
2 better:j the devil you:x know:v
3 take:v a liking:n to
2 taking:vg your chances:ns
2 take:v your chances:ns
2 on edge:n
2 over:x the edge:n
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
2 lady:n in waiting:vg
2 sitting:vg on the fence:n
2 common:j or garden:n
2 everything in the garden:n is lovely:j
2 old:j as time:n
2 next:j to nothing:n
2 sweet:j nothing:n
2 something for nothing:n
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
1 neck:n and neck:n
1 the bare:j necessities:ns
1 keep your chin:n up
1 chin:n wag:n
1 a whale:n of a time:n
1 as pure:j as the driven:j snow:n
3 on cloud:n nine:x
3 flavour:n of the month:n
3 a month:n of sundays
3 a figment:n of your imagination:n
3 at your beck and:x call:v
2 wake:v up and:x smell:v the coffee:n
2 coffee:n break:v
2 coffee:n morning:n
3 stiff:j upper:j lip:n
3 my lips:ns are:x sealed:vn
3 loose:j lips:ns sink:v ships:ns
3 a slip:n of the tongue:n
2 tongue:n in cheek:n
3 turn:v the other:x cheek:n
2 cheek:n to cheek:n
2 cheek:n by:x jowl
3 hide:v and:x seek:v
2 sneak:j peek:n
2 spring:n a leak:n
3 leap:n of faith:n
2 by:x leaps:ns and:x bounds:ns
3 in leaps:ns and:x bounds:ns
2 so:x to speak:v
2 speak:v for:x yourself
2 speak:v your mind:n
3 speak:v of the devil
3 actions:ns speak:v louder:r than:x words:ns
3 think:v before you:x speak:v
2 think:v on your feet:ns
2 think:v big:j
3 pretty:j please:v
2 please:v yourself
2 as:x you:x please:v
3 pleased:j to meet:v you:x
3 please:v and:x thank:v you:x
3 sick:j as:x a parrot:n
3 eager:j beaver:n
3 busy:j as:x a beaver:n
3 nit picking:n
2 nit wit:n
2 hit and:x run:v
2 hit the big:j time:n
2 tooth:n and:x nail:n
2 hard:j as:x nails:ns
2 nail:n biting:vg
2 fair:j shares:ns
3 share:v and:x share:v alike:r
2 lion's:x share:v
2 the lion's:x share:v
2 into the lion's:x den:n
3 what:x you:x see:v is what:x you:x get:v
3 puppy:n love:n
3 easy:r street:n
3 white:j as:x a sheet:n
3 on the right:j side:n
2 on the safe:j side:n
2 side:n by:x side:n
2 get:v up on the wrong:j side:n of bed:n
2 let:v the side:n down:r
3 pride:n comes:vz before a fall:n
2 down:r at heel:n
2 free:j fall:n
2 watch:v out
2 watch:v the birdie
3 mind:v your step:n
3 waste:v of space:n
2 up to speed:n
3 full:j of hot:j air:n
3 come:v to a head:n
2 go:v full:j tilt:n
2 at full:j tilt:n
3 up to the hilt:n
3 guilt:n trip:n
2 guilty:j as:x charged:vn
2 guilty:j pleasure:n
3 curiosity:n killed:vd the cat:n
3 kill:v two:x birds:ns with one:x stone:n
2 written:vn in stone:n
3 it's written:vn in the stars:ns
3 poker:n face:n
2 straight:j faced:vn
2 face:v the facts:ns
2 face:v value:n
2 a pretty:j face:n
3 a sight:n for:x sore:j eyes:ns
2 raise:v your glass:n
2 raise:v an eyebrow:n
2 raise:v the alarm:n
2 hair:n raising:vg
2 fund raiser:n
3 everything's coming:vg up roses:ns
3 stop:v and:x smell:v the flowers:ns
2 happy:j hour:n
2 the darkest:j hour:n
3 at the eleventh hour:n
2 our finest:j hour:n
2 after:x hours:ns
2 zero hour:n
2 small:j hours:ns
3 man:n of the hour:n
2 half:n an hour:n
2 flower:n power:n
2 power:n behind the throne:n
2 knowledge:n is power:n
3 power:n to the people:ns
2 people:ns pleaser:n
2 all:x things:ns to all:x people:ns
3 on purpose:n
2 fit:j for:x purpose:n
2 cross:v purposes:ns
2 at cross:v purposes:ns
3 get:v your act:v together:r
2 get:v it together:r
3 put two:x and:x two:x together:r
2 put our heads:ns together:r
2 stronger:j together:r
2 better:j together:r
3 get:v well:r soon:r
3 not:x out of the woods:ns yet:r
3 the best:j is yet:r to come:v
3 all:x bets:ns are:x off
3 safe:j bet:n
2 you:x bet:v
3 you:x bet:v your life:n
2 a losing:vg streak:n
2 a winning:vg streak:n
3 talk:v a blue:j streak:n
3 it's all:x greek:n to me
2 the naked:j truth:n
2 the home:n stretch:n
3 charity:n begins:vz at home:n
2 bring:v it home:n
3 in sickness:n and:x in health:n
3 a clean:j bill:n of health:n
2 in good:j health:n
2 health:n and:x safety:n
2 health:n is wealth:n
2 rude:j health:n
2 can't:x help:v it
2 help:v is at hand:n
3 be:v quick:j about it
3 beyond the call:n of duty:n
2 duty:n calls:vz
2 wake:v up call:n
2 call:v the tune:n
2 call:v the shots:ns
2 call:v a spade:n a spade:n
2 call:v time:n
2 curtain:n call:n
2 roll:v call:n
3 too close:r to call:v
2 nature:n calls:vz
3 cold:j shoulder:n
3 give:v the cold:n shoulder:n
3 a shoulder:n to cry:v on
2 shoulder:n to shoulder:n
3 a chip:n on your shoulder:n
3 stone:n cold:j sober:j
2 in cold:j blood:n
2 cold:j blooded
2 cold:j hard:j cash:n
2 cash:n cow:n
2 strapped:vn for:x cash:n
2 cash:n flow:n
3 flesh:n and:x blood:n
3 blood:n is thicker:j than:x water:n
3 bad:j blood:n
2 blood:n sweat:n and:x tears:ns
3 from:x bad:j to worse:j
2 clear:j as:x mud:n
3 not:x as:x bad:j as:x it looks
2 mad:j as:x a hatter:n
3 hopping:r mad:j
2 stark:r raving:r mad:j
3 raving:r mad:j
3 rave:v reviews:ns
2 safe:j haven:n
2 break:v even:r
2 even:r stevens
2 get:v even:r
2 even:r keel:n
3 on an even:r keel:n
3 odds:ns and:x ends:ns
3 against all:x odds:ns
2 at odds:ns
2 a nod:n is as:x good:j as:x a wink:n
3 take:v it for:x granted:vn
2 a promise:n is a promise:n
2 promises:ns promises:ns
2 a broken:j promise:n
2 travel:v light:n
3 travel:v broadens the mind:n
2 time:n travel:n
3 nothing:n but:x the truth:n
2 truth:n will:n out
2 half:n truths:ns
2 truth:n or:x dare:v
2 one:x way:n ticket:n
2 golden:j ticket:n
2 that's the ticket:n
2 meal:n ticket:n
2 sticky:j wicket:n
3 hope:n for:x the best:j
2 hope:n and:x pray:v
2 live:v in hope:n
2 hope:n against hope:n
2 no:x spring:n chicken:n
2 spring:n to mind:v
2 mood:n swings:ns
2 in the mood:n
3 in a good:j mood:n
2 love:n is blind:j
3 love:n me love:v my dog:n
2 no:x love:n lost:vn
2 tough:j love:n
3 tough:j luck:n
3 when:x the going:vg gets:vz tough:j
2 hang:v tough:j
3 too big:j for:x your boots:ns
2 to boot:n
3 a tough:j nut:n to crack:v
2 in a nutshell:n
2 nuts:ns and:x bolts:ns
2 wait:v your turn:n
2 wait:v for:x it
2 wait:v a minute:n
2 the waiting:vg game:n
2 ladies:ns first:j
2 lucky:j lady:n
2 first:j lady:n
2 first:j impressions:ns
2 first:j class:n
2 first:j aid:n
2 first:j and:x last:j
2 first:j base:n
3 first:j past:j the post:n
2 first:j hand:n
2 feet:ns first:j
2 touch:n base:n
2 off base:n
2 home:n base:n
2 famous:j last:j words:ns
2 last:j resort:n
2 the last:j resort:n
2 at long:j last:j
2 the last:j laugh:n
2 last:j minute:n
2 last:j ditch:n
2 last:j orders:ns
2 built:vn to last:j
2 on your last:j legs
3 blast:n from:x the past:j
2 past:j your bedtime:n
2 past:j its best:n
2 fast:r and:x loose:j
2 in the fast:r lane:n
2 fast:r forward:r
3 down:r memory:n lane:n
2 cast:vn pearls:ns before swine:n
2 pearls:ns before swine:n
2 mother:n of pearl:n
3 pick:v up the pieces:ns
2 bits:ns and:x pieces:ns
2 rest:v in pieces:ns
2 say:v your piece:n
3 two's company:n three's a crowd:n
2 part:v company:n
3 part:v and:x parcel:n
2 play:v your part:n
3 for:x the most:x part:n
2 look:v the part:n
2 drift:n apart:r
2 let:v it rip:v
3 best:j bib:n and:x tucker:n
2 get:v a grip:n
2 get:v to grips:ns
2 ego:n trip:n
2 day:n trip:n
3 it takes:vz two:x to tango
3 it takes:vz all:x sorts:ns
3 out of sorts:ns
2 warts:ns and:x all:x
2 keep the ball:n rolling:vg
3 a barrel:n of laughs:vz
2 scrape:v the barrel:n
2 over:x a barrel:n
3 scrape:v the bottom:j of the barrel:n
2 at your peril:n
3 the moral:n high:j ground:n
3 moral:n compass:n
2 moral:n support:n
2 moral:n fibre:n
2 moral:n victory:n
2 drown your sorrows:ns
3 more:x in sorrow:n than:x in anger:n
2 oceans apart:r
2 with open:j arms:ns
2 an open:j book:n
3 in my good:j books:ns
3 in the good:j books:ns
3 throw:v the book:n at
3 a turn:n up for:x the books:ns
2 oldest:j trick:n in the book:n
2 read:v the room:n
3 read:v all:x about it
3 read:v the small:j print:n
2 small:j print:n
2 fine:j print:n
3 read:v it and:x weep:v
2 well:r versed
2 well:r met:vn
3 hail:v fellow:n well:r met:vn
2 jolly:j good:j fellow:n
3 jolly:j good:j
3 by:x golly:n
2 off your trolley:n
2 say:v hello:n
3 wave:v goodbye:n
2 long:j goodbye:n
2 a fond:j farewell:n
2 fond:j memories:ns
2 a fresh:j start:n
3 false:j start:n
3 head:n start:n
3 start:v as:x you:x mean:v to go:v on
2 for:x starters:ns
2 a flying:vg start:n
3 a friend:n in need:n is a friend:n indeed:r
3 a shoulder:n to lean:j on
2 a good:j deed:n
3 no:x good:n deed:n goes:vz unpunished
3 lend:v me your ears:ns
3 the end:n justifies:vz the means:n
2 by:x no:x means:n
2 means:ns business:n
3 say:v what:x you:x mean:v
3 mean:v what:x you:x say:v
2 a happy:j ending:n
2 in the end:n
3 the end:n of the world:n
3 no:x end:n in sight:n
2 round:r the bend:n
3 the thin:j end:n of the wedge:n
2 dead:j end:n
3 week:n in week:n out
2 sweet:j talk:n
2 sweet:j spot:n
2 home:n from:x home:n
2 know:v your place:n
3 a place:n in history:n
3 rock:n around the clock:n
2 clockwork
2 beat:v the odds:ns
2 off beat:v
2 heart:n beat:v
3 never:r miss:n a beat:n
2 skip:v a beat:n
3 if:x you:x can't:x beat:v them join:v them
3 quick:j march:v
2 at large:r
2 living:vg large:r
3 left:j in the lurch:n
3 knocked:vn off your perch:n
3 much:x to my liking:n
3 out of the ordinary
2 fancy:v dress:n
2 a close:j shave:n
3 great:j escape:n
3 chilled:vn to the marrow:n
3 chilled:vn to the bone:n
3 close:r to the bone:n
3 work:v your fingers:ns to the bone:n
3 make:v no:x bones:ns about it
2 bare:v bones:ns
2 the bare:j essentials:ns
3 a safe:j pair:n of hands:ns
2 the upper:j hand:n
2 hand:n over:x fist:n
3 get:v out of hand:n
2 change:v hands:ns
3 hands:ns down:r
3 wash:v your hands:ns of it
2 dab:j hand:n
2 hand:n me downs:ns
3 calm:j down:r
3 slow:j down:r
2 breakdown:n
2 up for:x grabs:ns
2 grab:v a bite:n
3 pull:v up a chair:n
3 hang:v in there
3 ten:x out of ten:x
2 count:v to ten:x
2 in the frame:n
3 hall:n of fame:n
2 fame:n and:x fortune:n
3 fortune:n favours the brave:j
3 put on a brave:j face:n
2 hall:n mark:n
2 mark:n my words:ns
2 off the mark:n
3 quick:j off the mark:n
3 on your marks:ns get:v set:v go:v
2 make:v your mark:n
2 question:n mark:n
3 sharp:r as:x a tack
3 sharp:r as:x a razor:n
3 give:v it a rest:n
3 give:v it a try:v
3 give:v it your best:n shot:n
3 give:v it a go:n
3 give:v it your all:x
3 put to the test:n
2 the acid:j test:v
2 at your best:n
2 second:j best:j
2 sunday best:j
3 the best:j things:ns in life:n are:x free:j
3 the best:j laid:vn plans:ns
2 best:j of luck:n
3 best:j of the bunch:n
2 best:j before
2 feather:n your nest:n
2 the empty:j nest:n
2 make:v waves:ns
2 brain:n wave:n
2 brain:n storm:n
2 brain:n power:n
2 brain:n teaser:n
2 pick:v your brains:ns
2 rack:v your brains:ns
2 brains:ns and:x brawn:n
3 willy:x nilly
3 pillow:n talk:n
2 silly:j season:n
2 silly:j billy:n
2 a chilly:j reception:n
2 upsy daisy:n
3 fresh:j as:x a daisy:n
2 pushing up daisies:ns
2 crazy:j paving
2 partly:r cloudy
2 back:r to reality:n
2 back:r to school:n
3 back:r and:x forth:r
3 welcome:n back:r
2 bounce:v back:r
2 no:x looking back:r
2 bring:v back:r memories:ns
2 back:r seat:n driver:n
3 take:v a back:n seat:n
3 in the driving:vg seat:n
2 set:v the scene:n
3 get:v a handle:n on it
2 handle:v with care
2 fly:v the flag:n
2 the burning:vg question:n
2 time:n and:x motion:n
3 time:n and:x time:n again:r
3 time:n flies:vz when:x you're having:vg fun:n
3 time:n waits:vz for:x no man:n
2 time:n to spare:v
3 no:x time:n to lose:v
3 no:x time:n like the present:n
2 about time:n
2 half:n time:n
2 extra:j time:n
2 time:n out
2 bide your time:n
2 crunch:n time:n
2 bed:n time:n
2 story:n time:n
2 lunch:n time:n
2 time:n off
2 time:n to go:v
2 time:n to kill:v
3 time:n is of the essence:n
2 crime:n of passion:n
2 crime:n doesn't pay:v
3 partners:ns in crime:n
2 in your prime:n
2 prime:n of life:n
2 prime:n time:n
2 nursery rhyme:n
2 ten:x to one:x
2 serves:vz you:x right:j
2 all:x right:j
2 right:j now:r
3 sit:v tight:j
2 hold:v tight:j
2 good:j night:n
2 sleepless:j night:n
3 a bolt:n from:x the blue:n
2 boys:ns in blue:n
2 the blue:n yonder
2 black:j and:x blue:j
2 feeling:vg blue:j
2 point:n of view:n
2 a skeleton:n crew:n
2 a motley:j crew:n
2 motley:j crew:n
2 a new:j leaf:n
2 a new:j dawn:n
3 new:j kid:n on the block:n
2 new:j year's resolution:n
2 what's new:j
3 you:x are:x what:x you:x eat:v
2 cut:v it fine:j
3 with a fine:j tooth:n comb:n
3 fine:j tune:n
2 change:v your tune:n
3 to the tune:n of
2 fine:j dining:n
2 in fine:j form:n
2 a fine:j line:n
3 walk:v a fine:j line:n
3 a fine:j kettle:n of fish:n
3 the pot:n calling:vg the kettle:n black:j
2 on your mettle:n
2 show:v your mettle:n
2 test:v your mettle:n
2 heavy:j metal:n
3 a tower:n of strength:n
2 as:x you:x were:x
2 easily swayed:vn
2 not:x rocket:n science:n
3 look:v like a million:x dollars:ns
3 feel:v like a million:x dollars:ns
3 not:x in a million:x years:ns
3 the grand:j scheme:n of things:ns
2 the grand:j total:n
3 take:v one:x for:x the team:n
2 team:n spirit:n
2 team:n player:n
2 team:n work:n
2 dream:n team:n
3 teamwork:n makes:vz the dream:n work:n
2 pipe:n dream:n
2 like a dream:n
2 extreme:j measures:ns
2 a scream:n
3 service:n with a smile:n
2 crack:n a smile:n
2 all:x smiles:ns
2 worth your while:n
2 in style:n
2 out of style:n
3 if:x it ain't:x broke:vd don't fix:v it
2 go:v for:x broke:vd
2 practical:j joke:n
2 it's no:x joke:n
3 no:x joke:n
2 beyond a joke:n
3 smoke:n and:x mirrors:ns
2 up in smoke:n
2 smoke:n signals:ns
2 spoke:vd too soon:r
2 many:x a slip:n
2 many:x hands:ns
2 many:x a time:n
3 more:x than:x meets the eye:n
2 say:v no:x more:x
2 whatever:x next:j
2 what:x a relief:n
2 sigh:n of relief:n
2 beyond belief:n
3 good:j grief:n
3 each:x to their own:n
2 figure:n of speech:n
2 freedom:n of speech:n
2 free:j speech:n
2 peer:n pressure:n
3 fight:v fire:n with fire:n
2 fire:n away:r
2 hang:v fire:n
2 line:n of fire:n
2 fire:n drill:n
3 dire:j straits:ns
2 dire:j consequences:ns
2 in dire:j need:n
2 buyer:n beware:v
3 ready:j willing:j and:x able:j
3 cards:ns on the table:n
2 under:x the table:n
2 table:n manners:ns
2 on the cards:ns
3 a house:n of cards:ns
2 hard:j work:n
2 hard:j luck:n
2 die:v hard:r
2 hard:j of hearing:n
2 on guard:n
2 above board:n
2 across:x the board:n
2 bored:vn to tears:ns
2 bored:vn stiff:j
2 scared:vn stiff:j
2 what:x if:x
3 no:x ifs:ns or:x buts:ns
2 a big:j if:x
2 ifs:ns and:x buts:ns
2 sad:j but:x true:j
2 a bad:j apple:n
2 bad:j luck:n
2 stroke:n of genius:n
3 the luck:n of the draw:n
2 lucky:j break:v
3 give:v me a break:n
3 break:v a leg:n
3 shake:v a leg:n
2 pull:v my leg:n
2 beg:v your pardon:n
2 marks:ns the spot:n
2 on the spot:n
2 a soft:j spot:n
2 soft:j as:x butter:n
2 all:x the better:r
2 know:v better:j
2 no:x better:j place:n
3 against my better:j judgement:n
2 the bitter:j truth:n
3 a bitter:j pill:n to swallow:v
2 judge:v and:x jury:n
2 hold:v a grudge:n
2 won't budge:v
3 gone:vn but:x not:x forgotten:vn
3 jump:v the gun:n
3 smoking:vg gun:n
2 even:r though
3 from:x pillar:n to post:n
3 in the same:j boat:n
3 all:x in the same:j boat:n
2 compare:v notes:ns
3 make:v a note:n of it
2 get:v your goat:n
3 generous:j to a fault:n
3 grind:v to a halt:n
3 through no:x fault:n of your own:j
2 work:v and:x play:v
2 in a pickle:n
2 knuckle:v down:r
3 rap:n on the knuckles:ns
2 take:v the rap:n
2 rapt:j attention:n
2 that's a wrap:n
2 under:x wraps:ns
3 keep it under:x wraps:ns
2 your heart's desire:n
3 blind:j as:x a bat:n
3 right:j off the bat:n
3 not:x bat:n an eyelid:n
2 so:x what:x
2 so:x long:j
3 so:x much:x for:x that:x
2 every:x so:x often
3 you:x reap:v what:x you:x sow
3 a man:n of the world:n
3 birthday:n suit:n
3 in hot:j pursuit:n
3 put your foot:n in it
2 in front:n of
2 in the groove:n
3 what's good:j for:x the goose:n is good:j for:x the gander:n
3 every:x man:n for:x himself
2 every:x which way:n
2 every:x last:j one:x
2 power:n nap:n
3 the whole:j nine:x yards:ns
3 dressed:vn to the nines
2 dressed:vn to kill:v
2 dressed:vn to impress:v
2 second:j guess:n
2 second:j helping:j
3 your guess:n is as:x good:j as:x mine:n
2 lucky:j guess:n
2 no:x stress:n
3 a recipe:n for:x disaster:n
2 wear:v thin:j
3 vanish:v into thin:j air:n
3 you:x win:v some:x you:x lose:v some:x
2 win:v hands:ns down:r
2 in sync:n
2 the missing:j link:n
3 pen:n and:x ink:n
3 not:x sleep:v a wink:n
3 drink:v like a fish:n
3 you:x know:v what:x i mean:v
3 for:x all:x i know:v
2 on the ropes:ns
3 at the end:n of your rope:n
2 jump:v rope:n
2 learn:v the ropes:ns
2 who knows:vz
2 goodness:n knows:vz
3 as:x the saying:n goes:vz
2 go:v for:x gold:n
2 let:v go:v
2 let:v it go:v
3 the show:n must:x go:v on
2 blow:v the whistle:n
2 whistle:n stop:v tour:n
2 a guided:j tour:n
3 tour:n de force:n
2 join:v forces:ns
3 would:x you:x believe:v it
2 horse:n play:v
2 dark:n horse:n
2 crash:n course:n
3 gift:n of the gab:n
2 short:j shrift:n
2 get:v my drift:n
2 night:n shift:n
2 save:v your breath:n
3 neither:x here:r nor:x there
3 been:vn there done:vn that:x
2 a has been:vn
3 has been:vn
3 how:x have you:x been:vn
3 for:x the time:n being:vg
3 human:j being:vg
2 human:j nature:n
2 human:j error:n
2 follow:v the leader:n
3 leader:n of the pack:n
2 mind:v reader:n
2 nosey parker
2 good:j sport:n
2 spoil:v sport:n
2 a good:j sport:n
2 safe:j and:x sound:j
2 safe:j as:x houses:ns
2 paper:n trail:n
3 put pen:n to paper:n
2 on paper:n
2 paper:n tiger:n
2 speed:n demon:n
3 damsel:n in distress:n
3 tall:j dark:n and:x handsome:j
2 plumb:v the depths:ns
3 all:x fingers:ns and:x thumbs:ns
2 kingdom:n come:v
3 due:j diligence:n
2 due:j process:n
3 do:v the right:j thing:n
2 do:v it yourself
2 can't:x do:v
3 do:v as:x the romans do:v
2 when:x in rome
3 when:x the cat's away:r
2 muscle:n memory:n
2 muscle:n in
3 soul:n mate:n
3 soul:n searching:vg
2 save:v the date:n
3 salt:n and:x pepper:n
2 below the salt:n
2 early:j to bed:n
2 early:j bird:n
2 can of worms:ns
2 stepping:j stones:ns
3 all:x eyes:ns on you:x
3 feast:n your eyes:ns on
3 eyes:ns on the prize:n
3 eyes:ns in the back:n of your head:n
3 stars:ns in your eyes:ns
3 a far:r cry:n from:x
2 near:j and:x far:r
2 fish:n and:x chips:ns
3 the chips:ns are:x down:r
2 stumbling:vg block:n
2 a mixed:j bag:n
2 humble:j brag:n
2 in the bag:n
2 bag:n of tricks:ns
2 hat:n trick:n
2 does:vz the trick:n
3 raining:vg cats:ns and:x dogs:ns
3 it's a dog's:x life:n
3 dog:n eat:v dog:n
3 hot:j dog:n
3 top:j dog:n
3 a frog:n in your throat:n
2 all:x at sea:n
3 the key:n to success:n
3 the key:n to my heart:n
2 low:j key:n
2 off key:n
2 laughing:j stock:n
3 take:v stock:n
2 culture:n shock:n
3 high:j as:x a kite:n
3 go:v fly:v a kite:n
2 alive:j and:x kicking:vg
2 nine:x to five:x
2 bee:n line:n
2 make:v a beeline
3 the birds:ns and:x the bees:ns
2 back:r number:n
2 under:x control:n
2 under:x cover:n
3 cross:v that:x bridge:n when:x we come:v to it
2 build:v bridges:ns
2 bridge:n the gap:n
2 one:x hit wonder:n
2 duck:n and:x cover:n
2 duck:n dive:n
2 cut:v and:x dried:vn
3 dry:j as:x dust:n
2 leave:v for:x dust:n
2 steer:v clear:j
2 crystal:n clear:j
2 ins:ns and:x outs
2 without a doubt:n
3 beyond a shadow:n of a doubt:n
3 benefit:n of the doubt:n
2 chase:n your tail:n
3 sale:n of the century:n
2 lift:v the veil:n
3 draw:v a veil:n over:x it
3 never:r a dull:j moment:n
3 dull:j as:x ditch:n water:n
3 rolling:vg in the aisles:ns
3 walk:v down:r the aisle:n
3 you:x scratch:n my back:n
3 you:x must:x be:v joking:vg
3 whose turn:v is it
3 throw:v in the towel:n
2 last:j straw:n
2 clutching:vg at straws:ns
2 a straw:n poll:n
2 favourite:j son:n
3 the devil you:x know:v
2 figure:n of fun:n
3 poke:v fun:n
2 run:v rings:ns round:r
2 easy:r money:n
3 funny:j bone:n
2 funny:j business:n
2 milk:n and:x honey:n
2 hot:j and:x bothered:vn
2 warm:j welcome:n
2 warm:j hearted:j
2 get:v cold:j feet:ns
3 swept:vn off your feet:ns
2 two:x left:j feet:ns
3 land:n on your feet:ns
2 drag:v your heels:ns
2 take:v a bow:n
3 the man:n in the moon:n
2 break:v new:j ground:n
2 common:j ground:n
2 gain:n ground:n
2 high:j ground:n
3 from:x the ground:n up
2 safe:j passage:n
3 take:v the bull:n by:x the horns:ns
3 to the manor:n born:vn
3 battle:n lines:ns are:x drawn:vn
2 best:j case:n scenario:n
2 place:n your bets:ns
2 room:n service:n
3 no:x room:n at the inn:n
2 standing:vg room:n only:j
2 changing:vg room:n
3 if:x the cap:n fits:vz
3 if:x the shoe:n fits:vz
2 full:j house:n
2 at full:j stretch:n
3 good:j will:n to all:x
3 a thrill:n a minute:n
2 cheap:j thrills:ns
3 the thrill:n of the chase:n
2 fit:j the bill:n
3 fill:v in the blanks:ns
3 fake:v it till you:x make:v it
3 till death:n us:x do:v part:n
2 meet:v me halfway:r
3 till we meet:v again:r
3 nice:j try:v
2 nice:j and:x easy:j
2 nice:j one:x
3 sugar:n and:x spice:n and:x all:x things:ns nice:j
2 don't think:v twice
3 lightning:n never:r strikes twice
2 at any:x price:n
2 pay:v the price:n
3 a piece:n of advice:n
2 no:x dice:n
2 roll:v the dice:n
2 pushing your luck:n
2 make:v yourself useful:j
2 a poor:j excuse:n
2 call:v a truce:n
2 on the loose:j
3 let:v loose:j
2 needless:j to say:v
2 good:j for:x nothing:n
2 glutton:n for:x punishment:n
3 the patter:n of tiny:j feet:ns
3 cute:j as:x a button:n
3 bright:j as:x a button:n
2 button:v up
3 left:j to your own:j devices:ns
2 centre:n of attention:n
2 below the belt:n
3 belt:n and:x braces:ns
2 tighten:v your belt:n
2 tread:v lightly:r
2 tread:v softly
2 use:n your head:n
2 keep your head:n
2 common:j thread:n
3 pick:v up the threads:ns
2 close:r knit:vn
2 tight:j knit:vn
3 stick:v to your knitting:n
3 strong:j as:x an ox:n
2 page:n turner:n
2 golden:j age:n
2 coming:vg of age:n
2 gilded:j cage:n
2 no:x quarter:n given:vn
2 at close:r quarters:ns
3 give:v someone a wide:r berth:n
3 let:v it all:x hang:v out
3 throw:v caution:n to the wind
2 wind of change:n
3 get:v wind of it
2 in the wind
3 sail:n close:r to the wind
2 full:j sail:n
3 take:v the wind out of your sails:ns
3 run:v a tight:j ship:n
3 steady:j as:x she goes:vz
2 perfect:j storm:n
3 come:v in from:x the cold:n
3 leave:v out in the cold:n
2 halfway:r house:n
3 do:v things:ns by:x halves:ns
2 half:n measures:ns
2 half:n baked:vn
2 not:x half:n bad:j
3 the courage:n of your convictions
3 pluck:v up the courage:n
3 summon:v up the courage:n
3 in the same:j vein:n
2 in vain:n
2 take:v the strain
2 rain:n check:n
2 rein:n it in
2 plain:j as:x day:n
2 plain:j and:x simple:j
2 plain:j speaking:vg
2 plain:j sight:n
3 hidden:j in plain:j sight:n
2 a level:j head:n
2 heavy:j hearted:j
2 bit:n by:x bit:n
3 a little bit:n of luck:n
2 eat:v your greens:ns
2 beans:ns on toast:n
2 spill:v the beans:ns
3 two:x peas:ns in a pod:n
3 carrot:n and:x stick:v
2 pecking:vg order:n
2 law:n and:x order:n
2 tall:j order:n
2 a pretty:j picture:n
2 the bigger:j picture:n
2 silver:j spoon:n
2 silver:j tongued
3 fool's:x gold:n
3 fool's:x paradise:n
2 nobody's fool:n
2 play:v the fool:n
2 old:j school:n
2 square:j one:x
3 now:r or:x never:r
3 never:r say:v never:r
2 dying:vg to know:v
2 dying:vg breed:n
2 a dying:vg breed:n
2 natural:r born:vn leader:n
3 the tide:n is turning:vg
2 high:j tide:n
2 hold:v the phone:n
3 in a league:n of your own:j
3 into your own:j hands:ns
3 finders:ns keepers:ns
3 finders:ns keepers:ns losers weepers:ns
3 a stick:n in the mud:n
3 in the thick:j of it
2 thick:j skinned:vn
3 get:v under:x your skin:n
3 no:x skin:n off my nose:n
2 hide:v nor:x hair:n
2 no:x strings:ns attached:vn
2 purse:n strings:ns
2 strings:ns attached:vn
2 pins:ns and:x needles:ns
3 on pins:ns and:x needles:ns
3 at a rate:n of knots:ns
3 thanks:ns but:x no:x thanks:ns
2 many:x thanks:ns
2 thank:v heavens:ns
2 woe:n is me
3 mind:v how:x you:x go:v
2 let:v fly:v
2 sweet:j as:x pie:n
2 worm:n has turned:vn
2 the worm:n turns:ns
2 cotton:v on
2 spinning:vg plates:ns
2 silver:j lining:n
3 black:j sheep:n of the family:n
3 black:j sheep:n
3 two:x shakes:ns of a lamb's tail:n
3 gentle:j as:x a lamb:n
2 gentle:j giant:n
2 a gentle:j reminder:n
3 meek:j as:x a lamb:n
3 warp:n speed:n
3 warped:j sense:n of humour:n
3 the seven:x year:n itch:n
2 fit:j to burst:v
3 bursting:vg at the seams:ns
3 come:v apart:r at the seams:ns
3 nothing:n is as:x it seems:vz
3 or:x so:x it seems:vz
3 hot:j under:x the collar:n
2 a sea:n change:n
2 keep the change:n
2 chop:v and:x change:v
2 bumper:n crop:n
2 bumper:n to bumper:n
2 queue:n jumper
3 glad:j rags:ns
3 an embarrassment of riches:ns
2 filthy:j rich:j
3 hot:j on the heels:ns
3 heart:n in your mouth:n
3 melt:v in the mouth:n
2 spoken:vn word:n
3 a word:n in your ear:n
3 a man:n of his word:n
3 my word:n is my bond:n
2 mark:n of respect:n
3 road:n rage:n
3 a load:n of rubbish:n
2 on the line:n
2 hold:v the line:n
2 line:n your pockets:ns
2 out of pocket:n
3 dig:v deep:r in your pocket:n
3 burn:v a hole:n in your pocket:n
3 ahead:r of the curve:n
2 ahead:r of time:n
2 under:x the hammer:n
2 hammer:n and:x tongs:ns
2 hold:v your tongue:n
3 the cat's got your tongue:n
2 mother:n tongue:n
2 spick and:x span:n
3 frying:vg pan:n
3 stick:v to the plan:n
2 best:j man:n
2 right:j hand:n man:n
2 handy:j man:n
2 come:v in handy:j
3 like taking:vg candy:n from:x a baby
2 eye:n candy:n
2 jolly:j hockey:n sticks:ns
3 plenty:x more:x where that:x came:vd from:x
2 plenty:x of fish:n
2 twenty twenty vision:n
2 awkward:j silence:n
2 silence:n is golden:j
2 golden:j opportunity:n
2 missed:vd opportunity:n
2 opportunity:n knocks:ns
2 missed:vd call:n
2 miss:v the point:n
2 beside:x the point:n
2 moot:j point:n
3 give:v up the ghost:n
2 pale:n and:x interesting
2 pale:n by:x comparison
2 heart:n of oak:n
3 touch:n wood:n
2 dead:j wood:n
3 can't:x see:v the wood:n for:x the trees:ns
3 out on a limb:n
3 grow:v like a weed:n
2 rose:n tinted:j spectacles
3 every:x rose:n has its thorn:n
2 fresh:j as:x paint:v
3 like watching:vg paint:v dry:j
3 damn:v with faint:j praise:n
3 patience:n of a saint:n
3 patience:n is a virtue
2 sing:v your praises:ns
2 a passing:vg phase:n
2 just:r a phase:n
3 go:v through a phase:n
3 it never ceases:vz to amaze:v
2 happy:j days:ns
3 salad:n days:ns
2 dog:n days:ns
2 pants:ns on fire:n
3 set:v the world:n on fire:n
2 soft:j soap:n
2 off the peg:n
2 loosely:r speaking:vg
2 generally:r speaking:vg
2 strictly speaking:vg
3 a piece:n of the action:n
3 a slice:n of the action:n
2 out of fashion:n
2 in fashion:n
2 a fashion:n statement
2 class:n act:v
2 class:n dismissed
2 working class:n
2 world:n class:n
2 glass:n ceiling:n
2 lady:n luck:n
2 at ease:n
3 at ease:n with yourself
2 shoot:v the breeze:n
3 bright:j as:x a new:j pin:n
3 neat:j as:x a new:j pin:n
3 bees' knees:ns
2 a weak:j link:n
2 bean:n counter:n
3 barely:r scratch:n the surface:n
2 barely:r there
2 scratch:n the surface:n
3 tell:v it like it is
3 tell:v me about it
3 like it or:x not:x
3 like it or:x lump:v it
2 like clockwork
2 drop:v like flies:vz
3 selling:vg like hot:j cakes:ns
2 hot:j cross:v buns:ns
3 let:v them eat:v cake:n
2 cakes:ns and:x ale:n
2 for:x pete's sake:n
2 take:v a break:n
2 take:v the lead:v
2 take:v the cake:n
2 take:v a hint:n
2 take:v the plunge:n
2 take:v a peek:n
2 in the limelight:n
2 hold:v the fort:n
2 court:n of appeal:n
2 hold:v court:n
2 a feather:n bed:n
3 sell:v down:r the river:n
2 tide:n over:x
2 spinning:vg top:n
2 pop:v the question:n
3 cut:v to the quick:j
2 kick:v the bucket:n
3 bucket:n list:n
2 shopping:n spree:n
3 scot free:j
2 duty:n free:j
3 red:j herring:n
3 red:j carpet:n
2 in the red:j
2 red:j letter:n day:n
2 well:r bred:vn
2 ripe:j old:j age:n
3 ripe:j for:x the picking:n
3 the pick:n of the bunch:n
3 cherry:n picking:n
3 the whole:j kit:n and:x caboodle
3 end:n of story:n
2 a likely:j story:n
2 sob story:n
2 same:j old:j story:n
2 tall:j story:n
2 bedtime:n story:n
2 history:n repeats itself
2 ancient:j history:n
2 unsolved:j mystery:n
2 mystery:n tour:n
2 land:n of nod:n
2 land:n of plenty:x
3 lie:v of the land:n
3 in the land:n of the living:vg
2 odd:j one:x out
3 old:j as:x the hills:ns
3 all:x downhill from:x here:r
2 uphill:j struggle:n
3 up hill:n and:x down:r dale:n
3 back:r in the saddle:n
3 a cross:v to bear:v
2 cross:v your fingers:ns
3 cut:v your losses:ns
2 at a loss:n
3 at a loss:n for:x words:ns
3 show:v them who's boss:n
2 like a boss:n
2 at all:x costs:ns
3 lost:vn cause:n
2 lost:vn in thought:n
2 perish:v the thought:n
2 second:j thoughts:ns
3 penny:n wise:j pound:n foolish:j
3 the penny:n has dropped:vn
2 spend:v a penny:n
2 three:x square:j meals:ns
2 peal:n of bells:ns
3 a peal:n of laughter:n
2 in real:j life:n
2 in real:j time:n
2 for:x real:j
2 a raw deal:n
2 no:x big:j deal:n
3 how:x do:v you:x feel:v
2 no:x hard:j feelings:ns
2 gut:n feeling:n
2 bow:n and:x arrow:n
2 tomorrow never:r comes:vz
3 a dog:n in the manger:n
3 mind:v like a trap:n
3 poor:j as:x church:n mice:ns
2 better:j than:x nothing:n
3 quicker than:x the eye:n
3 greater:j than:x the sum:n of its parts:ns
3 a few:x home:n truths:ns
2 count:v your chickens:ns
3 sour:j grapes:ns
3 you:x heard:vd it here:r first:j
2 scrimp:v and:x save:v
2 ways:ns and:x means:ns
2 tried:vn and:x tested:vn
2 trials:ns and:x tribulations:ns
3 try:v and:x try:v again:r
3 the bigger:j they are:x the harder:r they fall:n
3 tip:v of the tongue:n
3 on the tip:n of my tongue:n
3 weight:n off your mind:n
2 pull:v your weight:n
2 worth the wait:v
2 state:n of mind:n
2 fine:j art:n
2 queen:n of hearts:ns
3 a matter:n of taste:n
2 matter:n of opinion:n
2 see:v you:x around
2 all:x year:n round:r
2 round:r and:x round:r
3 hop:n skip:v and:x jump:v
2 strike:v a chord:n
2 pump iron:n
3 rule:n with a rod:n of iron:n
3 iron:n out the creases:ns
3 pitch:r perfect:j
2 make:v a pitch:n
2 last:j ditch:n effort:n
2 sleeping:j beauty:n
3 once more:x with feeling:n
3 a picture:n is worth a thousand:x words:ns
3 for:x what:x it's worth
2 hold:v on tight:j
2 on hold:v
3 burn:v the candle:n at both:x ends:ns
3 keep the home:n fires:ns burning:vg
3 can't:x hold:v a candle:n to it
3 not:x worth the candle:n
3 rub:v salt:n in the wound:n
3 time:n and:x a half:n
3 hey:x presto
3 that's the way:n the cookie:n crumbles:vz
3 one:x way:n or:x another
2 milky way:n
2 give:v way:n
2 break:v away:r
2 home:n and:x away:r
2 hide:v away:r
2 eyes:ns wide:r open:j
2 wild:j oats:ns
3 do:v me a favour:n
3 king:n of the hill:n
2 beauty:n queen:n
2 drama:n queen:n
2 clean:j break:v
2 keep it clean:j
2 lean:j and:x hungry:j
2 in between
3 talk:v of the town:n
2 wear:v many:x hats:ns
3 you:x can say:v that:x again:r
2 that's life:n
2 such:x is life:n
3 not:x for:x all:x the tea:n in china
2 tea:n and:x sympathy
2 to a tee:n
3 suits:vz you:x to a tee:n
2 tee:n off
2 what:x ails:vz you:x
2 guardian:n angel:n
3 get:v the hang:v of it
3 take:v your hat:n off
2 spitting image:n
2 clip:v your wings:ns
2 the black:j hole:n
3 a hole:n in one:x
3 hole:n in the wall:n
2 wall:n to wall:n
3 back:r to the wall:n
2 walls:ns have ears:ns
2 bend:n over:x backwards
2 best:j friends:ns forever:r
2 man's best:j friend:n
3 no:x man:n is an island:n
2 off the record:n
2 for:x the record:n
3 set:v the record:n straight:j
2 break:v the record:n
2 hard:j and:x fast:r
3 long:j shot:n
2 big:r shot:n
2 parting:n shot:n
3 prick up your ears:ns
3 early:j in the morning:n
2 good:j morning:n
2 morning:n glory:n
2 good:j evening:n
2 good:j afternoon:n
2 goodness:n gracious:j
2 fingers:ns crossed:vn
2 star:n crossed:vn lovers
3 a lover:n not:x a fighter:n
2 a staple:j diet:n
3 word:n on the street:n
2 streets:ns ahead:r
3 right:j up your street:n
2 two:x way:n street:n
2 tunnel:n vision:n
2 leading:vg light:n
2 out of sight:n
2 at first:j sight:n
2 bright:j lights:ns
2 red:j light:n
3 give:v the green:j light:n
2 guiding:j light:n
2 night:n light:n
2 in the spotlight:n
3 knight:n in shining:j armour:n
3 the dead:j of night:n
3 things:ns that:x go:n bump:v in the night:n
2 opening:vg night:n
2 late:j night:n
2 in sight:n
3 a force:n to be reckoned with
3 fork:n in the road:n
2 knife:n and:x fork:n
2 walk:v the talk:n
2 walks:ns of life:n
2 walk:v on water:n
2 three:x cheers:ns
2 cheer:v up
2 sheer:j genius:n
2 blissful ignorance:n
2 what's the rush:n
2 fresh:j start:n
3 fly:v in the ointment:n
2 rare:j breed:n
2 sick:j and:x tired:j
2 scout's honour:n
2 on my honour:n
3 shout:v it from:x the rooftops
2 hit the roof:n
2 bar:n none:x
2 behind bars:ns
2 how:x are:x you:x
2 bah:x humbug:n
3 leave:v me alone:j
2 the stage:n is set:vn
2 muster:v the courage:n
2 muster:v up courage:n
3 at arm's length:n
2 pay:v it forward:r
3 every:j little helps:vz
3 leave:v it to me
3 made:vn my day:n
3 all:x in the mind:n
3 ready:j when you are
3 day:n and night:n
3 little:r by little:r
3 in the making:n
3 in a class:n of its own
3 in seventh:j heaven:n
3 on the house:n
3 on the double:n
3 on the mend:n
3 for old:j times:ns sake:n
3 hold:v that thought:n
3 the cat's pyjamas:ns
3 the plot:n thickens:vz
3 the proof:n is in the pudding:n
3 the ball:n is in your court:n
3 the lap:n of luxury:n
3 the writing:n is on the wall:n
3 slowly:r but surely:r
3 stay:v tuned:vn
3 stick:v to your guns:ns
3 tall:j tale:n
3 tip:n of the hat:n
3 to the letter:n
3 to the point:n
3 to the max:n
3 to each his own
3 twist:n of fate:n
3 warm:j and fuzzy:j
3 zero:n tolerance:n
3 pillar:n of strength:n
3 play:v it cool:j
3 play:v it safe:j
3 point:n taken:vn
3 rough:j and tumble:n
3 ships:ns in the night:n
3 smooth:j as silk:n
3 snug:j as a bug:n in a rug:n
3 hustle:n and bustle:n
3 hit:v the sack:n
3 have:v a heart:n
3 get:v the picture:n
3 ebb:n and flow:n
3 dead:j in the water:n
3 catch:v you later:r
3 cause:n for concern:n
3 bright:j and breezy:j
3 bite:v the bullet:n
3 at the end:n of the day:n
3 all:x systems:ns go:v
3 above:x and beyond:x
3 a taste:n of things:ns to come:v
3 lend:v me a hand:n
3 let:v it slide:v
3 made:vn of sterner:j stuff:n
3 never:r in a million years:ns
3 no:x man's land:n
3 once:r in a lifetime:n
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
