import { NGO_MEASURES } from '#shared/checks/balance/ngo-measures';
import { MEASURE_HELP, type RuleMeasure } from '#shared/words/en/measures';

const MEASURES: readonly RuleMeasure[] = ['deviation', ...NGO_MEASURES];

/** How visual weight is reckoned, where the eye is taken to go, and every measure on the rule with its formula. */
export function WeightPage() {
  return (
    <main className="help">
      <h1 className="text-32 max-sm:text-24">Weight, and what stands on the rule</h1>
      <div className="help-text">
        <h2>Visual weight of a mat</h2>
        <p>A mat weighs the sum, over all that can be seen of it (card, inner mat, picture, words), of</p>
        <p className="help-formula">area ÷ page’s area × (0.25 + |L − L of the page| + C + 0.25 × detail + 0.4 in a face)</p>
        <p>
          L is lightness and C vividness in OKLab. So weight grows with size, with how far a tone stands from the page’s, with vividness, with how much there is to
          look at, and with faces. The 0.25 is there because even card of the page’s own colour is a shape with edges.
        </p>
        <p>
          A picture is read point by point within its window: what is trimmed off does not count, and a picture half black, half white is not taken for grey. Detail is
          how much lightness changes from one point to the next. Under a mat laid over others only what is seen counts. Lettering and writing are taken to cover 15 % of
          their place, a pattern half of it.
        </p>
        <p>
          The formula and its factors are our own. That size, contrast, vividness and interest make weight is R. Arnheim’s account (Art and Visual Perception, 1954, from
          memory). Lok, Feiner and Ngai (2004) weigh layouts by the luminance that stands out from the ground; Hübner and Fillinger (2016, Frontiers in Psychology 7:335)
          let the tone that is not the ground’s carry the mass. That busy parts and faces draw the eye: Mackworth and Morandi (1967); Cerf, Harel, Einhäuser and Koch
          (2007), both from memory.
        </p>
        <h2>The eye’s likely path</h2>
        <p>
          Our own rule, after the winner-take-all of Itti, Koch and Niebur (1998, from memory). It starts at the declared focal, the left one first, or at the heaviest mat where none is declared. From there it
          goes each time to the mat not seen yet that pulls most: weight over distance, with a quarter of a page added to every distance. It stops after seven mats, and never goes
          to one that weighs less than a tenth of the heaviest. A split print is one stop.
        </p>
        <h2>On the rule</h2>
        <p>
          The measures of D. C. L. Ngo, L. S. Teo and J. G. Byrne (2003), “Modelling interface aesthetics”, Information Sciences 152:25–46. They judge boxes, not
          pictures: read them as a second opinion. Every one is 0 to 1, 1 best by the paper. In the formulas, n mats of width w, height h and area a lie in a frame B × H;
          L is the box round all of them.
        </p>
      </div>
      <dl className="help-facts mt-4">
        {MEASURES.map((measure) => (
          <Measure key={measure} measure={measure} />
        ))}
      </dl>
    </main>
  );
}

function Measure({ measure }: { readonly measure: RuleMeasure }) {
  const { name, formula, meaning } = MEASURE_HELP[measure];
  return (
    <>
      <dt id={measure}>{name}</dt>
      <dd>
        {meaning}
        <p className="help-formula">{formula}</p>
      </dd>
    </>
  );
}
