/** A wind as read by hand from its group, in the group's own unit. */
export interface ExpectedWind {
  readonly unit: 'kt' | 'm/s' | 'km/h';
  /** degrees, or from any direction */
  readonly from: number | 'variable';
  readonly speed: number;
  readonly gust?: number;
  readonly sector?: readonly [number, number];
}

/** A report written for this test, of a station that does not exist, and what a reader makes of it with the code table in hand. */
export interface WellFormed {
  readonly report: string;
  /** absent where the report has none */
  readonly wind?: ExpectedWind | 'calm' | 'not-reported' | 'beyond-scale';
  /** degC */
  readonly temperature?: number;
  readonly dewPoint?: number;
  readonly hPa?: number;
  readonly inHg?: number;
  readonly notUnderstood?: readonly string[];
  readonly runwayStates?: number;
  readonly trend?: string;
}

const kt = (
  from: ExpectedWind['from'],
  speed: number,
  gust?: number,
  sector?: readonly [number, number],
): ExpectedWind => ({
  unit: 'kt',
  from,
  speed,
  ...(gust === undefined ? {} : { gust }),
  ...(sector === undefined ? {} : { sector }),
});
const mps = (from: ExpectedWind['from'], speed: number, gust?: number): ExpectedWind => ({
  ...kt(from, speed, gust),
  unit: 'm/s',
});
const kmh = (from: ExpectedWind['from'], speed: number, gust?: number): ExpectedWind => ({
  ...kt(from, speed, gust),
  unit: 'km/h',
});

