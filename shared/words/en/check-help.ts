import type { CheckId } from '../../checks/check-ids';

/** What a check's help page says besides its note: the check's own data has severity, basis and thresholds. */
export interface CheckHelp {
  /** A few words, without a full stop. */
  readonly name: string;
  /** Why it matters, in a paragraph. */
  readonly why: string;
  /** When it speaks. */
  readonly rule: string;
  /** What the right example does otherwise. */
  readonly right: string;
  /** A few words for each threshold. */
  readonly thresholds?: Readonly<Record<string, string>>;
}

export const CHECK_HELP: Readonly<Record<CheckId, CheckHelp>> = {
  'window-off-paper': {
    name: 'A picture that ends too soon',
    why: 'The panes of a split print, and a photo that runs off the page, have no card to fall back on: where the paper ends, there is a hole in the picture.',
    rule: 'Speaks where the window of a split print, or of a photo trimmed off with the page, reaches past the paper.',
    right: 'The window has slid back, and every pane is full.',
  },
  'never-cut': {
    name: 'A print that must not be cut',
    why: 'Instant film holds a caustic paste and falls apart when it is cut. The only print there is cannot be printed again, and a borrowed one goes back. Copy it and cut the copy, or mount it whole.',
    rule: 'Speaks where instant film, a one-of-a-kind print or a borrowed one is to be trimmed or split. Mounted whole they are welcome.',
    right: 'The print is mounted whole, on card that leaves a border round it.',
  },
  'keep-zone-cut': {
    name: 'A cut through what the picture is of',
    why: 'A printed photo is cut once. Whatever you marked as its keep zone has to lie inside the cut, with the tolerance of your trimmer to spare.',
    rule: 'Speaks where the window does not hold the keep zone with the cutting tolerance on every side. The paper’s own edge needs none. A window round a marked detail is left alone.',
    right: 'The window has slid over, and she is all there.',
  },
  'seam-through-keep-zone': {
    name: 'A seam through what the picture is of',
    why: 'A print split over several mats is cut along every gap, and where it runs on behind them, the gaps swallow a strip. Through a face, either is what everybody sees first.',
    rule: 'Speaks where no single pane holds the keep zone with the cutting tolerance to spare.',
    right: 'The whole picture has slid under the panes until one of them holds his face.',
  },
  'panes-inseparable': {
    name: 'Panes that no cuts can part',
    why: 'A trimmer cuts from edge to edge. Panes that lock into each other, as in a pinwheel, leave no line along which the first cut could run without going through one of them, so one print cannot fill them all.',
    rule: 'Speaks where no straight cuts from edge to edge, one after the other, part the panes of a split print. A digital photo is left alone: it is printed pane by pane.',
    right: 'A cut straight across parts the upper panes from the lower ones, and one more parts each pair.',
  },
  'more-placements-than-copies': {
    name: 'More places than prints',
    why: 'One print is one piece of paper. Two pieces can come out of it only where they do not overlap and straight cuts from edge to edge part them.',
    rule: 'Speaks where this spread and the studio’s other live spreads need more copies than there are.',
    right: 'The second mat has a print of its own.',
  },
  'print-smaller-than-photo': {
    name: 'A print smaller than its place',
    why: 'A print cannot be made larger. Where its paper ends before the photo’s place does, a strip of card shows on one side only and looks like a mistake.',
    rule: 'Speaks where the window reaches past the paper and the mat may show instead.',
    right: 'Mounted whole, the same print has an even border.',
  },
  'whole-overhangs': {
    name: 'A print larger than its card',
    why: 'Mounted uncut, a print keeps its size. Larger than its card, it lies on its neighbours or hangs off the page, and shows no border.',
    rule: 'Speaks where a whole print is wider or higher than its card.',
    right: 'The card is larger than the print on every side.',
  },
  'photo-sinks': {
    name: 'A photo that sinks into its card',
    why: 'Card is there to set the photo off. Where a third of its rim or more is as dark and as coloured as the card, the eye no longer finds the edge. A thin light inner mat helps at once.',
    rule: 'Reads the outer few percent of what the window shows, all round. A part is too close where its lightness differs by less than 15 and its CIEDE2000 difference is under 12.',
    right: 'A thin light inner mat parts dark picture and dark card.',
    thresholds: { share: 'Share of the rim that may be too close' },
  },
  'bare-mat': {
    name: 'A bare mat',
    why: 'A mat without anything on it reads as a place where something fell off. It wants a print, patterned paper, words, or to go.',
    rule: 'Speaks once the pages are filled otherwise, and counts the prints on the table that fit.',
    right: 'The mat carries a print.',
  },
  'pages-unequal': {
    name: 'One page outweighs the other',
    why: 'Two facing pages are seen as one picture. Where nearly all that is dark, vivid or busy is on one of them, the other looks unfinished.',
    rule: 'Adds up the visual weight of every mat on each page and compares their shares of 100.',
    right: 'Pictures and dark card stand on both pages.',
    thresholds: { difference: 'Difference of the pages’ shares of 100' },
  },
  'centre-off': {
    name: 'Weight gathered at one side',
    why: 'Where nearly all that is dark, vivid or busy lies towards one edge of the spread, the rest looks empty and the pages seem to tip.',
    rule: 'Adds up the visual weight of both pages and looks how far its centre lies from the middle of the spread, in per cent of the way to an edge. Silent where the two pages’ weights already differ too much.',
    right: 'Dark card and pictures stand at the foot as well as at the head.',
    thresholds: { deviation: 'Deviation of the centre, in per cent' },
  },
  'no-focal': {
    name: 'No picture leads',
    why: 'The eye wants one place to land on first. Where all pictures are of a size, it wanders, and nothing has been said.',
    rule: 'Speaks where no mat is declared as the focal and the largest picture is not clearly larger than the next.',
    right: 'One picture is much larger than the rest, and declared.',
    thresholds: { dominance: 'How many times the next picture’s area the largest needs' },
  },
  'focals-same-place': {
    name: 'Two focals at the same place',
    why: 'Two leading pictures in the same corner of facing pages look copied, and neither leads. Set across from each other they pull the eye over the gutter.',
    rule: 'Compares the middles of both declared focals, each in its own page.',
    right: 'The second focal stands at the other side of its page.',
    thresholds: { distance: 'Distance, each way' },
  },
  'focals-same-size': {
    name: 'Two focals of one size',
    why: 'Two leading pictures of the same shape and size compete. Make one larger or turn it, and the other can answer.',
    rule: 'Compares width and height of both declared focals. Turned on its side is another shape.',
    right: 'The left focal is larger, and leads.',
    thresholds: { difference: 'Difference of width and of height' },
  },
  'focal-not-dominant': {
    name: 'A focal that is not the largest',
    why: 'A picture declared as the one to see first is passed over where a larger one stands on the same page.',
    rule: 'Compares the focal’s area with that of every other picture of its page. A split print counts as one.',
    right: 'The largest picture is the focal.',
    thresholds: { dominance: 'How many times the rival’s area the focal needs' },
  },
  'nothing-shared': {
    name: 'Nothing in common',
    why: 'Facing pages belong together. One thing that both have is enough: a motif, a colour of card, a patterned paper, a size of mat.',
    rule: 'Speaks where the two pages share no motif, no colour (under CIEDE2000 3), no patterned paper and no size of mat.',
    right: 'Card and paper of the left page come back on the right.',
    thresholds: { things: 'Things that both pages must have' },
  },
  'motif-copied': {
    name: 'The same motif, twice',
    why: 'An echo binds two pages; an exact copy at the same place makes wallpaper of them. Move it, turn it, or change its size.',
    rule: 'Speaks where a split print, strip or pinwheel stands on both pages in the same shape at the same place.',
    right: 'The right page’s strip stands at the head, not at the foot.',
    thresholds: { mats: 'Mats that make a motif' },
  },
  'whole-lopsided': {
    name: 'Uneven card round a print',
    why: 'A print mounted whole takes what border its card leaves. Much more beside it than above looks like the wrong card.',
    rule: 'Compares the card seen beside a whole print with the card seen above it.',
    right: 'The card is as much higher than the print as it is wider, or nearly.',
    thresholds: { difference: 'Difference of the two borders' },
  },
  shaving: {
    name: 'A shaving',
    why: 'A strip thinner than a trimmer’s clamp can hold slips, curls and takes the cut with it. Slide the window to the paper’s edge and that cut is not needed.',
    rule: 'Speaks where sliding to the edge would save a thin cut, make no other, and still keep the subject.',
    right: 'The window lies along the paper’s left edge: one cut fewer.',
    thresholds: { width: 'Thinner than this is a shaving' },
  },
  'mat-like-page': {
    name: 'Card that does not show',
    why: 'A mat of the page’s own colour costs paper and glue and is not seen. Mount straight on the page, or give it another colour.',
    rule: 'Compares card and page by CIEDE2000. Lettering and journaling are left alone: they may be meant to look written on the page.',
    right: 'The card stands out from the page.',
    thresholds: { difference: 'CIEDE2000 difference' },
  },
  'under-binding': {
    name: 'A mat under the binding',
    why: 'Posts, rings and sewn joints hide a strip along the gutter. What lies there is glued down and never seen.',
    rule: 'Speaks where a mat reaches into the strip that the album’s binding hides.',
    right: 'The mat keeps clear of the gutter.',
  },
  'low-resolution': {
    name: 'Too few pixels',
    why: 'A digital photo can be printed at any size, but its pixels do not multiply. Under 300 to the inch it looks soft at reading distance; under 200 it is refused for printing.',
    rule: 'Counts the pixels to the inch at the size at which the photo is placed.',
    right: 'Placed smaller, the same file prints sharp.',
    thresholds: { ppi: 'Pixels to the inch' },
  },
  'no-title': {
    name: 'No title',
    why: 'In twenty years a title says in three words what this was. It also gives the eye a place to start reading.',
    rule: 'Speaks once the pages are filled and no mat carries lettering.',
    right: 'A title strip runs along the foot.',
  },
  'no-journaling': {
    name: 'No words',
    why: 'Pictures show what it looked like. Who it was, when and where, only words can keep.',
    rule: 'Speaks once the pages are filled and no mat carries journaling.',
    right: 'A mat beside the focal holds the story.',
  },
  'face-too-large': {
    name: 'A photo too small for a face',
    why: 'A face needs some room round it. Cropped to a nose and a chin, the photo shows a stranger; where hair and ears are seen too, it shows the person.',
    rule: 'Speaks where a photo, or a pane of a split print, shows the middle of a marked face and is narrower or lower than the face with some room. A face at the rim of the picture and a print mounted whole are left alone.',
    right: 'The mat is larger, and her head has room on every side.',
    thresholds: { room: 'How many times the face the photo has to measure' },
  },
  'keep-zone-covered': {
    name: 'Something laid over the subject',
    why: 'A strip or a title may well lie over a picture, but not over the part that you marked to keep: glued down, it hides what the picture is of.',
    rule: 'Speaks where a mat that is laid over others covers a part of a keep zone, and names every photo that it covers.',
    right: 'The strip has moved down, off his face.',
    thresholds: { share: 'Share of the keep zone that may be covered' },
  },
  'title-overflows': {
    name: 'A title too large for its mat',
    why: 'Letters are cut from card at the height you chose and do not shrink. Where they need more than the mat has, the last one hangs over its edge, and you find out with glue on your fingers.',
    rule: 'Measures the letters at their true widths and the chosen height, turned over into lines, against the space inside the mat’s border.',
    right: 'Smaller letters, and the whole title lies on its mat.',
    thresholds: { over: 'How far the letters may reach over' },
  },
  'journaling-overflows': {
    name: 'More words than lines',
    why: 'You write by hand, in ink, on the ruled lines that there are. Words that find no line end up squeezed into the border, or the story stops short.',
    rule: 'Sets the words on lines ruled as far apart as you chose and counts those left over when the mat is full.',
    right: 'The mat is higher, and every word has a line.',
    thresholds: { words: 'Words too many that are let pass' },
  },
  'horizons-apart': {
    name: 'Horizons that miss each other',
    why: 'Photos in a row read as one wide view. A step in the horizon breaks it in two, and the eye trips there each time.',
    rule: 'Compares the marked horizons of two photos that stand side by side at one height, over the gutter as well, where the photos meet. The panes of a split print line up by themselves.',
    right: 'One window has slid on its paper, and the sea runs on from photo to photo.',
    thresholds: { off: 'How far the horizons may miss each other' },
  },
  'color-in-no-photo': {
    name: 'Card in a colour that no photo has',
    why: 'Card in a colour of the photos carries them over the page. A colour that stands in none of them draws the eye to the card instead.',
    rule: 'Compares the hue of coloured card with the hues in the placed photos, in OKLCH. Lighter or duller card of the same hue is welcome, neutrals go with everything, and black and white photos have no say. Silent under a scheme that lifts the photos with another colour on purpose.',
    right: 'The card has the blue of the sky and the sea.',
    thresholds: { hue: 'How far the hue may lie from the photos’' },
  },
  'too-many-colors': {
    name: 'Too many colours of card',
    why: 'A few colours that come back hold two pages together. With one more for every photo, each mat stands for itself, and the card is louder than the pictures.',
    rule: 'Counts the colours of card once the pages are filled. Pages and neutrals do not count, and shades within CIEDE2000 3 of each other count as one.',
    right: 'One colour carries the photos, and an accent comes back on both pages.',
    thresholds: { colors: 'Colours that hold together' },
  },
  'accent-alone': {
    name: 'An accent that does not come back',
    why: 'A vivid colour leads the eye from one of its places to the next, best of all round three of them. Where it stands once, or on one page only, the eye stops there.',
    rule: 'Counts the mats whose card, inner mat, lettering, pattern or embellishment has the accent, and looks for it on both pages. The accent is the scheme’s; without a scheme, the most vivid card of which there is little.',
    right: 'Patterned paper in the accent stands on the right page as well.',
    thresholds: { places: 'Places that an accent wants' },
  },
  'all-neutrals': {
    name: 'Nothing but neutrals',
    why: 'Grey, white and black never clash, but they leave all the colour to the photos and tie nothing to them. One card in a colour of the photos is often enough.',
    rule: 'Speaks once the pages are filled, where every card, page and pattern is a neutral and the photos have colour. Silent for black and white photos, and under a quiet scheme, which wants neutrals.',
    right: 'The card takes up the sea, and the patterned paper the sand.',
    thresholds: { chroma: 'Chroma under which card is neutral (OKLCH)' },
  },
  'focals-compete': {
    name: 'Two focals that compete',
    why: 'Of two leading pictures one has to speak first. Where both are as large, as dark and as busy as each other, the eye goes to and fro and settles on neither.',
    rule: 'Compares the visual weight of both declared focals: card, picture and faces, as far as they can be seen. Silent where the two already stand at the same place or have the same size.',
    right: 'The left focal is clearly the heavier, and the right one answers it.',
    thresholds: { likeness: 'Share of the heavier’s weight that the lighter needs' },
  },
  'undeclared-focal': {
    name: 'A mat that outweighs the focal',
    why: 'The eye does not know what was declared. A mat with much dark or vivid card is seen first all the same, and the picture that was to lead comes second.',
    rule: 'Compares the visual weight of every mat with that of its page’s focal or, on a page without one, the spread’s, and names only the heaviest. Bare mats and paper behind half a page or more are left alone.',
    right: 'The words stand on light card, and the focal leads.',
    thresholds: { pull: 'How many times the focal’s weight' },
  },
  'against-print': {
    name: 'An upright print in a flat place',
    why: 'Whoever took the picture held the camera upright or flat for a reason. Cut the other way, much of the print is lost, and mostly what it was held that way for.',
    rule: 'Speaks where an upright print is trimmed to a flat photo, or a flat one to an upright photo. Squares, panes and small pieces of a print are left alone.',
    right: 'The mat is turned, and he is there from head to foot.',
    thresholds: { part: 'Share of the print that the window shows at least' },
  },
  'orientations-alike': {
    name: 'All photos lie the same way',
    why: 'A spread of nothing but flat photos, or of nothing but upright ones, falls into rows. One that stands among those that lie wakes it up.',
    rule: 'Speaks where all photos lie the same way and at least one print does not. Squares, panes and prints mounted whole do not count.',
    right: 'The two upright prints stand upright.',
    thresholds: { photos: 'So many photos at least' },
  },
  'looks-off-page': {
    name: 'Eyes that lead off the page',
    why: 'We look where others look. Somebody at the outer edge who looks outward sends the reader off the page; looking inward, they lead back into it.',
    rule: 'Speaks where a photo’s middle lies in the outer part of its page and every face in it that looks to a side looks outward. Silent on a page alone, and about panes. A picture is never mirrored.',
    right: 'She stands by the gutter and looks across her own page.',
    thresholds: { share: 'Outer part of the page, as a share of its width' },
  },
};
