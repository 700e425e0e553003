/** A stock list to begin with; parts and figures are invented. */
export const stockTemplate = `# Stock list. One part a line; a blank cell means: not known. Values with prefix and unit: 82 nH, 8.2 pF, 8p2.
# kind: inductor or capacitor. tolerance: 5 %, 0.25 pF or a letter of IEC 60062. Q without a frequency: at the design frequency.
# Mandatory: name, kind, value. Ratings: peak or direct voltage in V, RMS current in A. The parts below are examples.
name,kind,value,tolerance,Q,Q frequency,self-resonance,ESL,rated voltage,rated current
"coil 10 nH, 2 %",inductor,10 nH,2 %,55,250 MHz,3.6 GHz,,,1.0
"coil 22 nH, 2 %",inductor,22 nH,2 %,52,250 MHz,2.4 GHz,,,0.9
"coil 47 nH, 5 %",inductor,47 nH,5 %,48,150 MHz,1.6 GHz,,,0.7
"coil 82 nH, 5 %",inductor,82 nH,5 %,45,150 MHz,1.2 GHz,,,0.6
"coil 220 nH, 5 %",inductor,220 nH,5 %,40,100 MHz,700 MHz,,,0.45
"chip 2.2 pF, 0.1 pF",capacitor,2.2 pF,0.1 pF,600,150 MHz,,0.4 nH,100,
"chip 4.7 pF, 0.25 pF",capacitor,4.7 pF,C,500,150 MHz,,0.4 nH,100,
"chip 8.2 pF, 0.25 pF",capacitor,8.2 pF,0.25 pF,450,150 MHz,,0.4 nH,100,
"chip 22 pF, 2 %",capacitor,22 pF,2 %,350,150 MHz,,0.4 nH,100,
"chip 100 pF, 5 %",capacitor,100 pF,J,200,150 MHz,,0.4 nH,50,
`;
