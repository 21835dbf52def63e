/** How far a publication was read. A figure known only from memory says so wherever it is shown. */
export type Reading =
  'read' | 'read in part' | 'abstract read' | 'read in a reproduction' | 'from memory' | 'own'

/** `title` is the published title where we know it, otherwise what the text is about. */
export interface Source {
  author: string
  year: number | null
  title: string
  where: string | null
  reading: Reading
}

// prettier-ignore
const table = {
  // Species
  'fao-589': { author: 'Somerville et al.', year: 2014, title: 'Small-scale aquaponic food production, FAO Fisheries and Aquaculture Technical Paper 589', where: 'sect. 7.4, 8.1', reading: 'read' },
  'srac-283': { author: 'Popma & Masser', year: 1999, title: 'Tilapia: life history and biology, SRAC Publication 283', where: null, reading: 'read in a reproduction' },
  'srac-282': { author: 'Rakocy', year: 1989, title: 'Tank culture of tilapia, SRAC Publication 282', where: 'growth and feed table', reading: 'from memory' },
  'fb4-2017': { author: 'Deslauriers et al.', year: 2017, title: 'Fish Bioenergetics 4.0: an R-based modeling application, Fisheries 42:586-596', where: 'parameter table and code', reading: 'read' },
  'fsa-wslit': { author: 'Ogle et al., and the authors named in each row', year: null, title: 'R package FSA, standard-weight table WSlit', where: 'WSlit', reading: 'read' },
  'nacaa-2017': { author: 'Journal of the NACAA 10(1)', year: 2017, title: 'Cold tolerance of blue tilapia stocks', where: null, reading: 'abstract read' },
  'mu-bluegill': { author: 'Hicks & Pierce', year: null, title: 'Bluegill sunfish production in Missouri, MU Extension', where: 'opening', reading: 'read in part' },
  'malison-2003': { author: 'Malison', year: 2003, title: 'White paper on yellow perch, North Central Regional Aquaculture Center', where: null, reading: 'read in a reproduction' },
  'manci-perch': { author: 'Manci', year: null, title: 'Yellow perch, Global Seafood Alliance Advocate', where: 'market size', reading: 'read' },
  'was-166442': { author: 'Kentucky State University', year: null, title: 'Largemouth bass growth by temperature, World Aquaculture Society abstract 166442', where: null, reading: 'read' },
  'currie-1998': { author: 'Currie, Bennett & Beitinger', year: 1998, title: 'Critical thermal minima and maxima of three freshwater game-fish species, Environ. Biol. Fishes 51:187-200', where: null, reading: 'abstract read' },
  'tomasso-1986': { author: 'Tomasso', year: 1986, title: 'Comparative toxicity of nitrite to freshwater fishes, Aquat. Toxicol. 8:129-137', where: null, reading: 'abstract read' },
  'piper-1982': { author: 'Piper et al.', year: 1982, title: 'Fish hatchery management, US Fish and Wildlife Service', where: 'pp. 61, 211, 351, 356, 357, 362', reading: 'read' },
  'tucker-2004': { author: 'Tucker, Avery & Heikes', year: 2004, title: 'Culture methods, in Biology and culture of channel catfish', where: 'opening', reading: 'read in part' },
  'mischke-2012': { author: 'Mischke et al.', year: 2012, title: 'J. World Aquac. Soc. 43:135-139, fry survival in ponds', where: null, reading: 'abstract read' },
  'wynne-2007': { author: 'Wynne', year: 2007, title: 'Hauling fish, World Aquaculture 38(1)', where: null, reading: 'read' },
  'ifas-catfish': { author: 'University of Florida IFAS', year: null, title: 'Catfish fingerling bulletin', where: 'pp. 12-13, table 6', reading: 'read in part' },
  'alabama-catfish': { author: 'Alabama Cooperative Extension', year: null, title: 'Producing channel catfish fingerlings', where: 'table 7', reading: 'read' },
  'huysman-2020': { author: 'Huysman et al.', year: 2020, title: 'Adv. Biosci. Biotechnol. 11:345-353, rainbow trout at high temperature', where: null, reading: 'read' },
  'srac-220': { author: 'Hinshaw & Thompson', year: null, title: 'Trout production: handling eggs and fry, SRAC Publication 220', where: null, reading: 'read' },
  'fao-carp': { author: 'FAO', year: null, title: 'Cultured aquatic species: Cyprinus carpio', where: null, reading: 'read in a reproduction' },
  'srac-7201': { author: 'Watson, Hill & Pouder', year: 2004, title: 'Species profile: koi and goldfish, SRAC Publication 7201', where: 'opening', reading: 'read in part' },
  'wares-igram-1979': { author: 'Wares & Igram', year: 1979, title: 'Oxygen use of fathead minnows, Comp. Biochem. Physiol. 62A:351-356', where: null, reading: 'abstract read' },
  'srac-120': { author: 'Stone & Thomforde', year: 2001, title: 'Common farm-raised baitfish, SRAC Publication 120', where: 'opening', reading: 'read in part' },
  'pearson-2009': { author: 'Pearson et al.', year: 2009, title: 'Hauling golden shiners, N. Am. J. Aquac.', where: null, reading: 'abstract read' },
  'srac-300': { author: 'SRAC', year: null, title: 'Hybrid striped bass, SRAC Publication 300', where: null, reading: 'read in a reproduction' },
  'hsb-stocking': { author: 'N. Am. fisheries abstract', year: null, title: 'Poststocking survival of hybrid striped bass after changes in hardness and temperature', where: null, reading: 'abstract read' },
  'queensland-redclaw': { author: 'Queensland Government', year: null, title: 'Redclaw: culture environment', where: null, reading: 'read' },
  'jaa-redclaw': { author: 'Journal of Applied Aquaculture', year: null, title: 'Growth of redclaw by temperature', where: 'one paragraph', reading: 'read in part' },
  'avault-huner-1985': { author: 'Avault & Huner', year: 1985, title: 'Crawfish culture in the United States, as cited in a culture text', where: null, reading: 'read in a reproduction' },
  'seafwa-1969': { author: 'Proc. SEAFWA', year: 1969, title: 'Effects of soil and water hardness on red swamp crayfish', where: null, reading: 'abstract read' },
  'fao-428': { author: 'New', year: 2002, title: 'Farming freshwater prawns, FAO Fisheries Technical Paper 428', where: 'sect. 5.3', reading: 'read' },
  'jaa-prawn-density': { author: 'Journal of Applied Aquaculture', year: null, title: 'Effect of biomass density on transport survival of juvenile freshwater prawn', where: null, reading: 'abstract read' },
  'smith-wannamaker-1983': { author: 'Smith & Wannamaker', year: 1983, title: 'Shipping juvenile and adult prawns, Aquac. Eng. 2:287-300', where: null, reading: 'abstract read' },
  'habashy-hassan-2011': { author: 'Habashy & Hassan', year: 2011, title: 'Prawn growth by temperature and ammonia', where: null, reading: 'abstract read' },
  'prawn-extension': { author: 'Extension text', year: null, title: 'Freshwater prawn water quality: ammonia and pH', where: null, reading: 'read' },
  'vermicompost-article': { author: 'Encyclopaedia article', year: null, title: 'Vermicompost', where: null, reading: 'read' },
  'worm-species-page': { author: 'Species data page', year: null, title: 'Compost worms: temperature, pH, moisture', where: null, reading: 'read' },
  'worm-guides': { author: 'Several guides', year: null, title: 'Worms per pound', where: null, reading: 'read' },
  'tomberlin-2009': { author: 'Tomberlin, Adler & Myers', year: 2009, title: 'Development of the black soldier fly in relation to temperature, Environ. Entomol. 38:930-934', where: null, reading: 'abstract read' },
  'villazana-2019': { author: 'Villazana & Alyokhin', year: 2019, title: 'Cold tolerance of black soldier fly larvae, J. Econ. Entomol. 112:2632-2637', where: null, reading: 'abstract read' },
  'bsf-article': { author: 'Encyclopaedia article', year: null, title: 'Hermetia illucens: storage of larvae', where: null, reading: 'read' },
  'srac-462': { author: 'SRAC', year: null, title: 'Nitrite in fish ponds, SRAC Publication 462', where: null, reading: 'read in a reproduction' },
  'aquasearch-tgc': { author: 'AquaSearch', year: null, title: 'Calculations page for fish farmers', where: 'thermal growth coefficient', reading: 'read' },
  // Water
  'emerson-1975': { author: 'Emerson, Russo, Lund & Thurston', year: 1975, title: 'Aqueous ammonia equilibrium calculations, J. Fish. Res. Board Can. 32:2379-2383', where: 'as tabled by UF/IFAS FA16', reading: 'read in a reproduction' },
  'ifas-fa16': { author: 'Francis-Floyd et al., UF/IFAS', year: null, title: 'Ammonia in aquatic systems, FA16', where: null, reading: 'read in a reproduction' },
  'trussell-1972': { author: 'Trussell', year: 1972, title: 'Percent un-ionized ammonia, as printed in a test-kit manual', where: null, reading: 'read' },
  'benson-krause-1984': { author: 'Benson & Krause', year: 1984, title: 'Dissolved oxygen in fresh and sea water, as in USGS memo 2011.03', where: null, reading: 'read in a reproduction' },
  'weiss-1974': { author: 'Weiss', year: 1974, title: 'Carbon dioxide in water and seawater, Mar. Chem. 2:203-215', where: null, reading: 'from memory' },
  'plummer-busenberg-1982': { author: 'Plummer & Busenberg', year: 1982, title: 'Solubilities in the system CaCO3-CO2-H2O, Geochim. Cosmochim. Acta 46', where: 'pK1', reading: 'from memory' },
  'epa-2013-ammonia': { author: 'US Environmental Protection Agency', year: 2013, title: 'Aquatic life criteria for ammonia, EPA 822-R-13-001', where: 'equations, as used in a state agency script', reading: 'read in a reproduction' },
  // Growth
  'liao-1971': { author: 'Liao', year: 1971, title: 'Water requirements of salmonids, Prog. Fish-Cult. 33', where: null, reading: 'from memory' },
  'boyd-1978': { author: 'Boyd, Romaire & Johnston', year: 1978, title: 'Predicting early morning dissolved oxygen in channel catfish ponds, Trans. Am. Fish. Soc. 107', where: null, reading: 'from memory' },
  'iwama-tautz-1981': { author: 'Iwama & Tautz', year: 1981, title: 'A simple growth model for salmonids in hatcheries, Can. J. Fish. Aquat. Sci. 38', where: null, reading: 'read in a reproduction' },
  'jobling-2003': { author: 'Jobling', year: 2003, title: 'The thermal growth coefficient model of fish growth: a cautionary note, Aquac. Res. 34:581-584', where: null, reading: 'read' },
  'dwyer-1981': { author: 'Dwyer et al.', year: 1981, title: 'Monthly temperature units of trout growth, as tabled', where: null, reading: 'read in a reproduction' },
  // Transport
  'grundstein-2010': { author: 'Grundstein et al.', year: 2010, title: 'Heating of closed cars, Bull. Am. Meteorol. Soc.', where: null, reading: 'read' },
  'mclaren-2005': { author: 'McLaren, Null & Quinn', year: 2005, title: 'Heat stress from enclosed vehicles, Pediatrics 116:e109', where: null, reading: 'read' },
  'mx392': { author: 'Swann', year: null, title: 'Transportation of fish in bags, University of Missouri Extension MX392', where: 'opening', reading: 'read in part' },
  'dupree-huner-1984': { author: 'Dupree & Huner', year: 1984, title: 'Third report to the fish farmers, US Fish and Wildlife Service', where: 'bag loading table', reading: 'read in a reproduction' },
  'froese-1998': { author: 'Froese', year: 1998, title: 'Insulating properties of styrofoam boxes used for transporting live fish, Aquaculture 159:283-292', where: null, reading: 'abstract read' },
  'lsu-cocahoe': { author: 'LSU AgCenter', year: null, title: 'Cocahoe minnow manual', where: 'ch. 9', reading: 'read' },
  // Climate and places
  'karney-2013': { author: 'Karney', year: 2013, title: 'Algorithms for geodesics, J. Geod. 87:43-55', where: 'inverse problem', reading: 'from memory' },
  'arguez-2012': { author: 'Arguez et al., NOAA NCEI', year: 2012, title: "NOAA's 1981-2010 US climate normals, Bull. Am. Meteorol. Soc., doi:10.1175/BAMS-D-11-00197.1", where: 'monthly normals', reading: 'read' },
  'census-zcta': { author: 'US Census Bureau', year: 2021, title: 'Gazetteer files: ZIP Code Tabulation Areas', where: 'internal points', reading: 'read' },
  'geonames': { author: 'GeoNames', year: null, title: 'Places with population, CC BY 4.0', where: null, reading: 'read' },
  'open-meteo': { author: 'Open-Meteo', year: null, title: 'Weather forecast by interface; data under CC BY 4.0', where: null, reading: 'from memory' },
  'us-holidays': { author: '18F', year: null, title: 'us-federal-holidays, days on which federal holidays are observed, CC0', where: null, reading: 'read' },
  // Produce and media
  'ne-veg-guide': { author: 'New England Vegetable Management Guide', year: null, title: 'Storage conditions of vegetables, after USDA Handbook 66', where: 'table 16', reading: 'read' },
  'ucd-produce-facts': { author: 'Cantwell & Reid, UC Davis Postharvest Center', year: null, title: 'Produce Facts: fresh culinary herbs', where: null, reading: 'read' },
  'lange-cameron-1994': { author: 'Lange & Cameron', year: 1994, title: 'Chilling injury of sweet basil below 12 °C, as cited', where: null, reading: 'read in a reproduction' },
  'lange-cameron-1997': { author: 'Lange & Cameron', year: 1997, title: 'Sweet basil at 5 °C, HortScience 32:114-116', where: null, reading: 'read' },
  'hb66-1954': { author: 'US Department of Agriculture', year: 1954, title: 'Handbook 66, commercial storage of fruits and vegetables', where: null, reading: 'read in a reproduction' },
  'nist-hb-130': { author: 'National Institute of Standards and Technology', year: 2019, title: 'Handbook 130, method of sale of commodities', where: null, reading: 'read in part' },
  'state-produce-units': { author: 'A state office of weights and measures', year: null, title: 'Chart of the units produce is sold by', where: null, reading: 'read in part' },
  'umd-produce': { author: 'University of Maryland Extension', year: null, title: 'Selling fruits and vegetables: whole, cut and ready to eat', where: null, reading: 'read in part' },
  'food-code-2009': { author: 'US Food and Drug Administration', year: 2009, title: 'Food Code: cut leafy greens, as summarised', where: null, reading: 'read in a reproduction' },
  'hollyer-2009': { author: 'Hollyer et al.', year: 2009, title: 'On-farm food safety: aquaponics, CTAHR FST-38', where: null, reading: 'read in part' },
  'umaine-4281': { author: 'University of Maine Extension', year: null, title: 'Produce safety rule: who is covered, Bulletin 4281', where: null, reading: 'read in part' },
  'nsac-fsma': { author: 'National Sustainable Agriculture Coalition', year: null, title: 'Analysis of the produce safety rule and its modified requirements', where: null, reading: 'read in part' },
  'fsma-news-2018': { author: 'Trade news', year: 2018, title: 'Adjusted cut-off of the produce safety rule for 2015 to 2017', where: null, reading: 'read in a reproduction' },
  'fda-deflators': { author: 'US Food and Drug Administration', year: 2022, title: 'Deflators for the cut-offs of the produce safety rule; the sum is our own', where: null, reading: 'read in part' },
  'lsu-traceability': { author: 'LSU AgCenter; Rutgers', year: null, title: 'Traceability of produce: lot codes, one step back and forward', where: null, reading: 'read in part' },
  'clay-maker': { author: 'Maker of expanded clay', year: null, title: 'Loose weight of expanded clay by grain size', where: null, reading: 'read in a reproduction' },
  'clay-article': { author: 'Encyclopaedia article', year: null, title: 'Expanded clay aggregate in hydroponics', where: null, reading: 'read in a reproduction' },
  'perlite-page': { author: 'Material data page', year: null, title: 'Loose weight of expanded perlite', where: null, reading: 'read in a reproduction' },
  'umn-jumping-worms': { author: 'University of Minnesota Extension', year: null, title: 'Questions about jumping worms', where: 'heating of compost', reading: 'read' },
  // Rules of the trade
  'cfr-50-16-13': { author: '50 CFR 16.13', year: 2010, title: 'Injurious fish, mollusks and crustaceans, e-CFR copies of 2007 and 2010', where: null, reading: 'read in part' },
  'fr-72-37459': { author: 'US Fish and Wildlife Service', year: 2007, title: '72 FR 37459, silver carp and largescale silver carp', where: null, reading: 'read in part' },
  'fr-81-67862': { author: 'US Fish and Wildlife Service', year: 2016, title: '81 FR 67862, ten freshwater fish and one crayfish', where: null, reading: 'read in part' },
  'penn-state-weeds': { author: 'Penn State Extension; 7 CFR 360', year: null, title: 'Aquatic noxious weeds', where: null, reading: 'read in part' },
  'plants-list-2000': { author: 'Aquatic-plants mailing list', year: 2000, title: 'Federal noxious weeds as quoted in November 2000', where: null, reading: 'read in a reproduction' },
  'chilton-jap': { author: 'Chilton', year: null, title: 'Risk assessment of water spinach in Texas, J. Aquat. Plant Manage. 55', where: null, reading: 'read in a reproduction' },
  'mn-worms-2024': { author: 'Minnesota DNR', year: 2024, title: 'Jumping worms: page for businesses', where: null, reading: 'read' },
  'mn-fish-faq': { author: 'Minnesota DNR', year: null, title: 'Questions about the proposed fish rule', where: null, reading: 'read in part' },
  'az-guidance-2016': { author: 'Arizona Game and Fish, reprinted', year: 2016, title: 'Tilapia guidance', where: null, reading: 'read in a reproduction' },
  'ccr-14-171': { author: 'California', year: null, title: '14 CCR 171, importation of live catfish', where: null, reading: 'read in part' },
  'ca-leaflet-35': { author: 'California', year: null, title: 'Inland aquaculture leaflet 35; Fish and Game Code 2271 summary', where: null, reading: 'read in a reproduction' },
  'fdacs-2022': { author: 'Florida Department of Agriculture and Consumer Services', year: 2022, title: 'Food fish: tilapia', where: null, reading: 'read in part' },
  'ga-wrd': { author: 'Georgia Wildlife Resources Division', year: null, title: 'Wild animals overview: exotic fish', where: null, reading: 'read in part' },
  'ga-reprint': { author: 'Reprint page', year: null, title: 'Georgia: tanks with no discharge, as reported', where: null, reading: 'read in a reproduction' },
  'il-870-50': { author: 'Illinois', year: null, title: '17 Ill. Adm. Code 870.50, restricted species transportation', where: null, reading: 'read in part' },
  'il-875': { author: 'Illinois', year: null, title: '17 Ill. Adm. Code 875, VHS-susceptible species', where: null, reading: 'read in part' },
  'la-76-vii-903': { author: 'Louisiana', year: 2024, title: 'La. Admin. Code 76:VII.903, tilapia permit (text to September 2024)', where: null, reading: 'read in part' },
  'mi-mdard': { author: 'Michigan Department of Agriculture and Rural Development', year: null, title: 'Importing aquaculture species', where: null, reading: 'read in part' },
  'nrs-503-597': { author: 'Nevada', year: null, title: 'NRS 503.597, bringing aquatic life into the state', where: null, reading: 'read in part' },
  'nv-blog': { author: 'Blog', year: 2010, title: 'Tilapia said to be on the Nevada list', where: null, reading: 'read in a reproduction' },
  'oac-1501-31-39': { author: 'Ohio', year: null, title: 'OAC 1501:31-39-01, aquaculture permits', where: null, reading: 'read in part' },
  'odnr-aquaculture': { author: 'Ohio Department of Natural Resources', year: null, title: 'Aquaculture permits page', where: null, reading: 'read in part' },
  'tpwd-2013': { author: 'Texas Parks and Wildlife Commission', year: 2013, title: 'Agenda item on tilapia and the exotic species transport invoice', where: null, reading: 'read in part' },
  'ut-r657-3': { author: 'Utah', year: null, title: 'R657-3-23, classification of fish', where: null, reading: 'read in part' },
  'ut-summary': { author: '100th Meridian', year: null, title: 'Summary of Utah rules', where: null, reading: 'read in a reproduction' },
  'va-import-form': { author: 'Virginia Department of Wildlife Resources', year: 2020, title: 'Form to import tilapia, 4VAC15-30-40', where: null, reading: 'read' },
  'va-15-20-210': { author: 'Virginia', year: null, title: '4VAC15-20-210, predatory and undesirable species', where: null, reading: 'read in part' },
  'wi-datcp': { author: 'Wisconsin DATCP', year: null, title: 'Fish movement page; ATCP 10.62', where: null, reading: 'read in part' },
  'ny-district-2016': { author: 'New York county conservation district', year: 2016, title: 'Summer fish order form', where: null, reading: 'read' },
  'demonstration': { author: 'Tankward', year: 2026, title: 'Demonstration only, not a reading of any law', where: null, reading: 'own' },
  // Trade practice and ourselves
  'trade-practice': { author: 'Sellers and buyers in public pages', year: null, title: 'Trade practice as described', where: null, reading: 'read in a reproduction' },
  'inform-act': { author: 'US Federal Trade Commission', year: null, title: 'INFORM Consumers Act, guidance for sellers: 200 sales and $5,000 in twelve months', where: null, reading: 'read in part' },
  'memory': { author: 'Tankward', year: null, title: 'From memory, not checked against a text', where: null, reading: 'from memory' },
  'house-rule': { author: 'Tankward', year: null, title: 'House rule: our own cautious judgement', where: null, reading: 'own' },
} as const satisfies Record<string, Source>

export type SourceKey = keyof typeof table

/** Every citation once. A number that came from a publication carries one of these keys beside it. */
export const sources: Readonly<Record<SourceKey, Source>> = table

/** Where the shipped tables of places and climate come from; each is credited on the page about sources. */
export const openDataSources: readonly SourceKey[] = [
  'geonames',
  'census-zcta',
  'arguez-2012',
  'open-meteo',
  'us-holidays',
]

/** One line for a reader: author, year, title, place in it, how it was read. */
export function printSource(key: SourceKey): string {
  const { author, year, title, where, reading } = sources[key]
  if (reading === 'own') return title
  const cited = [author, year, title, where].filter((part) => part !== null).join(', ')
  return reading === 'read' ? cited : `${cited} (${reading})`
}