export const wellFormed: readonly WellFormed[] = [
  // western Europe: knots, hectopascals, trend
  {
    report: 'METAR ZZAA 011250Z 27015KT 9999 FEW020 18/09 Q1013 NOSIG',
    wind: kt(270, 15),
    temperature: 18,
    dewPoint: 9,
    hPa: 1013,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZAB 011250Z 27015G25KT 240V310 9999 SCT030 BKN045 18/M02 Q0998',
    wind: kt(270, 15, 25, [240, 310]),
    temperature: 18,
    dewPoint: -2,
    hPa: 998,
  },
  {
    report: 'METAR ZZAC 011250Z 00000KT CAVOK M00/M05 Q1031 NOSIG',
    wind: 'calm',
    temperature: 0,
    dewPoint: -5,
    hPa: 1031,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZAD 312350Z VRB02KT 0350 R09/0600U R27/0550N FG VV001 04/04 Q1024 BECMG 0800',
    wind: kt('variable', 2),
    temperature: 4,
    dewPoint: 4,
    hPa: 1024,
    trend: 'BECMG 0800',
  },
  {
    report: 'METAR ZZAE 011220Z AUTO 20008KT 170V230 9999NDV NCD 22/14 Q1016',
    wind: kt(200, 8, undefined, [170, 230]),
    temperature: 22,
    dewPoint: 14,
    hPa: 1016,
  },
  {
    report: 'METAR COR ZZAF 011220Z 36012KT 9999 -RADZ BKN008 OVC012 07/06 Q1002 TEMPO 3000 RADZ BKN005',
    wind: kt(360, 12),
    temperature: 7,
    dewPoint: 6,
    hPa: 1002,
    trend: 'TEMPO 3000 RADZ BKN005',
  },
  {
    report: 'METAR ZZAG 011220Z AUTO /////KT //// // ////// 11/09 Q1009',
    wind: 'not-reported',
    temperature: 11,
    dewPoint: 9,
    hPa: 1009,
  },
  {
    report: 'METAR ZZAH 011220Z AUTO 24017G28KT 9999 // SCT024/// BKN031/// //////CB 15/10 Q1007 RERA',
    wind: kt(240, 17, 28),
    temperature: 15,
    dewPoint: 10,
    hPa: 1007,
  },
  {
    report: 'METAR ZZAI 011220Z 24010KT 9999 TS FEW018CB SCT040 27/21 Q1010 RESHRA TEMPO 25030G45KT TSRA',
    wind: kt(240, 10),
    temperature: 27,
    dewPoint: 21,
    hPa: 1010,
    trend: 'TEMPO 25030G45KT TSRA',
  },
  {
    report: 'METAR ZZAJ 010620Z 05003KT 1200 R14/P2000 BCFG NSC 09/09 Q1027 BECMG 3000 BR=',
    wind: kt(50, 3),
    temperature: 9,
    dewPoint: 9,
    hPa: 1027,
    trend: 'BECMG 3000 BR',
  },
  {
    report: 'METAR ZZAK 011220Z 31022G34KT 6000 -SHSN SCT015CB BKN025 M01/M06 Q0989 R31/450294',
    wind: kt(310, 22, 34),
    temperature: -1,
    dewPoint: -6,
    hPa: 989,
    runwayStates: 1,
  },
  {
    report: 'METAR ZZAL 011220Z 12006KT 9999 FEW040 16/08 Q1018 BLU NOSIG',
    wind: kt(120, 6),
    temperature: 16,
    dewPoint: 8,
    hPa: 1018,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZAM 011220Z 23012KT 4000 BR OVC004 10/09 Q1012 YLO2 TEMPO 2500 BKN002 AMB',
    wind: kt(230, 12),
    temperature: 10,
    dewPoint: 9,
    hPa: 1012,
    trend: 'TEMPO 2500 BKN002 AMB',
  },
  // the north: runway states, condition codes, deep cold
  {
    report: 'METAR ZZBA 011220Z 02008KT 9999 FEW030 M17/M20 Q1035 88491092',
    wind: kt(20, 8),
    temperature: -17,
    dewPoint: -20,
    hPa: 1035,
    runwayStates: 1,
  },
  {
    report: 'METAR ZZBB 011220Z 15014KT 3500 -SN BKN009 M03/M04 Q0991 R15/SNOCLO',
    wind: kt(150, 14),
    temperature: -3,
    dewPoint: -4,
    hPa: 991,
    runwayStates: 1,
  },
  {
    report: 'METAR ZZBC 011220Z 15014KT 3500 -SN BKN009 M03/M04 Q0991 R/SNOCLO',
    wind: kt(150, 14),
    temperature: -3,
    dewPoint: -4,
    hPa: 991,
    runwayStates: 1,
  },
  {
    report: 'METAR ZZBD 011220Z 19009KT CAVOK M31/M35 Q1041 R01/CLRD70',
    wind: kt(190, 9),
    temperature: -31,
    dewPoint: -35,
    hPa: 1041,
    runwayStates: 1,
  },
  {
    report: 'METAR ZZBE 011220Z 27010KT 9999 OVC014 01/M01 Q1004 R27/5/5/3 R33/////// NOSIG',
    wind: kt(270, 10),
    temperature: 1,
    dewPoint: -1,
    hPa: 1004,
    runwayStates: 2,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZBF 011220Z 30018KT 9999 SCT020 05/01 Q1008 W08/S4',
    wind: kt(300, 18),
    temperature: 5,
    dewPoint: 1,
    hPa: 1008,
  },
  {
    report: 'METAR ZZBG 011220Z 30018KT 9999 SCT020 05/01 Q1008 W///H25 RMK WIND 1000FT 32035KT',
    wind: kt(300, 18),
    temperature: 5,
    dewPoint: 1,
    hPa: 1008,
  },
  {
    report: 'METAR ZZBH 011220Z 30018KT 9999 SCT020 05/01 Q1008 W11/S/',
    wind: kt(300, 18),
    temperature: 5,
    dewPoint: 1,
    hPa: 1008,
  },
  // metres per second
  {
    report: 'METAR ZZCA 011230Z 18004MPS 9999 BKN013 M08/M10 Q1022 R06/590230 NOSIG',
    wind: mps(180, 4),
    temperature: -8,
    dewPoint: -10,
    hPa: 1022,
    runwayStates: 1,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZCB 011230Z 32009G16MPS 1500 R24/1200D -SHSN BLSN BKN012CB OVC030 M05/M07 Q0996 NOSIG RMK QFE735',
    wind: mps(320, 9, 16),
    temperature: -5,
    dewPoint: -7,
    hPa: 996,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZCC 011230Z 00000MPS CAVOK 24/09 Q1012 NOSIG RMK QFE752/1003',
    wind: 'calm',
    temperature: 24,
    dewPoint: 9,
    hPa: 1012,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZCD 011230Z VRB01MPS 0800 FZFG VV002 M02/M02 Q1033',
    wind: mps('variable', 1),
    temperature: -2,
    dewPoint: -2,
    hPa: 1033,
  },
  {
    report: 'METAR ZZCE 011230Z 04006MPS 010V090 9999 -TSRA SCT026CB 23/19 Q1005 TEMPO 07010G17MPS',
    wind: { ...mps(40, 6), sector: [10, 90] },
    temperature: 23,
    dewPoint: 19,
    hPa: 1005,
    trend: 'TEMPO 07010G17MPS',
  },
  {
    report: 'METAR ZZCF 011230Z 27050MPS 0200 SQ VV/// 12/10 Q0955',
    wind: mps(270, 50),
    temperature: 12,
    dewPoint: 10,
    hPa: 955,
  },
  {
    report: 'METAR ZZCG 011230Z 27030GP49MPS 0200 SQ VV/// 12/10 Q0955',
    wind: 'beyond-scale',
    temperature: 12,
    dewPoint: 10,
    hPa: 955,
  },
  // kilometres per hour
  {
    report: 'METAR ZZDA 011200Z 27036KMH 9999 SCT030 20/10 Q1015',
    wind: kmh(270, 36),
    temperature: 20,
    dewPoint: 10,
    hPa: 1015,
  },
  {
    report: 'METAR ZZDB 011200Z 09054G108KMH 9999 SCT030 20/10 Q1015',
    wind: kmh(90, 54, 108),
    temperature: 20,
    dewPoint: 10,
    hPa: 1015,
  },
  {
    report: 'METAR ZZDC 011200Z 00000KMH 9999 SKC 20/10 Q1015',
    wind: 'calm',
    temperature: 20,
    dewPoint: 10,
    hPa: 1015,
  },
  // North America: miles, inches, remarks
  {
    report: 'METAR ZZEA 011251Z 27015KT 10SM FEW250 12/05 A2992 RMK AO2 SLP133 T01230045',
    wind: kt(270, 15),
    temperature: 12.3,
    dewPoint: 4.5,
    inHg: 29.92,
  },
  {
    report:
      'METAR ZZEB 011251Z AUTO 31012G22KT 10SM CLR M02/M10 A3041 RMK AO2 PK WND 32028/1215 SLP312 T10171100 TSNO $',
    wind: kt(310, 12, 22),
    temperature: -1.7,
    dewPoint: -10,
    inHg: 30.41,
  },
  {
    report: 'SPECI ZZEC 011233Z 18006KT 1 1/2SM +TSRA BR BKN008 OVC020CB 21/20 A2985 RMK AO2 TSB12 P0031 T02110200',
    wind: kt(180, 6),
    temperature: 21.1,
    dewPoint: 20,
    inHg: 29.85,
  },
  {
    report: 'METAR ZZED 011251Z 00000KT M1/4SM FG VV001 08/08 A3002 RMK AO2 SLP166 T00780078',
    wind: 'calm',
    temperature: 7.8,
    dewPoint: 7.8,
    inHg: 30.02,
  },
  {
    report: 'METAR ZZEE 011251Z VRB04KT 3/4SM R17L/4500VP6000FT -SN OVC007 M04/M06 A2974 RMK AO2',
    wind: kt('variable', 4),
    temperature: -4,
    dewPoint: -6,
    inHg: 29.74,
  },
  {
    report: 'METAR ZZEF 011251Z COR 24009KT P6SM SCT045 BKN250 31/ A3001 RMK AO1',
    wind: kt(240, 9),
    temperature: 31,
    inHg: 30.01,
  },
  { report: 'METAR ZZEG 011251Z AUTO 05006KT 10SM CLR A3010 RMK AO1 T00220011', wind: kt(50, 6), inHg: 30.1 },
  {
    report: 'METAR ZZEH 011251Z 070100KT 1/4SM +RA FG VV001 26/25 A2711 RMK AO2',
    wind: kt(70, 100),
    temperature: 26,
    dewPoint: 25,
    inHg: 27.11,
  },
  {
    report: 'METAR ZZEI 011251Z 07045G110KT 1/2SM +RA OVC003 26/25 A2785',
    wind: kt(70, 45, 110),
    temperature: 26,
    dewPoint: 25,
    inHg: 27.85,
  },
  {
    report: 'METAR ZZEJ 011251Z 07099GP99KT 1/2SM +RA OVC003 26/25 A2785',
    wind: 'beyond-scale',
    temperature: 26,
    dewPoint: 25,
    inHg: 27.85,
  },
  {
    report: 'METAR ZZFA 011200Z CCA 33018G27KT 15SM DRSN FEW020 M22/M27 A2989 RMK SC1 SLP145',
    wind: kt(330, 18, 27),
    temperature: -22,
    dewPoint: -27,
    inHg: 29.89,
  },
  {
    report: 'METAR ZZFB 011200Z AUTO 26011KT 230V290 9SM -RA OVC011 06/05 A2961 RMK SLP034 DENSITY ALT 300FT',
    wind: kt(260, 11, undefined, [230, 290]),
    temperature: 6,
    dewPoint: 5,
    inHg: 29.61,
  },
  {
    report: 'METAR ZZFC 011200Z 21007KT 2 1/4SM IC BKN060 M38/M42 A3067 RMK AC7',
    wind: kt(210, 7),
    temperature: -38,
    dewPoint: -42,
    inHg: 30.67,
  },
  // Central and South America
  {
    report: 'METAR ZZGA 011240Z 07010KT 7SM SCT020 BKN080 28/22 A3002 NOSIG RMK A3002 HZY',
    wind: kt(70, 10),
    temperature: 28,
    dewPoint: 22,
    inHg: 30.02,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZGB 011200Z 36005KT 320V030 8000 FU NSC 33/14 Q1011',
    wind: kt(360, 5, undefined, [320, 30]),
    temperature: 33,
    dewPoint: 14,
    hPa: 1011,
  },
  {
    report: 'METAR ZZGC 011200Z 20020G32KT 9999 DRDU FEW045 14/M03 Q1001 RMK PP000',
    wind: kt(200, 20, 32),
    temperature: 14,
    dewPoint: -3,
    hPa: 1001,
  },
  // Asia: two settings, directional visibility
  {
    report: 'METAR ZZHA 011230Z 17012KT 9999 FEW025 BKN060 26/20 Q1009 NOSIG RMK 1CU025 5AC060 A2981',
    wind: kt(170, 12),
    temperature: 26,
    dewPoint: 20,
    inHg: 29.81,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZHB 011230Z 02004KT 3000 1500NE R34/1300VP1800U BR FEW002 SCT010 12/11 Q1020 BECMG 5000',
    wind: kt(20, 4),
    temperature: 12,
    dewPoint: 11,
    hPa: 1020,
    trend: 'BECMG 5000',
  },
  {
    report: 'METAR ZZHC 011230Z 31003MPS 2500 HZ NSC 21/06 Q1017 BECMG TL1400 1500',
    wind: mps(310, 3),
    temperature: 21,
    dewPoint: 6,
    hPa: 1017,
    trend: 'BECMG TL1400 1500',
  },
  {
    report: 'METAR ZZHD 011230Z 24008KT 210V270 6000 DU NSC 43/11 Q1000 A2954 NOSIG',
    wind: kt(240, 8, undefined, [210, 270]),
    temperature: 43,
    dewPoint: 11,
    inHg: 29.54,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZHE 011230Z 09011KT 5000 HZ FEW030 36/24 Q1003 WS R09 TEMPO 3000 TSRA',
    wind: kt(90, 11),
    temperature: 36,
    dewPoint: 24,
    hPa: 1003,
    trend: 'TEMPO 3000 TSRA',
  },
  {
    report: 'METAR ZZHF 011230Z 13012KT 9999 SHRA FEW016CB 29/25 Q1008 WS ALL RWY NOSIG',
    wind: kt(130, 12),
    temperature: 29,
    dewPoint: 25,
    hPa: 1008,
    trend: 'NOSIG',
  },
  // Africa and the Pacific
  { report: 'METAR ZZIA 011200Z 06014KT CAVOK 38/02 Q1006', wind: kt(60, 14), temperature: 38, dewPoint: 2, hPa: 1006 },
  {
    report: 'METAR ZZIB 011200Z 16017KT 9999 VCSH FEW022 SCT100 24/16 Q1019 NOSIG',
    wind: kt(160, 17),
    temperature: 24,
    dewPoint: 16,
    hPa: 1019,
    trend: 'NOSIG',
  },
  {
    report: 'METAR ZZIC 011200Z 25006KT 9999 FEW018 21/17 Q1021 RMK RF00.0/000.0',
    wind: kt(250, 6),
    temperature: 21,
    dewPoint: 17,
    hPa: 1021,
  },
  {
    report: 'SPECI ZZID 011207Z AUTO 18025G38KT 9999NDV // NCD 16/08 Q1003 RMK RF00.0/000.2',
    wind: kt(180, 25, 38),
    temperature: 16,
    dewPoint: 8,
    hPa: 1003,
  },
  {
    report: 'METAR ZZIE 011200Z AUTO 12008KT 20KM FEW030/// 22/18 Q1014',
    wind: kt(120, 8),
    temperature: 22,
    dewPoint: 18,
    hPa: 1014,
  },
  // what is missing stays missing
  { report: 'METAR ZZJA 011200Z NIL' },
  { report: 'METAR ZZJB 011200Z AUTO 27008KT //// // ////// ///// Q////', wind: kt(270, 8) },
  { report: 'METAR ZZJC 011200Z ///05KT 9999 FEW020 14/// Q1013', wind: 'not-reported', temperature: 14, hPa: 1013 },
  { report: 'METAR ZZJD 011200Z 270//KT 9999 FEW020 14/XX Q1013', wind: 'not-reported', temperature: 14, hPa: 1013 },
  { report: 'METAR ZZJE 011200Z 9999 FEW020 14/08 Q1013', temperature: 14, dewPoint: 8, hPa: 1013 },
  { report: 'ZZJF 011200Z 27008KT 9999 FEW020 14/08 Q1013', wind: kt(270, 8), temperature: 14, dewPoint: 8, hPa: 1013 },
  {
    report: ' METAR  ZZJG 011200Z 27008KT  9999 FEW020 14/08 Q1013 = ',
    wind: kt(270, 8),
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
  },
  // groups out of their turn give nothing, and are listed
  { report: 'METAR ZZKA 011200Z 27008KT 9999 Q1013 14/08', wind: kt(270, 8), hPa: 1013, notUnderstood: ['14/08'] },
  {
    report: 'METAR ZZKB 011200Z 9999 27008KT 14/08 Q1013',
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
    notUnderstood: ['27008KT'],
  },
  {
    report: 'METAR ZZKC 011200Z 27008KT HELLO 9999 14/08 Q1013 WORLD',
    wind: kt(270, 8),
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
    notUnderstood: ['HELLO', 'WORLD'],
  },
  {
    report: 'METAR ZZKD 011200Z 27008KT 9999 14/08 Q1013 16015KT',
    wind: kt(270, 8),
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
    notUnderstood: ['16015KT'],
  },
  {
    report: 'METAR ZZKE 011200Z 27008KT 9999 14/08 Q1013 14/08',
    wind: kt(270, 8),
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
    notUnderstood: ['14/08'],
  },
  // what general readers are known to get wrong
  {
    report: 'METAR ZZLA 011200Z 16022G34KT 9999 14/08 Q1013 FM1200 18020KT',
    wind: kt(160, 22, 34),
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
    notUnderstood: ['FM1200', '18020KT'],
  },
  {
    report: 'METAR ZZLB 011200Z 27008KT 9999 14/08 Q1013 09690595',
    wind: kt(270, 8),
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
    runwayStates: 1,
  },
  {
    report: 'METAR ZZLC 011200Z 27008KT 9999 14/08 Q1013 TEMPO 510104 31045G60KT',
    wind: kt(270, 8),
    temperature: 14,
    dewPoint: 8,
    hPa: 1013,
    trend: 'TEMPO 510104 31045G60KT',
  },
];
