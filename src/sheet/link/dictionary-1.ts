/**
 * The preset dictionary of links of version 1: strings that sheets are likely to hold, the likelier
 * ones nearer the end, as they stand in the JSON of `serializeSheetLine`. Every link of version 1 was
 * made against exactly these characters, so they never change: a better dictionary is another version.
 */
export const DICTIONARY_1 = [
  // Seldom: reports, hand drawing, three-phase systems, corrections, scales.
  '"report":{"hazards":[{"hazard":"live parts","control":"insulated probes, one hand","risk":"medium"',
  '},{"hazard":"stored charge","control":"discharge and prove dead","risk":"high","supervision":"',
  '","risk":"low"}],"criterion":"","conclusion":"accepted"},"chosen":[{"phasor":"',
  '"threePhase":[{"id":"t1","label":"supply","kind":"line","phasors":["VAB","VBC","VCA"],',
  '"connection":"delta","wires":3,"neutral":"IN","names":["A","B","C"],"currents":["IA","IB","IC"]}],',
  '"kind":"phase","phasors":["VA","VB","VC"],"connection":"star","wires":4,"names":["L1","L2","L3"]',
  '"hand":[{"id":"h1","sum":"s1","stands":"closing","from":{"x":20,"y":30},"to":{"x":100,"y":50}}],',
  '"corrected":{"mistake":"reversed","original":{"id":"r1","of":"","kind":""},"by":"","date":"","reason":"',
  '"mistake":"peak-as-rms"peak-to-peak-as-rms"rms-as-peak"turns-not-divided"turns-divided-twice"ratio-left-out',
  '"ratio-applied-twice"wrong-ratio"line-as-phase"phase-as-line"decade-slip"digits-transposed"lead-lag-swapped',
  '"half-period"double-period"wrong-angle-reference"readings-swapped"phases-swapped"winding-resistance-omitted',
  '"element-decade-slip"element-changed"distorted-waveform"one-reading-off"',
  '"unitsPerCentimetre":{"voltage":10,"current":0.5,"impedance":20,"power":50,"other":1},',
  '"tolerance":{"millimetres":0.5,"degrees":0.5}},"assumed":{"percent":1,"degrees":1,"elementPercent":5},',
  '"quantity":"impedance","quantity":"power","quantity":"other","real":{"value":3,"imaginary":{"value":4,"text":"',
  // Circuits.
  '"elements":[{"id":"R1","label":"R","kind":"resistor","voltage":"VR","current":"I","resistance":{"value":100',
  '{"id":"C1","label":"C","kind":"capacitor","voltage":"VC","current":"I","capacitance":{"value":0.00001,"text":"10 µF"',
  '{"id":"L1","label":"L","kind":"coil","voltage":"Vcoil","current":"I","resistance":{"value":20},"inductance":{"value":0.1',
  ',"text":"100 mH"},"dcResistance":{"value":"kind":"impedance","reactance":{"value":',
  '},"rating":{"voltage":400,"current":2},"marked":{"resistance":{"value":47,"inductance":{"value":"capacitance":{"value":',
  '}}],"circuit":{"series":[{"element":"R1"},{"parallel":[{"element":"C1"},{"element":"L1"}]}]},',
  // Readings of other kinds, channels.
  '"kind":"shift","shift":"1.2","period":"8.0","sense":"lags"},"kind":"ellipse","intercept":"3.1","height":"5.2","tilt":"rising"',
  '"kind":"power","shown":"","with":"I","kind":"reactive-power","kind":"power-factor","currentChannel":"',
  '"form":"peak-to-peak","form":"rms","form":"peak","ratio":10,"turns":5,"shunt":0.1,"struck":true,"repeats":[',
  '"channels":[{"id":"ct1","label":"CT ","ratio":{"value":20,"text":"100/5"},"turns":1,"phaseError":{"value":0.5},"reversed":true}],',
  ',"channel":"ct1","range":2,"channel":"vt1","range":20,"pass":"1","pass":"2","limit":0.05},"limit":0.1},"limit":0.5},',
  // The title block and the instruments.
  '"drawing":{"paper":"A4","orientation":"portrait","paper":"A3","paper":"Letter","orientation":"landscape","origin":{"x":40,"y":60}},',
  '{"format":"phasogon-sheet","version":1,"title":"Motor, pump, fan: main winding, auxiliary winding, run capacitor","revision":"A",',
  '"job":{"number":"2026-0","site":"","circuit":"Panel ","conditions":"no load, running, at rated load","testedBy":"","checkedBy":"',
  '","approvedBy":"","date":"2026-01-',
  '","notes":"capacitor replaced"},"frequency":{"value":60,"text":"60"},"frequency":{"value":50,"text":"50"},',
  '"reference":"I","supply":"VS","drift":0.5,"reference":"VS","supply":"V1",',
  '"instruments":[{"id":"m1","name":"Multimeter","serial":"","calibrationDue":"2027-0',
  '-31","category":"CAT III 1000 V","category":"CAT IV 600 V","responding":"average",',
  '"angles":"lag-positive","angles":"lead-positive","inputResistance":{"value":10000000,"text":"10 M"},',
  '{"id":"m2","name":"Clamp meter","serial":"","calibrationDue":"2027-12-31","category":"CAT III 600 V","responding":"true-rms",',
  '"inputResistance":{"value":1000000,"text":"1 M"},"accuracy":[{"of":"power","text":"±(',
  '2 % of reading + 1 % of range)"}',
  '{"id":"m3","name":"Oscilloscope","name":"Power analyser","name":"Phase angle meter","accuracy":[{"of":"time","text":"±',
  '{"of":"resistance","range":600,"text":"±(',
  '"accuracy":[{"of":"angle","text":"±1°"}]},"text":"±0.5°"}]},"accuracy":[{"of":"voltage","range":60,"text":"±(0.5 % + 2 digits)"},',
  '{"of":"voltage","range":600,"text":"±(1 % + 3 digits)"}]},"accuracy":[{"of":"current","range":6,"text":"±(1.5 % + 5 digits)"},{"of":"current","range":',
  // The sums.
  '"sums":[{"id":"s1","label":"loop","terms":[{"phasor":"IA"},{"phasor":"IB","sign":-1},{"phasor":"IC"}],"equals":0},',
  '"arrangement":"tip-to-tail","start":{"x":40,"y":60}},"arrangement":"from-origin"},{"id":"s2","label":"',
  '"terms":[{"phasor":"VR"},{"phasor":"VL"},{"phasor":"VC"}],"equals":"VS"},{"id":"s3","terms":[{"phasor":"I1"},{"phasor":"I2"}],"equals":"I"}],',
  // Phasors, typed and read.
  '"phasors":[{"id":"V1","label":"V1","quantity":"voltage","from":"L","to":"N","tail":{"tipOf":"V1"},"tail":{"x":',
  '{"id":"I1","label":"Isupply","quantity":"current","magnitude":{"value":2.5,"text":"2.50","limit":0.05},"angle":{"value":-30,"text":"−30","limit":1}},',
  '{"id":"VS","label":"Vsupply","quantity":"voltage","magnitude":{"value":230,"text":"230"},"angle":{"value":0,"text":"0"}},',
  '{"id":"Vcoil","label":"Vcoil","quantity":"voltage","from":"a","to":"b"},{"id":"I","label":"I","quantity":"current"}],',
  '"readings":[{"id":"r1","of":"V1","kind":"magnitude","shown":"24.0","instrument":"m1","range":60},',
  '{"id":"r2","of":"I","kind":"magnitude","shown":"1.84","instrument":"m2","range":6},',
  '{"id":"r3","of":"V2","kind":"angle","shown":"72.9","against":"I","sense":"leads","instrument":"m3"},{"id":"r4","of":"VS","kind":"angle","shown":"36.4","sense":"lags","instrument":"m3"},',
  '{"id":"r10","of":"VC","kind":"magnitude","shown":"',
].join('')
