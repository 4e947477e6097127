/**
 * The preset dictionary of links of version 1: strings that packed sheets are likely to hold, the
 * likelier ones nearer the end. Every link of version 1 was made against exactly these characters, so
 * they never change: a better dictionary is another version.
 */
export const DICTIONARY_1 = [
  // Seldom: what was corrected, hand drawing, three-phase systems, hazards.
  'reversed|peak-as-rms|peak-to-peak-as-rms|rms-as-peak|turns-not-divided|turns-divided-twice|ratio-left-out',
  '|ratio-applied-twice|wrong-ratio|line-as-phase|phase-as-line|decade-slip|digits-transposed|lead-lag-swapped',
  '|half-period|double-period|wrong-angle-reference|readings-swapped|phases-swapped|winding-resistance-omitted',
  '|element-decade-slip|element-changed|distorted-waveform|one-reading-off",[1,"mistake|original|by|date|reason",',
  '"report":{"hazards":[1,"hazard|control|risk|supervision","low|medium|high"],"criterion":"conclusion":"',
  '"chosen":[1,"phasor|magnitude|angle","hand":[1,"id|sum|stands|from|to","h1","closing",[1,"x|y",',
  '"threePhase":[1,"id|label|kind|phasors|connection|wires|neutral|names|currents","line|phase",',
  '[0,[3,"L1|L2|L3"],[3,"IA|IB|IC"]],"star|delta","IN",',
  '"assumed":{"percent":1,"degrees":1,"elementPercent":5},"tolerance":{"millimetres":0.5,',
  '"origin":{"x":"unitsPerCentimetre":{"voltage":10,"current":0.',
  // The circuit, and readings that are seldom taken.
  '"circuit":{"series":[1,"element|series|parallel","elements":[1,"id|label|kind|voltage|current|',
  'resistance|inductance|dcResistance|capacitance|reactance|rating|marked","resistor|coil|capacitor|impedance",',
  '"channels":[1,"id|label|ratio|turns|phaseError|reversed","ct1",[0,true],',
  '|shift|period|intercept|height|tilt|form|with|ratio|shunt|channel|currentChannel|repeats|pass|struck|corrected",',
  '|ellipse|power|reactive-power|power-factor","rising|falling","rms|peak|peak-to-peak",',
  '"impedance|power|other","from|to|tail|real|imaginary",[1,"tipOf","',
  // The drawing, the title block and the instruments.
  '"Letter"portrait"drawing":{"paper":"A4","drawing":{"paper":"A3","orientation":"landscape"}',
  '{"format":"phasogon-sheet","version":1,"title":"","revision":"A","job":{"number":"2026-","site":"',
  '","circuit":"Panel ","conditions":"running","testedBy":"","checkedBy":"","approvedBy":"","date":"2027-',
  '","notes":""},"frequency":{"value":50,"text":"50"},',
  '"reference":"VS","supply":"VS","drift":0.5,"instruments":[1,"id|name|serial|calibrationDue|category|',
  'responding|angles|inputResistance|accuracy","Multimeter|Clamp meter|Oscilloscope|Phase angle meter",',
  '"2027-01-31|2027-06-30","CAT III 1000 V|CAT IV 600 V|CAT III 600 V",',
  '"true-rms|average","lead-positive|lag-positive",[1,"value|text",[2,"10000000|"],"10 MΩ|"],',
  '[0,[1,"of|text","time|resistance|power|angle","±0.5°"],[1,"of|text","angle","±1°"],',
  '[1,"of|range|text","current",[2,"6|60"],"±(1.5 % + 5 digits)"],',
  '[1,"of|range|text","voltage|voltage",[2,"60|600"],"±(0.5 % + 2 digits)|±(1.0 % + 3 digits)"]',
  // Sums, phasors and readings.
  '],"sums":[1,"id|label|terms|equals|arrangement|start","s1|s2|s3|s4",[0,[1,"phasor|sign",',
  '"VR|VL",[2,"1|-1"]],[1,"phasor","VR|VL|VC"]],"VS","tip-to-tail|from-origin"]',
  '"phasors":[1,"id|label|quantity|from|to|magnitude|angle","I|I1|I2|VR|VC|VS|V1|V2|V3|Vcoil|Vsupply",',
  '"current|current|voltage|voltage|voltage|voltage",[1,"value|text|limit",[2,"0||||||||"],"0||||||||"]],',
  '"readings":[1,"id|of|kind|shown|against|sense|turns|instrument|range|limit",',
  '"r1|r2|r3|r4|r5|r6|r7|r8|r9|r10|r11|r12|r13|r14|r15|r16|r17|r18|r19|r20|r21|r22|r23|r24",',
  '"||leads||lags||lags||leads","m1|m2|m3|m1|m3|m1|m3",[2,"6|60|600||60||600||600"],',
  '"magnitude|magnitude|angle|magnitude|angle|magnitude|angle","',
].join('')
