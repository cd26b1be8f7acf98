/** Two groups of substances that are dangerous together. */
export interface PairRow {
  /** any of these groups on one side … */
  readonly a: readonly string[];
  /** … and any of these on the other */
  readonly b: readonly string[];
  /** gases that may come off, by their formulas in the table of gases; what a member of a group cannot make is left out on use */
  readonly gives: readonly string[];
  readonly effects: readonly string[];
  readonly severity: "danger" | "warning" | "note";
  readonly text: string;
  readonly source: "acs" | "lists" | "practice";
  /** when it matters; without one, for the reagents as supplied */
  readonly condition?: string;
}

/**
 * Dangerous pairs, written for undiluted reagents; not complete, and no entry never means safe. Wording, gases and severity
 * are common practice throughout. `source` says where the pair or its general form was read:
 * - `acs`: Incompatible Chemicals, American Chemical Society (after Hill and Finster, Laboratory Safety for Chemistry Students);
 * - `lists`: lists of incompatible laboratory chemicals after Prudent Practices in the Laboratory, Safety in Academic
 *   Chemistry Laboratories and AS 2243.10;
 * - `practice`: common practice, no published source used.
 */
// biome-ignore format: a table reads best with one row a line
export const pairs: readonly PairRow[] = [
  { a: ["hypochlorite"], b: ["acid"], gives: ["Cl2"], effects: ["toxic gas"], severity: "danger", text: "acid sets chlorine free from bleach", source: "lists" },
  { a: ["hypochlorite"], b: ["ammonia", "ammonium salt", "amine"], gives: ["NH2Cl", "NCl3"], effects: ["toxic gas", "explosion"], severity: "danger", text: "chloramines; with excess hypochlorite or acid, explosive nitrogen trichloride", source: "lists" },
  { a: ["hypochlorite"], b: ["hydrogen peroxide"], gives: ["O2"], effects: ["gas pressure", "heat"], severity: "warning", text: "fast release of oxygen", source: "practice" },
  { a: ["hypochlorite"], b: ["cyanide"], gives: ["ClCN"], effects: ["toxic gas"], severity: "danger", text: "cyanogen chloride, unless kept strongly alkaline", source: "practice" },
  { a: ["hypochlorite"], b: ["organic", "alcohol", "ketone", "formic acid"], gives: [], effects: ["heat", "toxic gas", "explosion"], severity: "warning", text: "heat; chloroform from acetone and alcohols; alkyl hypochlorites may explode", source: "practice" },
  { a: ["chlorite", "chlorate"], b: ["acid"], gives: ["ClO2", "Cl2"], effects: ["toxic gas", "explosion"], severity: "danger", text: "chlorine dioxide, which explodes when concentrated", source: "acs" },
  { a: ["chlorate"], b: ["ammonium salt"], gives: [], effects: ["explosion"], severity: "danger", text: "ammonium chlorate explodes", source: "acs" },
  { a: ["chlorate"], b: ["sulfite", "sulfide", "thiosulfate", "organic", "reactive metal", "reducing agent"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "dry mixtures ignite or explode on rubbing", source: "acs" },
  { a: ["sulfide"], b: ["acid"], gives: ["H2S"], effects: ["toxic gas", "flammable gas"], severity: "danger", text: "hydrogen sulfide", source: "practice" },
  { a: ["cyanide"], b: ["acid"], gives: ["HCN"], effects: ["toxic gas", "flammable gas"], severity: "danger", text: "hydrogen cyanide, even with weak acids and carbon dioxide", source: "lists" },
  { a: ["complex cyanide", "thiocyanate"], b: ["strong acid"], gives: ["HCN"], effects: ["toxic gas", "flammable gas"], severity: "warning", text: "hydrogen cyanide when hot or concentrated", source: "practice", condition: "hot or concentrated" },
  { a: ["sulfite"], b: ["acid"], gives: ["SO2"], effects: ["toxic gas"], severity: "warning", text: "sulfur dioxide", source: "practice" },
  { a: ["thiosulfate"], b: ["acid"], gives: ["SO2"], effects: ["toxic gas"], severity: "warning", text: "sulfur dioxide and fine sulfur: ventilate, keep small and dilute", source: "practice" },
  { a: ["dithionite"], b: ["acid", "water"], gives: ["SO2"], effects: ["toxic gas", "heat", "fire"], severity: "warning", text: "sulfur dioxide; damp solid heats itself", source: "practice" },
  { a: ["azide"], b: ["acid"], gives: ["HN3"], effects: ["toxic gas", "explosion"], severity: "danger", text: "hydrogen azide, toxic and explosive", source: "lists" },
  { a: ["azide"], b: ["heavy metal salt", "silver salt", "copper salt", "copper"], gives: [], effects: ["explosion"], severity: "danger", text: "heavy-metal azides explode on touch; includes copper and lead pipes", source: "lists" },
  { a: ["azide"], b: ["chlorinated solvent", "haloalkane", "chloroform"], gives: [], effects: ["explosion"], severity: "danger", text: "explosive organic azides, diazidomethane with dichloromethane", source: "practice" },
  { a: ["azide"], b: ["halogen", "bromine"], gives: [], effects: ["explosion", "toxic gas"], severity: "danger", text: "halogen azides explode", source: "practice" },
  { a: ["nitrite"], b: ["acid"], gives: ["NO", "NO2"], effects: ["toxic gas"], severity: "danger", text: "nitrous acid breaks down to nitrogen oxides", source: "practice" },
  { a: ["nitrite"], b: ["ammonium salt"], gives: ["N2"], effects: ["gas pressure", "heat", "explosion"], severity: "warning", text: "nitrogen; runs away when hot or concentrated", source: "acs" },
  { a: ["nitrite"], b: ["azide"], gives: ["N2", "NO"], effects: ["gas pressure", "toxic gas"], severity: "warning", text: "in acid: the usual way to destroy azide, nitrogen and nitrogen monoxide come off", source: "practice", condition: "in acid" },
  { a: ["nitrite"], b: ["amine"], gives: [], effects: ["health"], severity: "warning", text: "in acid secondary amines give carcinogenic nitrosamines; diazonium salts explode when dry", source: "practice" },
  { a: ["nitrite"], b: ["cyanide", "thiosulfate", "reducing agent"], gives: [], effects: ["explosion"], severity: "warning", text: "dry or melted mixtures explode", source: "practice", condition: "dry or heated" },
  { a: ["carbonate"], b: ["acid"], gives: ["CO2"], effects: ["gas pressure", "spatter"], severity: "note", text: "foams; never close the vessel", source: "practice" },
  { a: ["nitric acid"], b: ["organic", "alcohol", "ketone", "flammable solvent", "amine", "aromatic amine", "weak acid"], gives: ["NO2"], effects: ["toxic gas", "heat", "fire", "explosion"], severity: "danger", text: "delayed and violent oxidation, also in waste bottles", source: "acs", condition: "concentrated acid" },
  { a: ["nitric acid"], b: ["metal", "reactive metal", "copper"], gives: ["NO", "NO2"], effects: ["toxic gas", "heat"], severity: "danger", text: "brown fumes", source: "practice" },
  { a: ["nitric acid"], b: ["hydrochloric acid"], gives: ["NOCl", "Cl2"], effects: ["toxic gas", "gas pressure"], severity: "warning", text: "aqua regia, never close the bottle", source: "practice" },
  { a: ["nitric acid"], b: ["hydrazine", "sulfide", "iodide", "reducing agent"], gives: ["NO2"], effects: ["toxic gas", "heat", "fire"], severity: "danger", text: "fast oxidation, hydrazine may ignite", source: "practice" },
  { a: ["perchloric acid"], b: ["organic", "alcohol", "acid anhydride", "reducing agent"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "explosive on heating or drying", source: "lists", condition: "hot or concentrated" },
  { a: ["permanganate"], b: ["concentrated sulfuric acid"], gives: [], effects: ["explosion", "fire"], severity: "danger", text: "explosive manganese heptoxide", source: "acs", condition: "concentrated acid" },
  { a: ["permanganate"], b: ["polyol", "alcohol", "organic"], gives: [], effects: ["fire", "heat"], severity: "danger", text: "solid permanganate sets glycerol and glycols on fire", source: "acs", condition: "solid or concentrated" },
  { a: ["permanganate"], b: ["hydrochloric acid"], gives: ["Cl2"], effects: ["toxic gas"], severity: "warning", text: "chlorine", source: "practice" },
  { a: ["permanganate"], b: ["hydrogen peroxide"], gives: ["O2"], effects: ["gas pressure", "heat"], severity: "warning", text: "oxygen, violent when concentrated", source: "practice" },
  { a: ["permanganate"], b: ["oxalic acid"], gives: ["CO2"], effects: ["gas pressure"], severity: "note", text: "starts slowly and then speeds up by itself", source: "practice" },
  { a: ["dichromate", "chromium(VI)"], b: ["alcohol", "organic", "reducing agent"], gives: [], effects: ["heat", "fire"], severity: "warning", text: "heat; solid chromium trioxide sets alcohols on fire", source: "lists", condition: "solid or concentrated" },
  { a: ["dichromate", "chromium(VI)"], b: ["hydrochloric acid"], gives: ["Cl2"], effects: ["toxic gas"], severity: "warning", text: "chlorine", source: "practice", condition: "concentrated acid" },
  { a: ["manganese dioxide"], b: ["hydrochloric acid"], gives: ["Cl2"], effects: ["toxic gas"], severity: "warning", text: "chlorine on warming", source: "practice", condition: "concentrated acid" },
  { a: ["bromate", "iodate"], b: ["iodide", "reducing agent"], gives: [], effects: ["heat"], severity: "warning", text: "iodine or bromine set free in acid; dry mixtures ignite", source: "practice" },
  { a: ["bromate"], b: ["hydrobromic acid"], gives: ["Br2"], effects: ["toxic gas"], severity: "warning", text: "bromine; so does bromide with any acid", source: "practice" },
  { a: ["oxidiser"], b: ["flammable solvent", "organic"], gives: [], effects: ["fire", "heat"], severity: "warning", text: "keep oxidisers from anything that burns", source: "practice" },
  { a: ["persulfate"], b: ["organic", "reactive metal", "alkali"], gives: [], effects: ["heat", "gas pressure"], severity: "warning", text: "breaks down fast when damp or hot", source: "practice" },
  { a: ["hydrogen peroxide"], b: ["ketone"], gives: [], effects: ["explosion"], severity: "danger", text: "acetone peroxides, very sensitive explosives, fastest with acid", source: "acs" },
  { a: ["hydrogen peroxide"], b: ["flammable solvent", "organic", "alcohol"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "above about 30 % the mixtures may detonate", source: "acs", condition: "concentrated" },
  { a: ["hydrogen peroxide"], b: ["peroxide catalyst", "iron salt", "copper salt", "manganese dioxide", "heavy metal salt", "metal"], gives: ["O2"], effects: ["gas pressure", "heat"], severity: "warning", text: "oxygen and heat, faster as it warms; never close the vessel", source: "acs" },
  { a: ["hydrogen peroxide"], b: ["aromatic amine", "hydrazine", "iodide"], gives: ["O2", "N2"], effects: ["heat", "gas pressure"], severity: "warning", text: "hot and fast", source: "lists" },
  { a: ["hydrogen peroxide"], b: ["strong alkali"], gives: ["O2"], effects: ["gas pressure", "heat"], severity: "warning", text: "decomposes faster in alkali", source: "practice" },
  { a: ["hydrogen peroxide"], b: ["concentrated sulfuric acid"], gives: ["O2"], effects: ["heat", "explosion"], severity: "danger", text: "piranha mixture: very hot, explodes with solvents", source: "practice", condition: "concentrated" },
  { a: ["hydrogen peroxide"], b: ["weak acid"], gives: [], effects: ["heat"], severity: "warning", text: "peracids form; explosive when strong", source: "practice", condition: "concentrated" },
  { a: ["organic peroxide"], b: ["amine", "acid", "reducing agent", "heavy metal salt", "reactive metal"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "sudden decomposition", source: "practice" },
  { a: ["ether"], b: ["oxidiser", "halogen"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "old ethers hold explosive peroxides: test before heating or distilling", source: "practice" },
  { a: ["alkali metal"], b: ["water"], gives: ["H2"], effects: ["flammable gas", "fire", "explosion"], severity: "danger", text: "hydrogen that lights by itself with sodium and potassium", source: "acs" },
  { a: ["alkali metal"], b: ["acid"], gives: ["H2"], effects: ["flammable gas", "fire", "explosion"], severity: "danger", text: "explosive reaction", source: "practice" },
  { a: ["alkali metal"], b: ["alcohol"], gives: ["H2"], effects: ["flammable gas", "heat"], severity: "warning", text: "hydrogen and an alkoxide", source: "acs" },
  { a: ["alkali metal"], b: ["chlorinated solvent", "haloalkane", "chloroform"], gives: [], effects: ["explosion"], severity: "danger", text: "shock-sensitive mixtures", source: "lists" },
  { a: ["alkali metal"], b: ["halogen", "bromine"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "violent", source: "practice" },
  { a: ["alkaline-earth metal"], b: ["water", "acid"], gives: ["H2"], effects: ["flammable gas", "heat"], severity: "warning", text: "hydrogen", source: "lists" },
  { a: ["reactive metal"], b: ["acid"], gives: ["H2"], effects: ["flammable gas", "heat"], severity: "warning", text: "hydrogen: no flames, vent; about 24 L of gas a mole", source: "practice" },
  { a: ["aluminium"], b: ["strong alkali"], gives: ["H2"], effects: ["flammable gas", "heat", "spatter"], severity: "warning", text: "starts slowly, then boils", source: "practice" },
  { a: ["aluminium"], b: ["chlorinated solvent", "halogen", "bromine", "iodine"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "violent after a delay", source: "practice" },
  { a: ["reactive metal"], b: ["oxidiser"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "flash powders", source: "practice", condition: "powder, dry" },
  { a: ["reactive metal"], b: ["halogen", "iodine"], gives: [], effects: ["fire", "heat"], severity: "warning", text: "a drop of water starts it", source: "practice", condition: "powder" },
  { a: ["hydride"], b: ["water", "acid", "alcohol"], gives: ["H2"], effects: ["flammable gas", "heat", "fire"], severity: "danger", text: "hydrogen", source: "lists" },
  { a: ["carbide"], b: ["water", "acid"], gives: ["C2H2"], effects: ["flammable gas", "heat"], severity: "danger", text: "ethyne (acetylene), with a little phosphine", source: "lists" },
  { a: ["phosphide"], b: ["water", "acid"], gives: ["PH3"], effects: ["toxic gas", "flammable gas", "fire"], severity: "danger", text: "phosphine, may ignite by itself", source: "practice" },
  { a: ["calcium oxide"], b: ["water"], gives: [], effects: ["heat", "spatter"], severity: "warning", text: "can boil the water", source: "lists" },
  { a: ["concentrated sulfuric acid"], b: ["water"], gives: [], effects: ["heat", "spatter"], severity: "warning", text: "acid into water, slowly, never the other way", source: "practice" },
  { a: ["concentrated sulfuric acid"], b: ["formic acid"], gives: ["CO"], effects: ["toxic gas", "flammable gas"], severity: "danger", text: "carbon monoxide", source: "practice" },
  { a: ["concentrated sulfuric acid"], b: ["oxalic acid"], gives: ["CO", "CO2"], effects: ["toxic gas", "flammable gas"], severity: "danger", text: "carbon monoxide and dioxide, on warming", source: "practice" },
  { a: ["concentrated sulfuric acid"], b: ["alcohol"], gives: [], effects: ["heat", "flammable gas"], severity: "warning", text: "heat; ethers and alkenes on warming", source: "practice" },
  { a: ["concentrated sulfuric acid"], b: ["iodide"], gives: ["H2S", "SO2", "HI"], effects: ["toxic gas", "flammable gas"], severity: "warning", text: "iodine with sulfur dioxide and hydrogen sulfide", source: "practice" },
  { a: ["concentrated sulfuric acid"], b: ["cyanide", "complex cyanide"], gives: ["CO", "HCN"], effects: ["toxic gas", "flammable gas"], severity: "danger", text: "carbon monoxide or hydrogen cyanide", source: "practice" },
  { a: ["strong acid"], b: ["strong alkali"], gives: [], effects: ["heat", "spatter"], severity: "warning", text: "about 56 kJ a mole of water formed; boils when concentrated", source: "practice" },
  { a: ["strong acid"], b: ["ammonia"], gives: [], effects: ["heat"], severity: "warning", text: "heat and white fumes", source: "practice" },
  { a: ["strong alkali"], b: ["ammonium salt"], gives: ["NH3"], effects: ["toxic gas", "flammable gas"], severity: "warning", text: "ammonia", source: "practice" },
  { a: ["strong alkali"], b: ["chloroform", "chlorinated solvent"], gives: [], effects: ["explosion", "heat"], severity: "danger", text: "with acetone or methanol present: violent; dichlorocarbene, dichloroacetylene from trichloroethene", source: "practice" },
  { a: ["strong alkali"], b: ["acid anhydride", "acyl chloride"], gives: [], effects: ["heat", "spatter"], severity: "warning", text: "fast hydrolysis", source: "practice" },
  { a: ["thionyl chloride"], b: ["water", "alcohol"], gives: ["SO2", "HCl"], effects: ["toxic gas", "heat", "gas pressure"], severity: "danger", text: "sulfur dioxide and hydrogen chloride", source: "practice" },
  { a: ["thionyl chloride"], b: ["amide"], gives: [], effects: ["heat", "gas pressure"], severity: "warning", text: "with dimethylformamide the mixture may run away on storage", source: "practice" },
  { a: ["acyl chloride"], b: ["water", "alcohol"], gives: ["HCl"], effects: ["toxic gas", "heat"], severity: "warning", text: "hydrogen chloride", source: "practice" },
  { a: ["acyl chloride"], b: ["amine"], gives: ["HCl"], effects: ["heat", "toxic gas"], severity: "warning", text: "fast and hot", source: "practice" },
  { a: ["acyl chloride", "thionyl chloride"], b: ["sulfoxide"], gives: [], effects: ["explosion", "heat"], severity: "danger", text: "violent with dimethyl sulfoxide", source: "practice" },
  { a: ["acid anhydride"], b: ["water", "alcohol"], gives: [], effects: ["heat"], severity: "warning", text: "slow to start without a catalyst, then fast; strong acid sets it off", source: "acs" },
  { a: ["iodine"], b: ["ammonia"], gives: [], effects: ["explosion"], severity: "danger", text: "nitrogen triiodide, explodes on touch when dry", source: "acs" },
  { a: ["halogen"], b: ["ammonia"], gives: [], effects: ["explosion", "toxic gas"], severity: "danger", text: "nitrogen halides", source: "lists" },
  { a: ["bromine"], b: ["organic", "amine", "hydrocarbon", "ketone", "alcohol"], gives: ["HBr"], effects: ["heat", "toxic gas"], severity: "warning", text: "hot after a delay; bromoacetone is a tear gas", source: "practice" },
  { a: ["halogen"], b: ["strong alkali"], gives: [], effects: ["heat"], severity: "note", text: "hypohalites; acid sets the halogen free again", source: "practice" },
  { a: ["silver salt"], b: ["ammonia"], gives: [], effects: ["explosion"], severity: "danger", text: "silver nitride (fulminating silver) on standing: make fresh, acidify at once after use", source: "practice" },
  { a: ["silver salt"], b: ["alcohol"], gives: [], effects: ["explosion"], severity: "danger", text: "with nitric acid: silver fulminate", source: "practice", condition: "with nitric acid" },
  { a: ["silver salt"], b: ["oxalic acid"], gives: [], effects: ["explosion"], severity: "warning", text: "dry silver oxalate explodes on heating", source: "acs" },
  { a: ["hydrazine"], b: ["oxidiser", "halogen", "heavy metal salt"], gives: ["N2"], effects: ["heat", "gas pressure", "explosion"], severity: "danger", text: "fast gas and heat; anhydrous hydrazine ignites", source: "practice" },
  { a: ["hydrofluoric acid"], b: ["strong alkali", "ammonia"], gives: [], effects: ["heat", "spatter"], severity: "danger", text: "violent when concentrated", source: "lists", condition: "concentrated" },
  { a: ["formic acid"], b: ["oxidiser"], gives: ["CO2"], effects: ["gas pressure", "heat"], severity: "warning", text: "gas builds up in closed waste bottles", source: "practice" },
  { a: ["chloroform"], b: ["ketone"], gives: [], effects: ["explosion"], severity: "danger", text: "with strong base: violent", source: "practice", condition: "with strong base" },
  { a: ["nitrate"], b: ["organic", "reducing agent", "concentrated sulfuric acid"], gives: ["NO2"], effects: ["fire", "toxic gas"], severity: "warning", text: "molten or with hot acid: nitrogen oxides, fire", source: "practice", condition: "hot or molten" },
  { a: ["aromatic amine"], b: ["nitric acid", "hydrogen peroxide"], gives: [], effects: ["fire", "heat"], severity: "danger", text: "may ignite", source: "lists", condition: "concentrated" },
  { a: ["phenol"], b: ["aldehyde"], gives: [], effects: ["heat"], severity: "warning", text: "condensation catalysed by acid or alkali may run away", source: "practice" },
  { a: ["phenol"], b: ["nitric acid", "oxidiser"], gives: [], effects: ["heat", "fire"], severity: "danger", text: "fast oxidation and nitration", source: "practice" },
  { a: ["solid peroxide"], b: ["water", "acid"], gives: ["O2"], effects: ["heat", "gas pressure"], severity: "danger", text: "oxygen and strong alkali, hot", source: "practice" },
  { a: ["solid peroxide"], b: ["organic", "reactive metal", "weak acid"], gives: [], effects: ["fire", "explosion"], severity: "danger", text: "ignites, often on a trace of water", source: "lists" },
  { a: ["oxidising acid"], b: ["reducing agent"], gives: [], effects: ["heat", "fire"], severity: "warning", text: "fast oxidation", source: "practice", condition: "concentrated" },
  { a: ["water-reactive"], b: ["water"], gives: [], effects: ["heat"], severity: "warning", text: "gives gas and heat: see the group of the substance", source: "practice" },
  { a: ["ester"], b: ["strong alkali"], gives: [], effects: ["heat"], severity: "note", text: "about 55 to 65 kJ a mole; alcohol vapour when hot", source: "practice" },
];
