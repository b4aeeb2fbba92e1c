// The page on which the library runs: what is there before any script does.
import fs from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { escaped } from "./markdown.mjs";

const own = path.dirname(fileURLToPath(import.meta.url));

export function livePage() {
  const first = fs.readFileSync(path.join(own, "live/planets/orsolne.json"), "utf8");
  return { file: "live.html", title: "Live page", live: true, body: bodyOf(first) };
}

const bodyOf = (first) => `<h1>A planet and its climates</h1>
<p>Edit the description; everything below follows at once. It is computed in this page by the library itself, nothing is
sent anywhere. The planets are invented. The fields are those of <a href="planet.html">descriptions of planets</a>; what the
words mean is under <a href="concepts.html">concepts</a>.</p>
<noscript><p class="note">
This page computes with JavaScript, which is switched off here. The other pages need none.</p></noscript>
<div class="bench">
<section class="side" aria-labelledby="description-title">
<h2 id="description-title">Description</h2>
<p class="tools"><label for="planets">Start from</label> <select id="planets"></select></p>
<p class="tools"><label for="hottest">Surfaces from 50 K up to</label> <select id="hottest">
<option value="600">600 K</option><option value="1000">1000 K</option><option value="2500">2500 K</option></select></p>
<label for="text" class="under">The planet, as JSON. The Tab key leaves the field.</label>
<div class="editor" id="editor">
<div class="lines" id="lines" aria-hidden="true"></div>
<div class="page">
<div class="mark" id="mark" hidden></div>
<textarea id="text" rows="30" spellcheck="false" autocomplete="off"
autocapitalize="off" wrap="off" aria-describedby="problem">${escaped(first)}</textarea>
</div>
<div class="margin" id="margin"><div class="problem" id="problem" hidden></div></div>
</div>
</section>
<section class="side" id="results" aria-labelledby="results-title">
<h2 id="results-title">Climates</h2>
<p id="status" role="status">The library is loading.</p>
<div id="drawn" hidden>
<div class="wide" role="region" aria-label="States" tabindex="0"><table id="states"></table></div>
<fieldset id="choice"><legend>Ledger of the state at</legend></fieldset>
<figure id="ledger"></figure>
<figure id="diagram"></figure>
<h3>Appraisal</h3>
<pre id="appraisal" tabindex="0" role="region" aria-label="Appraisal"></pre>
</div>
</section>
</div>
`;
