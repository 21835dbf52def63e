// Written by `npm run season:build` with the trip engine, from assets/data/climate-grid.csv (NOAA NCEI normals) and the
// classes of season-classes.facts.ts; do not edit. Figures are letters of season-code.ts, levels those of season-scale.ts.
import type { SeasonTable } from '@/shared/domain/season/season-table'

/** Climate bands of cells of 0.5 degrees: row and column of the first cell, then a letter a cell eastwards. */
export const bandRows: readonly (readonly [row: number, column: number, bands: string])[] = [
  [37, -313, 'EEEE'],
  [38, -314, 'HEEEE'],
  [39, -314, 'HHEEE'],
  [40, -315, 'HHHHHH'],
  [41, -318, 'HHHHHHHHH'],
  [42, -321, 'HHHHHHHHHH'],
  [43, -321, 'HHHHHHHHH'],
  [44, -321, 'HHHHHHH'],
  [45, -321, 'HHHH'],
  [48, -167, 'HHHHHHH'],
  [49, -167, 'HHHHHHHH'],
  [50, -196, 'IGG'],
  [50, -167, 'HHHHHHHH'],
  [51, -199, 'IIIIGG'],
  [51, -165, 'GGHHHH'],
  [52, -200, 'IIIIIGG'],
  [52, -165, 'GGGGHH'],
  [53, -200, 'IIIIIII'],
  [53, -167, 'GGGGGGHH'],
  [54, -200, 'IIIIIII'],
  [54, -167, 'GGGGGGGG'],
  [55, -201, 'IIIIIIIIJJ'],
  [55, -167, 'GGGGIGGG'],
  [56, -202, 'IIIIIIIIIJJJJ'],
  [56, -167, 'GGGGGGGG'],
  [57, -209, 'KKKKKKKIIIIIIIIIJJJJJ'],
  [57, -182, 'JJJJJ'],
  [57, -167, 'IIIIGGG'],
  [58, -210, 'KKKKKKKKKKKKIIIIIJJJJJJJJJJJJJJJJ'],
  [58, -172, 'PPPPPIIIIIII'],
  [59, -211, 'KKDDDKKKKKKOOPPPJJJJJJJJJJJJJJJJJJPPPPPPPPPPPIIIIII'],
  [60, -211, 'DDDDDKKKKKOOOPPPPPPPJJJJJJJPPJJJPPPPPPPPPPPPPPIJJJ'],
  [61, -225, 'DDDDDDDDD'],
  [61, -214, 'KDDDDDDDKKKKKOOOOOOOOPPPPOOPPPPPPPPPPPPPPPPPPPPPPPJJJ'],
  [62, -227, 'KKDDDDDDDDDDKKDDDDDDKKKKKKKOOOOOOOOOOOOOOOOPPPPPPPPPPPPPPPPPPPPJJJ'],
  [63, -227, 'KKDDDDDDDDDDDKDDDDDKKKKKKKKOOOOOOOOOOOOOOOOOOOOOOOOOOOOOOOOOOPPPJJO'],
  [64, -236, 'FFDDKKKKKKKKKKKDDDDDDCCDDDDDKKKKKKKKOOOOOOOOOOOOOOOOOOOOOOOLLOOOLLOOOOOPPOOOOO'],
  [65, -240, 'FFFFFFDDKKKKKKKKKKKDDDCCCCCDCCCCCCDDKKMMMMMMLOOOLLOLLLLLLOOLLMLLLLLLLLLLLOOOOOOOOOO'],
  [66, -240, 'FFFFFFDDKKKKKKKKKKKCCCCCCCCCYCCCCCCCMMMMMMMMLLLLLLLLLMMMLLLLLNLLLLLLNNNNMLLLLLLLLOLLL'],
  [67, -241, 'FFFFFFFEKKKKKKKKKKDCCaaaaaCCaaCCCCCCCCCMMMMMMMMLLMMMLLMMLLLLLLNMMMLLNNNNNNNNLLLLLLLLLLN'],
  [68, -242, 'FFFFFFDDDDKKKKKDDDDCCaaaaaaaaaaCCCCCCCCCCMMMMMMMMMMMMMMMMLLLLMMNNNNNNNNNNhCNNNNLLLNNNLLLLLL'],
  [69, -243, 'FFFFDDDDDDDKKKKDDDDCaaaaaaaaaaaaaCCCCCCCCCMMMMMMMMMMMMMMMMMMMMMMNhhhhhhhhhhjCCCNNNNNNNNNLLLLL'],
  [
    70,
    -244,
    'FFFFFDeDDDKKKKKKDCaaaaaaaaaaaaaaaaCCCCCiiCCCCMMMMMMMMMMMhhhMMhhhhhhhjjhhhhjjZZZCCNNNNNNNNLLLLL',
  ],
  [
    71,
    -245,
    'fFDDDFFDDDKKKKKKKDYaaaaaaaaaaaaaaaaaCCCaaCCCiiiiihMMMMhhhhhhhhhhhhhhhjjjjjjjjZZZYYjCChNNNNLLNLL',
  ],
  [
    72,
    -245,
    'fFDDDFDDDDKKKiKKKKCaaYYYaaaaaaaaaaaaaaaaaCCCiiiiiiihhhhhihhiiihhhhhhhhjjhhjjjjjjYYYZhhhhNNNNNLL',
  ],
  [
    73,
    -246,
    'fFFDDDeeYYDKKDYDDKKCaaYiYYYaaaab8888aaaaaaiiiiiiiiiiiihhhiiZZiiiihhhhhhijhhjljjjjZddZZjjjCCNNNNN',
  ],
  [
    74,
    -247,
    'ffFFFeeYYYYYCCCYYCCCYaaYYiYYaab888888aaaaaaaaiiiiiiiiiiiiiiiZZiiiiihhhhhijjjjljjlkZdddZjjjjjNNhhhl',
  ],
  [
    75,
    -248,
    'fffffffYcbaaaaaaaaaaaabbaYYYaab9888888aaaaaaaaaiiiiiiiiiiiiiiiiiiiillllllllllllllllkkkdYZZjjjhhhhhl',
  ],
  [
    76,
    -248,
    'ffffffeYcbaaaaaaaaabaabbbbYYaaa9888889aaaaaaaaaaaiiiiiiiiiiiiiiiiiillllllllllllllddlkkdWWbZZjhhhhlll',
  ],
  [
    77,
    -248,
    'eeeeffeYcaaaabbbbbbbaabb99aaaaa99888889aaaaaaaaaaiiiiiiTTTTTTTTlTTilTTTllllllllllddldddWWRdZkllhhkkkk',
  ],
  [
    78,
    -249,
    'geeeefeYccaaaabbbbbbbbbbb999aaaa99882289aaaaaaaaaaaaTTTTTTTTTTTTTTTTTTTTTTTTTTTlkSSddddddWRddkklllkkkk',
  ],
  [
    79,
    -250,
    'feeeeeeYcccYaaaabbbbbbbbbbb99RRR98888228aaaaaaaaaaaRRRRTTTTTTTTTSSTTTTTTSSSSSSSSSSSSSWdWWdWWWRdkkkkkkkk',
  ],
  [
    80,
    -250,
    'ffeeeeYYcccYaaaabbbbbbbbbb99999998888888aaabaaaaaRRRRRRTTTSSSSSSSSSSSSSSSSSSSSXXXXSSRWWWXWWWWWWXXXkddkkkkkk',
  ],
  [
    81,
    -250,
    'ggeeeYYacccaaaaabbbbbbbbbb988999888888889999aaRRRRRRRRRQQQSQQQQQSSSSSSSSSSSSSSUUUUXUUWWWWWWWWVVWWWWWWXXkkkddddd',
  ],
  [
    82,
    -250,
    'ggeYYYYaccccbbbbb88bbbbRRR988899888888889999aaRRRRRRRRQQQQQQQQQQQQQSSSSSSSSSUUUUUUUUUUXUVVVVVVVVVVVVVWXXXXdddddd',
  ],
  [
    83,
    -250,
    'ggeYYccccccccbbbb88bbbbRRR9888888899888899bbb999RRR99999QQQAAQQAAAQQQQUUUUUUUUUUUUUUUUXUVVVVVVVVVVVVBAVVVWWWdddd',
  ],
  [
    84,
    -251,
    'gggeYYcbbcccccbbbcbbbbbb9998888888999888899999999RR9999999AAA44444444AAAUUUUUUUVVVVUUUUUUVVVVVVVVVVVBBBVBBVVWWXdd',
  ],
  [85, -251, 'gggeeYcbbcccccbbbcccbRR9999888888899998899999999999999999994444444444AAAAAABBVVVBBVVVVVV'],
  [85, -162, 'VVVVVVVVVVBBBBVBBVVVVVV'],
  [86, -251, 'gggeeYcbbbbbbbbbbccb888999988888899999999999999999999999444444444444444BBBBBBBBBBBBBBBBV'],
  [86, -160, 'VVVVVVVBBB55BBBBBVVVBBB'],
  [87, -250, 'ggeeccbbbbbbbbbccb88888889888888899999999999999999999944444444444544544555BBBBBBBBBBBB'],
  [87, -160, 'VVVVVVBBB6655B5559BBBBBBB'],
  [88, -250, 'gggggcccccbbbbbbR8888888888822888999999999999999999944555544444445445555555BBBBBBBBBBB'],
  [88, -154, 'BB55675566655BBBBBBBBB'],
  [89, -250, 'gggggcccccccbbbbR88888888888228899999999999999999555555555444444455577655566BBBB65BBBB'],
  [89, -153, 'B556655667766555BBBBB'],
  [90, -250, 'ggggggcccccccccbR88888888888888899999999999999995555555755544444455777777666BBBB66BBB'],
  [90, -152, '556666677777666666BB'],
  [91, -250, 'gggggccccccccccbA8888888888888999999999999999955555555577777777557557777776666666666B'],
  [91, -144, '77776666666'],
  [92, -250, 'gggggcccccccccccAAc88888888888999999999999999555555777777777777777557777777666666666'],
  [92, -142, '777777666'],
  [93, -250, 'gggggcccccccccccAAAA8888888888999R9999999995555557777777777777777777777776666666666'],
  [93, -141, '7777777'],
  [94, -251, 'gggggggccccccccccAAAAAA888888899999999999995555777777777777777777777777776666666666'],
  [94, -141, '7777777'],
  [95, -251, 'gggggggccccccccAAAAA88AA88899999999999555555755777777777777777777777777776666'],
  [95, -140, '777777'],
  [96, -251, 'gggggggccAARAAAAAAAA88888889999999995555555577777777777777777777777777777'],
  [97, -250, 'ggggggccAARAAAAAAA888888899999999955777777777777777777777777777777'],
  [97, -183, '777'],
  [98, -248, 'ggggccccccAAAAAA888888899999999977777777777777777777777777777777'],
  [102, -355, '333'],
  [103, -355, '333'],
  [104, -355, '333'],
  [104, 347, '333'],
  [105, 347, '333'],
  [106, -335, '333'],
  [106, 347, '333'],
  [107, -335, '333'],
  [108, -335, '333'],
  [109, -327, '333'],
  [109, -323, '333'],
  [109, -268, '3333333'],
  [110, -327, '333'],
  [110, -323, '333'],
  [110, -268, '3333333'],
  [111, -327, '333'],
  [111, -323, '333'],
  [111, -271, '3333333333'],
  [112, -341, '333'],
  [112, -271, '33333333'],
  [113, -342, '3333'],
  [113, -272, '3333'],
  [113, -267, '3333'],
  [114, -342, '3333'],
  [114, -307, '3333'],
  [114, -274, '33333'],
  [114, -267, '333'],
  [115, -342, '333'],
  [115, -307, '3333'],
  [115, -274, '3333333'],
  [116, -315, '222'],
  [116, -307, '3333'],
  [116, -274, '3333333'],
  [117, -319, '222'],
  [117, -315, '222'],
  [117, -306, '33333'],
  [117, -274, '3333333'],
  [118, -319, '222'],
  [118, -315, '222'],
  [118, -311, '2222'],
  [118, -305, '3333'],
  [118, -281, '333'],
  [118, -274, '22233'],
  [119, -319, '222'],
  [119, -311, '2222'],
  [119, -305, '2222222333'],
  [119, -292, '333'],
  [119, -281, '333'],
  [119, -274, '22233'],
  [120, -325, '111'],
  [120, -311, '2222'],
  [120, -306, '22222222233'],
  [120, -293, '3333'],
  [120, -281, '333'],
  [121, -325, '111'],
  [121, -310, '222'],
  [121, -306, '22222222233332223'],
  [121, -287, '111'],
  [122, -325, '111'],
  [122, -306, '2222222222222111111111'],
  [123, -307, '11122211221111111111111'],
  [124, -313, '111'],
  [124, -309, '1111122211221111111111111000'],
  [125, -313, '111'],
  [125, -309, '11111'],
  [125, -302, '111111'],
  [125, -295, '11111111110000'],
  [126, -313, '111'],
  [126, -309, '111111'],
  [126, -302, '111111'],
  [126, -293, '111110000000'],
  [127, -319, '111'],
  [127, -306, '111'],
  [127, -302, '111111'],
  [127, -295, '1111111000000'],
  [128, -332, '111'],
  [128, -319, '111'],
  [128, -315, '000'],
  [128, -306, '111111111111111111'],
  [128, -285, '0000'],
  [129, -332, '111'],
  [129, -319, '111'],
  [129, -315, '000'],
  [129, -306, '000000111111111000'],
  [129, -285, '0000'],
  [130, -338, '000'],
  [130, -332, '111'],
  [130, -315, '000'],
  [130, -306, '00000011111111'],
  [130, -291, '000'],
  [130, -284, '000'],
  [131, -338, '000'],
  [131, -306, '000'],
  [131, -296, '111'],
  [131, -291, '000'],
  [132, -338, '000'],
  [132, -327, '000'],
  [132, -305, '000'],
  [132, -291, '000'],
  [133, -327, '000'],
  [133, -305, '000000'],
  [134, -331, '000'],
  [134, -327, '000'],
  [134, -305, '000000'],
  [134, -298, '000'],
  [135, -331, '000'],
  [135, -327, '000'],
  [135, -302, '0000000'],
  [136, -331, '000'],
  [136, -301, '000000'],
  [137, -306, '000'],
  [137, -301, '000'],
  [138, -306, '000'],
  [139, -306, '00000000000'],
  [140, -321, '000'],
  [140, -304, '000000000'],
  [141, -321, '000'],
  [141, -315, '000'],
  [141, -304, '000000000'],
  [142, -321, '000'],
  [142, -315, '000'],
  [143, -315, '000'],
]

export const seasonTable: SeasonTable = {
  bands: 48,
  weeks: {
    cold: {
      '1': [
        '            269BEHJMORTVXYZabbaaZYXVUROLIFC85433210 ',
        '32224678ABBBEIKMOQTVYZbdefgghhggfedbZXVSOLIEB9987653',
        'GFFGHIJKMMNOQRSUVXZbcdefgghijjjjhgfdcbZXUSPNKKJJJIHG',
        'NNNNOPPQQQQQRRSTUVWXYYZabbcddeeefeeedcbaYXVTRRQQQPPO',
        'GGGGHIJKMOQSUWZbdfghjlmopqrsssssrpnlkigfdbYVTRPMKJIH',
        'FEEFFGGHJMOQSVXYacdfgiklmnopqqqpomkigfdcaYWURPNLJIHF',
        'HFFFGGHHJKMNQSVXYacefhijlmnoppponmljigfdbZXUSQPNLKJH',
        'B99ABCDEGIKMPSVWYacdeghjklmnopponljhfedbZXVSPNLJGFEB',
        'FFFFGHIILNPQRTUVWYZabcdefghiiiiihfedbaZYWVTSQOMLJHHF',
        'JJJJKKLLNPQSUWXYabcefghiiklmoooonljhgedbaYXVTRPNLKKJ',
        'LKKKLMNNPRSTVXYacdfghijkllmnnnnnmlkihgfedbZXVUSQNMML',
        'KJJJJKKLNOQRTVWYabdfgiklnoopqqqqpomljigecbZXVUSQONMK',
        'TTTTTUUUVWXYZaabcdefghijkmnprrrrqpnmkihfdcaZYWVUTSSS',
        'XXYYZZaabbccddeefgijkllmmnooppppppoonmkjhgedbaaZXXXX',
        'gghhhhhhiiiijjjjjkkkklllmmmmmmmmmmmmlllllllkjjihgggg',
        'eeeefffgghiijjkkkkklllmmnnnoooppppppoooonmkjhhgfeddd',
        'jiijjkkllmnooppqrstvwxyyzz!!!##!!!zzyyxwutrqonmlkkjj',
        'onnooppqqrrssssttttttuuuuuvvvvvvvvvvvvvvvvuuutsrqppo',
        'fffffgghijklmmnopqstuwxyzzz!!!!!!zzyxvusrpomljihffff',
        'ddddeeffghijkklmnpqstvwxyzzz!!!!zyyxwvtrpomljihgeddd',
        'ZZZZZZaabcdefhijklnoprstuvwyzzzyxwvusqpnljigedbaZYYY',
        'YYYYZaaabcdefhijkmnpqrtuvwwxxxxxxwvutrpnlkihfedcaZZY',
        'WWWWWXXYZabcefghjlmoqrsuvwwxyzzzxwutrpnljigedbaZXWWW',
        'XXXXYYZZabcdefhijlmoprstvwwxxxxxwvutsqnljihfedcbaZYX',
        'ZZaaabbcdefghjklmoprsuvwxyyzzzzzyxxvusqomljigfdcaZZZ',
        'cccccddefghijklmnpqstvwxyzzz!!!!zzywvtrpnmljihfecbbc',
        'MLLLMNOPQSUWXZbdfgikmnprsttuvvuutrpnmkigfdbZXVTRPNNM',
        'LKKLMNOPRTUVXYZbcefghiijklmnoonnmlkihgfdcbZXVUSQONML',
        'NMMNNOPQRTVXYaceghiklnpqsttuuuuutsqpnljigedbZXUSQPON',
        'PPPPPQRRTUWYZbdegijlnoqstuvvwwwwvtrpnlkigedbZXVTRQQP',
        'MLLMMNOPQSTVXYabdeghikmoqrsstuttsrpomkihfecaYVTRPONM',
        'NLLMMNNOQRTUWXZbcefhiklmopqqrrrrqpnmljhgedcaYWUTRQPN',
        'PPPPPQRRTUVWYZbcefhiklnopqqrrrrrqponmkigfdcbZYWUSRQP',
        'PPPPPQRRTUVWYZbcdeghiklnopqrstssrqqpnmkigfecaYWUSRQP',
        'SSSSSTUUVWXYZZabbdefghhijlmmnnmmlkjihgfecbaYXVUTSSSS',
        'TTTTTUUVWXYZacdeghjklnoqrsstttttsrqpnljhfedcbaYXVUTT',
        'OOOOPPQQSTUVWXYZZbcdfgghijkmnnmmljihfedcaZXWUTSQPOOO',
        'ONNOOPQQSTUWWXYZZbcdeffghijjklkkjhgfdcbaZYXWUTSQPOOO',
        'QRRRSTUVWXYZZaabcddefgghijklmmmmlkihgfedbbaZXVUSRQQQ',
        'SRRRSTTUVWWXYZabcefghjkmnopqrsssrqponljhfedcbZYXVTTS',
        'ZZaabbccccddeffghhiijjkklllmmnnnnnnmmlkiihgfdcbaZZZZ',
        'ddddeeefffgghhiijjjkklmmnnnoooppppppoonmlkjihgfedddd',
        'XYYYZZaabccddeeffghhiijjkkllmmmmmmmmlkjihfedcbaZYXXX',
        'UUUUVVWXYZabdefgijlmoprsuvvwxxwwvutrpomkihfedbaYWVVU',
        'RRRRSSTTUWXYabdegijlnoqrtuvvwwwwvtrqomkigecbZXWVTSSR',
        'VUUUVVWWXYZabcdfgijkmoqrsttuuuuuttsqpmkigfdcbaZYXWVV',
        'SRRRSTTUVWXYZabdefgijkmnpqrsttttsrqponljhgedcaYWUTTS',
        'RRRRSTTUWXYabdeghjkmnpqstuvwwwwwutsqpnljhgedcaYWUTSS',
      ],
      '2': [
        '            047ADFILNPSUWXYZaaZZYXWVTQNKHDA742110   ',
        '10002456799ADGJLNPSUWYacdeffgggfedcaYWUQNKGD98765431',
        'EEEEFHIIKLLMOQRTUWYZbcdeeghhiiiigfecbaYWTROMJIIIHHGE',
        'MLLMMNOPPPPPQRRSTUVWXYZaabbcdddeeeddcbaZYWUSQPPPPOOM',
        'EDDEFGHIKMOQSVXacdfgijlnopqrrrrrqomkihfdbZWURPNLJHGE',
        'DCCCDEEFHKMORTVXZacdfhjklmnoppponljhfdcaZXUSQNMJHGFD',
        'FDDDEEFFHJKLORTVXZbceghiklmnoooomljihfdcaXVTRPNMKIIF',
        '977789BCEGIKNQTVXZacdfghjklmnoonmkigedbaYWTQOLJHFDC9',
        'EDDDEFGHJLNPQRTUVWYZabcdefghiihhgedbaZYXVUSQPNLJHGFE',
        'HHHHIIJKLNPQSUWXYabcefghhjklnnnnmkigedbaZXVTRQOMKIIH',
        'IIIIJKLLNPRSTVXZacefghijkllmnnmmlkjhgfedcaYWUSQOMKKJ',
        'IHHHHIJJLNOQSTVXYacdfhiklnoopppponlkigfdbaYWUSRPNLLI',
        'RRRSSSTTUVWXYYZabcdefghijlnoqqqqpomljhgecbZYWVUTSRRR',
        'WWWXXYYZaabbccddefgijkkllmnoopppoonnmljigfdcaZYXWVVV',
        'ffgggggghhhiiijjjjkkkkllllmmmmmmmlllllllllkjiihgfeef',
        'cccdeeeffghhiijjjkkkkklmmmnnnoooooooonnnmljigfeddccc',
        'hhhhiijjklmmnoopprsuvxxyyzz!!!!!!zzyyxwvtrqonmlkjiih',
        'nmmmnnoppqqrrsssssttttuuuuuuuvvvvvvvvvvvvuuutsrqpoon',
        'dddeeeffghjkklmmnprsuvxxyyzz!!!zzzyywutrpomljihfeddd',
        'cccccddefgghijklmoprsuwwxyyzzzzzyyxwvusqonljihgedccc',
        'XXXXYYYZabcdefgijkmnoqrstuvxyyyywvutrpnmkigecbaZYXXX',
        'XXXXXYZZabcdefhijlmopqstuvwwxxxwwvutsqomkihfedbaZYXX',
        'UUUUVVWWXZabcdfgijlnpqrtuvwwxyyyxvtsqomkigfdbaYXWVVU',
        'WVVVWXXYZZabcefhiklnoqrtuvwwxxwwvuusromkihfedbaZYXXW',
        'YYYYZZaabcefghjklmoqrtuvwxyyzzyyxxwvtrpnljigfdcaZYYY',
        'aaabbbccdfghijklmoprsuvxyyyzzzzzzyxwusqomljihfecbaaa',
        'KJJJKLMNPQSUWYabdfhjkmoprsstuuttsqomkjhfdbZYWTRPNMLK',
        'JIIJKLMOQRSUVXYZbcdfgghijklmnnnnlkjhgfecbZYWUSRPNLLJ',
        'LLLLMNNOQSTVXZbceghjkmoprsstutttsrpomkigfdbZXVTRPNNM',
        'NNNNOOPPRTUWYZbdegikmnpqstuuvvvvusqomkihfdbZYWUSQOON',
        'KKKKLLMNPQSTVXYabdeghjlnpqrstttsrqomljhfecaYWUSQOMMK',
        'LJJKKLMMOQRSUWYZbcefhiklnopqqqqqpomljigedcaZXVTRPOOL',
        'ONNNOPPQRSTVWYZbceghiklnoppqrrrqqpnmljhfdcbZYXVTRQPO',
        'ONNNOPPQRTUVWYZacdeghjkmnopqrssrrqpomljhfecbZXVTRPPO',
        'QQQQRSSTUVWXYYZZabdefgghiklmmmmlkjihgfedbaYXVUTSRQQQ',
        'RRRRSSSTUVXYZacdfghjkmnpqrsstsssrqpomkigedcbZYXVTSSR',
        'MMMMNOOPQSTUVWXXYabceffghijlmmmlkjhgfdcbZXWUTSQPNMMM',
        'MMMMNOOPQSTUVWXXYZbcdeefghijjkkjihfecbaZYXWUTRQPNMMM',
        'PQQQRSTUVWXYYZZabcddefgghijkllllkjigfedcaZZYWUTRQPPP',
        'QPPPQRSSTUVWXYZabcefgijlmnoprrrrqponmkigedbaZYXVTSSQ',
        'YZZZaabbbbccdeefghhhiijjkkllmmmmmmmmlkjihgfecbaZZYYY',
        'ccccdddeeeffgghhiijjkkllmmnnnoooooooonmlljihgfedcccc',
        'XXXXYYZaabbccddeefgghhiijjkkllllllllljihgfecbaZYXWWW',
        'SSSSTUUVWYZabcefhijlnoqrtuuvwwwvutsqonljhfecbaZXVUTT',
        'PPPPQQRRTUVXYabdegikmnpqstuvvvvvusqomljhfdbZXWUTSRQQ',
        'TSSTTUUVVWXYZbcdfgijlnpqrssttuuutsrpoljhfdcaZYXWVVUT',
        'QQQQRRSTUVWXYZabdefgijlmopqrssssrqponmkigedcaZXVTSRQ',
        'QQQQQRSTUWXYabdeghjlmoprtuuvvwvvusrpnljhgedcaYXVTRRQ',
      ],
    },
    hot: {
      '1': [
        'vvwwwwvvtsqnljhfdcaYXWUUUUUUUUVWXYZbbcdeghiklnoprsuv',
        'jjjjjjjjjjiiihhfdbZYXWVVVVVUUVWXYYZZabcdeefghhiiiiij',
        'gggggghhhhhggfecbaZYWVUTTSRQQQRRRRSTUVWXZabdefgggggg',
        'ddddddeeeeeeeeddcbbaaZZYYYXXXXXWWWXXYYZZaabbcccddddd',
        'llllkkjhgfedbZYXWUTTSRQQPOONNNNOOOPQRRTUVXYbcdefhjkl',
        'llllllkjihfecaYXWVUTSRQQPNMMMMMMMMOPQRSUWXZbcdefhijk',
        'ijjkklkkjihgfdbaYXWVUTTSSRRRRRRRRRSSTUVWXZabccdefghh',
        'nnooonmlkihgebZYXWUTTSSRQQPOOOOOOOPRSTVWYZbdefgijkmn',
        'hgggggfdcbbaZZYXVUTSQPONMLKJJJJJKKLMOPQSTVWYZbcefgih',
        'hhhgggfedbaZYXWVUTSQPOMMLKKKKKKLLLMNOPQRTUWYZbcefhih',
        'gffgggggffdcaZXWVUTSRRQPPONMMMMMMMNOQRSUVWYabcdefggg',
        'hhiiiiihggfedbaZXWVUTSRRQQPPPPPPPPQRRSTVWXZZabcdefgh',
        'bbaZYXWVUTTSRQPONMLJIHGGFFEEEEEFFFGGHIJKMOPRSUVXZabb',
        'WWVUUTSRQPOONMLKJIIHGFEEDDDCCDDDDDEEEFGHIJKMOQRTUVXW',
        'QQQQQQQQQQQQQQQPONMLKJIIHHGGGGGGGHHHIIJLMNOOOOOOOPPP',
        'WWWWWWWWWWVVUTSRQONNMLKKJJIIIIIIJJJKKKLMNPQSTUUVWWXW',
        'QQRQQPPPPPOONMMLLKKKJJJJJJJKKJJJJJJJJJJJJKKKLMMNOOOP',
        'MMNNMMMMMMMLLLLLKKJJJJJJJJJJJJJJJJJJJJJJJJJJJJKKKLLM',
        'TTTTSSRQQPPOONMMLLKKJJIIIIIIIIIHHHIJJJKKLLLMNNOPQRST',
        'VVVVUUTTSRQQPOONMLLKKKKKKKJJJJJJJJJKKKKLLMMNOPQRSTUV',
        'WWVUUTSRQPOONMLKJIHGFEDCCBAAAAABBBCDEFGHIJKMOQRTUVXW',
        'ZZZaZZYXWVUTTSRRQPOONMLLLKKKJJJJJJKLLLMNOPQRSTTUVWXY',
        'bbaaZZYXWVUTSRQPPONNMLLKKJJIIIIIIIJKLMNOPQRSUVWXZabb',
        'bccbbaZYXWVUUTSRRQPPOONMMMMLLLMMMMMNNNOPRSTUVVWXYZab',
        'YZYXXWWVUTTSRRQPPOONNMLLLKKJJJJJJJJKLLMNOPQRSTUVWXYY',
        'XYYXXWVVUTSSRRQPPONMMMLLLLLKKKKJJJKKLLMNOPQRSSTUVWXX',
        'kkjjjihgfdcaZYWVVUTSRQPOONNNNNNNNOOPQQRTUVWYabdeghjj',
        'hiihggfdcaZYXWVUUTSQPOMMLKKJJKKKKLMNNOPRSTVXYacdefgh',
        'hhihhhgfedbaZXWVUUTSRQPOONNNNNNNNNOPQQRSUVWYZabdefgh',
        'hhhgggedcaZYXVUTTSRRQONNMLKKKKKKLLMNOPQRSUVXYZacdegg',
        'ghhiihhgfedcbaYXWVUTSRQPPONNNNNNNNOPQQSTUWXYZabcdefg',
        'hhiiiihhgfedcaZYXWVUTSRRQQQPPPQQQQRRSTUVWXYZabcdefgh',
        'ghhhhhgffecbaYXWWVUTSRQQQPPOOOPPPPQRRSTUWXYZabbcdefg',
        'eefffffeddcbaaYXWVUTSRQPOONNNNNNNNNOPPQSTUWWXYZabcde',
        'cccbbbaZYXWVUTSRQONMLKJIHHGGGGGHHHIJJKLNOQRTVXZabbcc',
        'fffffedcbZYXWVUUTTSRQQPOONNMMMMMMMNNOPQRTUVWYZabcdee',
        'eedcbaZYXWWVUTSRQPONMLKJJIIIIIIJJJKLMMNPQRTUWXZacdfe',
        'ggggghgfdcbaZYXWVTSRQONMLLKJJJJJKKLMNOQRTUWYabcdefgg',
        'ddddddddccbaZYXWVUSSRQPOMLKJJJJJKKLMOOQRTUWZaabbcded',
        'fgggggfeecbaYXWVVUTSRQPPPOONNOOOOOPQQRSTUWXXYZabcdef',
        'aaaaaaZZYXWVVUTRQPNNMMLKKJJIIIJJJJKKLLMNOPRTVXZZZaaa',
        'aaaaZZZZYYXWVVUTRQPONNMLKKJJJJJJKKKKLLMNOPRTVXYYZZZa',
        'bbbbbbbbbbbbbbaaZYXXWWVUTSRQQQQQQQQRRRTUWXZZZaaabbbb',
        'ccccccbaYXWVUTSSRQPPONMMLKKJJJJJJJKLMNOPRSTUVWXYZabb',
        'eddccbaZYXWVUTSSQPONMKJJIIHHHHHHIIJJKLMNPQRTVXYacdee',
        'eeeeedcbaZYXWVUTSSRQPPONNNNMMNNNNNNOOPQRSTUVXYZaccde',
        'eefffeeddbaZYWVVUTTSRQPOONNMMNNNNNNOPPQSTUVWXYZabcde',
        'ddeedddcbaaYXWVUTSSRQPONNMMLLLMMMMMNNOPQSTUVWXYZabcd',
      ],
      '2': [
        'ttuuttttrqomkigecaYXWVTTTTTTTTUVWXYZabcdeghiklmopqst',
        'hhhhhiiihhhhggfecaYXWVUUUUUTTUVWXXYZZabcddeffghhhhhh',
        'eeeeefffffffedcbaZXWVUTSSRQPPPQQQQRSTUVWXYabdeeeeeee',
        'bbbbbcccdddddddcbbaaZZYYYXXWWWWWWWWXXYYYZZaabbbbcccb',
        'jjjjiihgfdcbaYWVUTSRQQPOONNMMMMNNNOPQQRTUVXZabcefhij',
        'jjjjjjihgfecaYXWVUSSRQPPOMLLLLLLLLNOPQRTUWXZabdefghi',
        'ghhiijjihgfedbZYXWVUTSRRRQQQQQQQQQRRSSTVWXZZabcddefg',
        'llmmmlkjihgecaYXWUTSSRQQPPONNNNNNNOQRSTVWYabdefghjkl',
        'ffeeeedcbaZYYXWVUTSQPONMLKJIIIIIJJKLMOPRSTVWYZbcdfgf',
        'gfffeedcbaZYXWVUSRQPOMLKKJJJJJJKKKLMNOPQRTUWYZbcefhg',
        'feeeefffedcaZXWVUTSRQPPOONMLLLLLLLMNOQRSUVWYabbcdeff',
        'ffggggggfedccaYXWVUTSRQQPPOOOOOOOOPQQRSTVWXYZabcdeef',
        'aZYYXWVUTSRQPPONMLJIHGFEEEDDDDEEEFFGGGIJLMOPRTUWXZaa',
        'VUUTSRQPPONMLLKJIHHGFEDDCCCCCCCCCDDDEEFGHIJLNOQRTUVV',
        'PPPQQQQQQPPPPPPONMLKJIHHGGFFFFFFGGGHHHIKLMNNNNNNOOOP',
        'VVVVVVWVVVUUTSRQPNMLLKJJIIIHHHHIIIIJJJKLMNPRSTUUVVWV',
        'OPQPPOOOOONMMLLKKJJJJJJJJJJJJJJJJJJIIIIJJJJJKKLMNNNO',
        'LLLLLLLLLLLKKKKKKJJJJJJJJJIIIIIIIIIIIIIIIIIIIIIJJKKK',
        'SSSRRQQPPONNMMLLKKJJIIIHHIIIHHHHHHHIJJJJKKKLLMMNPQRS',
        'UUUTTTSRRQPPONNMLKKKKJJJJJJJJJJIIIJJJJJKKLLMNOPQRSTT',
        'VUUTSRQPPONMLLKJIHGFEDCBBAA999AAAABCDEFGHIJLNOQRTUVV',
        'XXYYYXXWVTTSSRQPPONNMLLKKKJJJIIIIIJKKLLMNOPQQRSTUVWW',
        'aZZYYXWVUTSRQQPONNMLLKKJJIIHHHHHHHIJKLMNOOPRSTUWXZaa',
        'aaaaZZYXVUUTSSRQPPOONNMMLLLLLLLLLLMMMMNOQRSTTUVWXYZZ',
        'XXXWVVUUTSRRQQPOONNMMLLKKKJJJIIIIIJJKLLMNOPQRRSTUVWX',
        'WWWWVVUUTSRRQQPONNMMLLLLLLKKKJJIIIJKKLLMNOOPQRSTUUVW',
        'iihhhgfedbaZXWVUTSSRQPONNMMMMMMMMNNOOPQRSUVXZabdefhh',
        'gggffedbaZYXWVUTSRQPOMLKKJJIIJJJJKLMMNOPRSTVXYabceff',
        'fgggffedcbaYXWVUTSRQQPONNMMMMMMMMMNOOPQRSUVXYZabcdff',
        'ffffeedbaZYWVUTSRRQPONMMLKJJJJJJKKLMNNPQRSUVXYZabdef',
        'fffgggfedccbaYXVUTSRQQPOONNMMMMMMNNOPPQSTUWXXYZabcee',
        'ffgggggfeedcbZXWVUTSSRQQPPPOOOPPPPQQRSTUVWXYZaabcdef',
        'fffffffedcbaYXWVUUTSRQPPPOONNOOOOOPQQRSTUWXYZZabcdee',
        'cddddddccbbaZYXWVUTSRQPOONNMMMMMMMNNOOPRSTUVWXXYZabc',
        'bbaaaaZYXWVUTSRQONMLKJIHGGFFFFGGGHHIIJKLNOQSUWYZaabb',
        'ddddddbaZYXWVUTSSRRQPPONNMMMLLLLLLMMNOPQRTUVWXYabccd',
        'ccbbaZYXWVUTSSRQPONMLKJIIHHHHHHIIIJKLLMOPQRTUWXZacdd',
        'fffffffdcaZYXXWUTSRPONMLKKJIIIIIJJKLMNOQRTUXZaabcdef',
        'cbbcccccbbaZYXWVUSRQPOOMLKJIIIIIJJKLMNPQSTVXZZaabccc',
        'eeeeeeedcbaYXWVUTTSRQPOOONNNNNNNNOOPPQRSTUVWXYZZabcd',
        'ZZZZZYYYXWVUTTSQPOMMLKKJJJIHHIIIIIJJKKLMNOQSUWXYYZZZ',
        'ZZZZZYYYXXWVUUTRQPONMMLKJJIIIIIIJJJJKKLMNOQSUWXXYYZZ',
        'aaaaaaaaaaaaaaaZYXWVVVUTSRQPPPPPPPPQQQSTVXYYZZZZaaaa',
        'aaaabaZYXWVUTSRQQPOONMLLKKJIIIIIJJJKLMNOPQSTUUVWXYZa',
        'ccbbaZYXWVVUTSRQPOMMLJIIHHGGGGGHHHIIJKLMNPQSUVXYacdd',
        'cddcccbaYXWVUTSSRRQPOONNMMMMMMMMMMMNOOPQRSTUVXYZabcc',
        'cdddddccbaZYWVUTTSSRQPONNNMMMMMMMMNNOOPRSTUVWXXYZabc',
        'bcccccbbaZYXWUTTSRQQPONMMLLLLLLLLLMMMNOPRSTUVWXYZZab',
      ],
    },
  },
  limits: {
    'tilapia carton-overnight': {
      none: {
        cold: '                                                             ((&&&&%%%%%#######!!',
        hot: '                                   RRQQQQPPPPOOOONNNNNNMMMMM000000000000000000000',
      },
      'heat-2': {
        cold: '                                                          #!!!!zzzzzyyyyyyxxxxxxx',
        hot: '                                      UUUTTTTSSSSRRRRRQQQQQQPPP000000000000000000',
      },
      'heat-4': {
        cold: '                                                      yxxxxwwwwvvvvvvuuuuuuuttttt',
        hot: '                                         XXXXWWWWVVVVVUUUUTTTTTTTSS00000000000000',
      },
      'cold-2': {
        cold: '                                                                  &&%%%%%######!!',
        hot: '                               SRRRRQQQQPPPPOOOOONNNNNMMMMM0000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                             SSRRRRQQQQPPPPOOOONNNNNNMMMM000000000000000000000000',
      },
    },
    'tilapia foam-25-overnight': {
      none: {
        cold: '                                                          (&%%##!!zzyyxxwwwvvuutt',
        hot: '                                RQPPONNMMLLKKJJIIHHHGGFFEEDDCCBBAAA90000000000000',
      },
      'heat-2': {
        cold: '                                                   xwvvuuttssrrqqpppoonnmmllkkjji',
        hot: '                                       YXWWVUUTTSSRRQQPPOOONNMMLLKKJJIIHHHG000000',
      },
      'heat-4': {
        cold: '                                             poonnmmllkkjjiiihhggffeeddccbbbaaZZY',
        hot: '                                              feddcbbaaZZYYXXWWVVVUUTTSSRRQQPPOOO',
      },
      'cold-2': {
        cold: '                                                                               vv',
        hot: '                          SRQQPONNMMLLKKJJJIIHHGGFFEEDDCCCBBAA9000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                     SRQQPONNMMMLKKJJJIIHHGGFFEEDDCCBBAA9800000000000000000000000',
      },
    },
    'tilapia foam-38-overnight': {
      none: {
        cold: '                                                         (&%##!!zyyxxwvvuutssrrqp',
        hot: '                               RQPONNMLLKKJIIHHGGFEEDDCBBAA9887765544332000000000',
      },
      'heat-2': {
        cold: '                                                 uttsrrqqpoonnmllkkjiihhggfeeddcb',
        hot: '                                        aZYXWVVUUTSSRRQPPOONNMLLKKJIIHHGFFEEDCCBB',
      },
      'heat-4': {
        cold: '                                        mlkjjihhggfeeddcbbaaZYYXXWWVUUTTSRRQQPOON',
        hot: '                                                jiihgfeedccbbaZZYYXXWVVUUTSSRRQPP',
      },
      'cold-2': {
        cold: '                                                                                 ',
        hot: '                        RQPOONMMLLKJJIHHGGFEEDDCCBAA99877665443320000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                SRQQPONMMLLKJJIIHGGFEEDDCBBAA988766554332100000000000000000000000',
      },
    },
    'tilapia carton-two-days': {
      none: {
        cold: '                                                                 &&&&&&&&&&&&&&&&',
        hot: '                                  !ccccbbbbbbbbbbbbbbbb00000000000000000000000000',
      },
      'heat-2': {
        cold: '                                                              !!!!!!!!!!!!!!!!!!!',
        hot: '                                     .fffffffffeeeeeeeeeee00000000000000000000000',
      },
      'heat-4': {
        cold: '                                                           xxxxxxxxwwwwwwwwwwwwww',
        hot: '                                         iiiiiiiiiiiiihhhhhhhh0000000000000000000',
      },
      'cold-2': {
        cold: '                                                                  &&&&&&&&&&&&&&&',
        hot: '                               ccccccccbbbbbbbbbbbbbbbb00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                             ccccccccccbbbbbbbbbbbbbbbb00000000000000000000000000',
      },
    },
    'tilapia foam-25-two-days': {
      none: {
        cold: '                                                               ################!!',
        hot: '                                aaaZZZYYYYXXXXWWWWWVVVVVUUUU000000000000000000000',
      },
      'heat-2': {
        cold: '                                                        uuuuuuuuuuuuuuutttttttttt',
        hot: '                                       hhhggggfffeeeedddddcccccbbbb00000000000000',
      },
      'heat-4': {
        cold: '                                                 nnnnnnnnnnnnnmmmmmmmmmmmmmmmmmmm',
        hot: '                                              ooonnnnmmmmllllkkkkjjjjjjiii0000000',
      },
      'cold-2': {
        cold: '                                                                               ##',
        hot: '                          bbbaaaaZZZYYYYXXXXWWWWWVVVVVUUUU00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                       cbbbaaaaZZZZYYYXXXXWWWWWVVVVVUUU00000000000000000000000000',
      },
    },
    'tilapia foam-38-two-days': {
      none: {
        cold: '                                                              ###!!!!!!!!!!!!!zzz',
        hot: '                               aZZZYYYXXWWWWVVVUUUUTTTTSSSSSRR0000000000000000000',
      },
      'heat-2': {
        cold: '                                                     ssssrrrrrrrrrrrrrqqqqqqqqqqq',
        hot: '                                        jiiihhgggfffeeeeddddccccbbbbbaa0000000000',
      },
      'heat-4': {
        cold: '                                            jjjjiiiiiiiiiiiiiihhhhhhhhhhhhhgggggg',
        hot: '                                                ssrrqqqpppooonnnmmmmlllllkkkkjjj0',
      },
      'cold-2': {
        cold: '                                                                                 ',
        hot: '                        bbaaaZZZYYXXXWWWVVVVUUUUTTTTSSSSSRR0000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                     bbaaaZZYYYXXXWWWVVVVUUUUTTTTSSSSRRR0000000000000000000000000',
      },
    },
    'pond-fish carton-overnight': {
      none: {
        cold: '                                                   uuttttsssssrrrrrrqqqqqqqqppppp',
        hot: '                                        XXWWWWVVVVUUUUTTTTTS000000000000000000000',
      },
      'heat-2': {
        cold: '                                                rqqqqpppppoooooonnnnnnnmmmmmmmmll',
        hot: '                                           aaaZZZZYYYYXXXXXWWWW000000000000000000',
      },
      'heat-4': {
        cold: '                                            onnnnmmmmllllllkkkkkkkjjjjjjjjiiiiiii',
        hot: '                                              ddddccccbbbbbaaaaZZZ000000000000000',
      },
      'cold-2': {
        cold: '                                                    uuttttsssssrrrrrrqqqqqqqqpppp',
        hot: '                                    YXXXXWWWWVVVVUUUUTTTTS00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                            ssssrrrrrrqqqqqqqqppp',
        hot: '                                  YYXXXXWWWWVVVUUUUTTTSSR000000000000000000000000',
      },
    },
    'pond-fish foam-25-overnight': {
      none: {
        cold: '                                                ttsrrqqpppoonnmmllkkjjiiihhggffee',
        hot: '                                     XWVUUTSSSRRQQPPOONNMMLLLKKJJ0000000000000000',
      },
      'heat-2': {
        cold: '                                         mmlkkjjiiihhggffeeddccbbbaaZZYYXXWWVVUUU',
        hot: '                                           eedcbbaZZZYYXXWWVVUUTTSSSRRQQ000000000',
      },
      'heat-4': {
        cold: '                                  ffeddccbbaaaZZYYXXWWVVUUUTTSSRRQQPPOONNNMMLLKKJ',
        hot: '                                                  llkjjihgggffeeddccbbaaaZZYYXX00',
      },
      'cold-2': {
        cold: '                                                         rqqppooonnmmllkkjjiihhhg',
        hot: '                               XXWVUUTSSSRRQQPPOONNMMLLKKJJI000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                           lkkkji',
        hot: '                         YXWVVUTTSSRRQQPPOONMMLLKKJIHGFEEC00000000000000000000000',
      },
    },
    'pond-fish foam-38-overnight': {
      none: {
        cold: '                                               tssrqqpoonnmllkkjiihhggfeeddcbbaaZ',
        hot: '                                   XXWVUTSSRRQPPOONMMLLKJJIIHHGFFEED0000000000000',
      },
      'heat-2': {
        cold: '                                      kkjihhggfeeddcbbaaZZYXXWWVUUTTSRRQQPOONNMML',
        hot: '                                            gfeedcbbaZZYYXWWVVUTTSSRQQPPOONMM0000',
      },
      'heat-4': {
        cold: '                             cbaZZYXXWWVUUTTSRRQQPPONNMMLKKJJIHHGGFEEDDCCBAA99877',
        hot: '                                                     ponmlkkjjiihggffeddccbaaZZYX',
      },
      'cold-2': {
        cold: '                                                            pponnmllkkjiihhggfeed',
        hot: '                            XXWVUTSSRQQPPONNMMLKKJJIHHGFFEEDC00000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                    YXWVUTSSRQQPPONNMLLKKJIIHGFFEDCBA9876400000000000000000000000',
      },
    },
    'pond-fish carton-two-days': {
      none: {
        cold: '                                                       tttttttttttttttttttttttttt',
        hot: '                                        iihhhhhhhhhhhhh00000000000000000000000000',
      },
      'heat-2': {
        cold: '                                                    qqqqqqqqqqqqqqqqqqqqqqqqqqqqq',
        hot: '                                           lllllllkkkkkkkk00000000000000000000000',
      },
      'heat-4': {
        cold: '                                                 nnnnnnnnmmmmmmmmmmmmmmmmmmmmmmmm',
        hot: '                                              ooooooooooonnnnn0000000000000000000',
      },
      'cold-2': {
        cold: '                                                       tttttttttttttttttttttttttt',
        hot: '                                    iiiiiihhhhhhhhhhhhh00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                            ttttttttttttttttttttt',
        hot: '                                  iiiiiiiihhhhhhhhhhhh000000000000000000000000000',
      },
    },
    'pond-fish foam-25-two-days': {
      none: {
        cold: '                                                     rrrrrrrrrrrrrrrrqqqqqqqqqqqq',
        hot: '                                     gggfffeeeeddddcccccbbb0000000000000000000000',
      },
      'heat-2': {
        cold: '                                              kkkkkkkkkkkkkkjjjjjjjjjjjjjjjjjjjjj',
        hot: '                                           nnnnmmmmlllkkkkjjjjjiii000000000000000',
      },
      'heat-4': {
        cold: '                                       dddddddddddddcccccccccccccccccccccccccbbbb',
        hot: '                                                  uuuuttttssssrrrrqqqqppp00000000',
      },
      'cold-2': {
        cold: '                                                         rrrrrrrrrrrrrrqqqqqqqqqq',
        hot: '                               hhhggggfffeeeeddddcccccbb0000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                           qqqqqq',
        hot: '                            hhhhgggffffeeeddddccccbbba000000000000000000000000000',
      },
    },
    'pond-fish foam-38-two-days': {
      none: {
        cold: '                                                    rrqqqqqqqqqqqqqqppppppppppppp',
        hot: '                                   ggfffeeeddcccbbbbaaaaZZZZY00000000000000000000',
      },
      'heat-2': {
        cold: '                                           iiihhhhhhhhhhhhhggggggggggggggffffffff',
        hot: '                                            ppooonnmmmlllkkkkjjjiiiiih00000000000',
      },
      'heat-4': {
        cold: '                                  ZZZZYYYYYYYYYYYYYXXXXXXXXXXXXXXWWWWWWWWWWWWWWVV',
        hot: '                                                     yyxxwwwvvvuuutttssssrrrrq000',
      },
      'cold-2': {
        cold: '                                                            qqqqqqqqqqqpppppppppp',
        hot: '                              hgggffeeedddcccbbbbaaaZZZZZ000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                          hhggfffeedddcccbbbaaaaZZZYYX000000000000000000000000000',
      },
    },
    'cool-water-fish carton-overnight': {
      none: {
        cold: '                                                 ssrrrrqqqqqppppppoooooooonnnnnnn',
        hot: '                                            bbaaaaZZZZYYYYYX000000000000000000000',
      },
      'heat-2': {
        cold: '                                              poooonnnnnmmmmmmlllllllkkkkkkkkjjjj',
        hot: '                                               eeeddddccccbbbbb000000000000000000',
      },
      'heat-4': {
        cold: '                                          mllllkkkkjjjjjjiiiiiiihhhhhhhhgggggggff',
        hot: '                                                  hhhhggggfffffeee000000000000000',
      },
      'cold-2': {
        cold: '                                                  ssrrrrqqqqqpppppppooooooonnnnnn',
        hot: '                                        cbbbbaaaaZZZZYYYXX00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                        rrqqqqqppppppooooooonnnnn',
        hot: '                                      cbbbbaaaaZZZYYXXWWV000000000000000000000000',
      },
    },
    'cool-water-fish foam-25-overnight': {
      none: {
        cold: '                                              srqqppoonnmmllkkjjiiihhggffeeddccbb',
        hot: '                                         baZZYXXWWVVUUTTSSRRRQQPP0000000000000000',
      },
      'heat-2': {
        cold: '                                       lkjjiihhggffeeddccbbbaaZZYYXXWWVVUUUTTSSRR',
        hot: '                                                ihggfeeddccbbaaZZYYYXXW0000000000',
      },
      'heat-4': {
        cold: '                                edccbbaaZZYYXXWWVVUUUTTSSRRQQPPOONNNMMLLKKJJIIHHG',
        hot: '                                                       ponnmllkkjjiihhgggffeed000',
      },
      'cold-2': {
        cold: '                                                       ppoonnmmllkkjjjiihhggffeed',
        hot: '                                   bbaZYYXWWVVUUTTSSRRQQPOON000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                     llkkjjiihhgg',
        hot: '                             bbaZYYXWWVVUUTSSRRQPONMMLJJIH00000000000000000000000',
      },
    },
    'cool-water-fish foam-38-overnight': {
      none: {
        cold: '                                             srqpoonnmllkkjjihhggfeeddcbbaaZYYXXW',
        hot: '                                        baZYXXWVVUUTSSRRQQPOONNMLLK00000000000000',
      },
      'heat-2': {
        cold: '                                    jihggfeeddccbaaZZYXXWWVUUTTSRRQQPPONNMMLKKJJI',
        hot: '                                                 kjihgffeedccbbaZZYYXXWVVUUT00000',
      },
      'heat-4': {
        cold: '                            ZYYXWWVUUTTSSRQQPPONNMMLKKJJIHHGGFFEDDCCBAA9987766544',
        hot: '                                                         tssrqpoonmmllkjjiihggffe',
      },
      'cold-2': {
        cold: '                                                         oonmmllkjjihhggfeeddccba',
        hot: '                                cbaZYXWWVUUTTSRRQQPOONMMLKJI000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                            hhggf',
        hot: '                        caaZYXWVVUUTSSRQPPONMLLKIIHFEDCBA800000000000000000000000',
      },
    },
    'cool-water-fish carton-two-days': {
      none: {
        cold: '                                                     rrrrrrrrrrrrrrrrrrrrrrrrrrrr',
        hot: '                                            mmlllllllll00000000000000000000000000',
      },
      'heat-2': {
        cold: '                                                  ooooooooooooooooooooooooooooooo',
        hot: '                                               pppppppoooo00000000000000000000000',
      },
      'heat-4': {
        cold: '                                               llllllllkkkkkkkkkkkkkkkkkkkkkkkkkk',
        hot: '                                                  sssssssssssr0000000000000000000',
      },
      'cold-2': {
        cold: '                                                     rrrrrrrrrrrrrrrrrrrrrrrrrrrr',
        hot: '                                        mmmmmmlllllllll00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                        rrrrrrrrrrrrrrrrrrrrrrrrr',
        hot: '                                      mmmmmmmmllllllll000000000000000000000000000',
      },
    },
    'cool-water-fish foam-25-two-days': {
      none: {
        cold: '                                                   ppppppppppppppppoooooooooooooo',
        hot: '                                         kkkjjjjiiihhhhggg00000000000000000000000',
      },
      'heat-2': {
        cold: '                                            iiiiiiiiiiiiiiihhhhhhhhhhhhhhhhhhhhhh',
        hot: '                                                rrrqqqqppppoooonn0000000000000000',
      },
      'heat-4': {
        cold: '                                     bbbbbbbbbbbbbaaaaaaaaaaaaaaaaaaaaaaaaaZZZZZZ',
        hot: '                                                       yyyxxxxwwwwvvvvuu000000000',
      },
      'cold-2': {
        cold: '                                                       ppppppppppppppoooooooooooo',
        hot: '                                   lllkkkkjjjiiiihhhhggg0000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                     ppoooooooooo',
        hot: '                                lllkkkkjjjiiiihhhggffe000000000000000000000000000',
      },
    },
    'cool-water-fish foam-38-two-days': {
      none: {
        cold: '                                                  pppooooooooooooonnnnnnnnnnnnnmm',
        hot: '                                        kjjjiiihhhgggfffeeee000000000000000000000',
      },
      'heat-2': {
        cold: '                                         gggffffffffffffffeeeeeeeeeeeeedddddddddd',
        hot: '                                                 tsssrrqqqpppoooonnnn000000000000',
      },
      'heat-4': {
        cold: '                                XXXXWWWWWWWWWWWWWWVVVVVVVVVVVVVUUUUUUUUUUUUUUTTTT',
        hot: '                                                         %%###!!zzzyyyxxxwwwwv000',
      },
      'cold-2': {
        cold: '                                                         oooooooooooonnnnnnnnnnnn',
        hot: '                                  lkkkjjiiihhhgggfffeeee0000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                            nnnnn',
        hot: '                              lkkkjjiiihhgggfffeeedccb000000000000000000000000000',
      },
    },
    'perch carton-overnight': {
      none: {
        cold: '                                               qqppppooooonnnnnnmmmmmmmmllllllllk',
        hot: '                                              ddccccbbbbaaaa000000000000000000000',
      },
      'heat-2': {
        cold: '                                            nmmmmlllllkkkkkkjjjjjjjiiiiiiiihhhhhh',
        hot: '                                                 gggffffeeeeddd000000000000000000',
      },
      'heat-4': {
        cold: '                                        kjjjjiiiihhhhhhgggggggffffffffeeeeeeedddd',
        hot: '                                                    jjjjiiiihhhhhg000000000000000',
      },
      'cold-2': {
        cold: '                                                qqppppooooonnnnnnnmmmmmmmllllllll',
        hot: '                                          eddddccccbbbaaaZ00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                     pppooooonnnnnnmmmmmmmlllllll',
        hot: '                                       eeddddcccbbbaaZYYX000000000000000000000000',
      },
    },
    'perch foam-25-overnight': {
      none: {
        cold: '                                            qpoonnmmllkkjjiihhgggffeeddccbbaaZZZY',
        hot: '                                           dcbbaZZYYXXWWVVUUTTTS00000000000000000',
      },
      'heat-2': {
        cold: '                                     jihhggffeeddccbbaaZZZYYXXWWVVUUTTSSSRRQQPPOO',
        hot: '                                                  kjiihggffeeddccbbaaaZ0000000000',
      },
      'heat-4': {
        cold: '                              cbaaZZYYXXWWVVUUTTSSSRRQQPPOONNMMLLLKKJJIIHHGGFFEEE',
        hot: '                                                         rqpponnmmllkkjjiiihhg000',
      },
      'cold-2': {
        cold: '                                                    onnmmllkkjjiiihhggffeeddccbbb',
        hot: '                                    fddcbaZZYYXXWWVVUUTSSRQP000000000000000000000',
      },
      'cold-4': {
        cold: '                                                               mllkjjiihhggfffeed',
        hot: '                              edccbaZYYXXWWVUUTSRQPPNMMKJI00000000000000000000000',
      },
    },
    'perch foam-38-overnight': {
      none: {
        cold: '                                           qponmmllkjjiihhgffeedccbbaZZYYXWWVVUUT',
        hot: '                                          dcbaZZYXXWWVUUTTSSRQQPPO000000000000000',
      },
      'heat-2': {
        cold: '                                  hgfeedccbbaaZYYXXWVVUUTSSRRQPPOONNMLLKKJIIHHGFF',
        hot: '                                                   mlkjihhggfeeddcbbaaZZYXX000000',
      },
      'heat-4': {
        cold: '                          XWWVUUTSSRRQQPOONNMLLKKJIIHHGFFEEDDCBBAA988776554432211',
        hot: '                                                           vuutsrqqpoonnmllkkjiih',
      },
      'cold-2': {
        cold: '                                                      nnmllkjjihhggfeeddccbaaZZYX',
        hot: '                                  dcbaaZYXXWWVUUTSSRQQPONMLK000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                     jiihggffeddc',
        hot: '                         edcbaZYXXWWVUTTSRQQPONMKKJHGFDCCA00000000000000000000000',
      },
    },
    'perch carton-two-days': {
      none: {
        cold: '                                                   pppppppppppppppppppppppppppppp',
        hot: '                                              oonnnnnnn00000000000000000000000000',
      },
      'heat-2': {
        cold: '                                                mmmmmmmmmmmmmmmmmmmmmmmmmmmmmmmmm',
        hot: '                                                 rrrrrrrqq00000000000000000000000',
      },
      'heat-4': {
        cold: '                                             jjjjjjjjiiiiiiiiiiiiiiiiiiiiiiiiiiii',
        hot: '                                                    uuuuuuuuuu0000000000000000000',
      },
      'cold-2': {
        cold: '                                                   pppppppppppppppppppppppppppppp',
        hot: '                                          oooooonnnnnnn00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                     pppppppppppppppppppppppppppp',
        hot: '                                       oooooooonnnnnnn000000000000000000000000000',
      },
    },
    'perch foam-25-two-days': {
      none: {
        cold: '                                                 nnnnnnnnnnnnnnnnmmmmmmmmmmmmmmmm',
        hot: '                                           mmmllllkkkjjjji00000000000000000000000',
      },
      'heat-2': {
        cold: '                                          gggggggggggggggffffffffffffffffffffffff',
        hot: '                                                  tttssssrrrrqqqq0000000000000000',
      },
      'heat-4': {
        cold: '                                   ZZZZZZZZZZZZZYYYYYYYYYYYYYYYYYYYYYYYYYXXXXXXXX',
        hot: '                                                         !!!zzzzyyyyxxxx000000000',
      },
      'cold-2': {
        cold: '                                                    nnnnnnnnnnnnnnnmmmmmmmmmmmmmm',
        hot: '                                     nnnmmmmlllkkkkjjji00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                               nnnnnnnmmmmmmmmmmm',
        hot: '                                  nnnmmmmlllkkkjjiihhg000000000000000000000000000',
      },
    },
    'perch foam-38-two-days': {
      none: {
        cold: '                                                nnnmmmmmmmmmmmmmlllllllllllllkkkk',
        hot: '                                          mlllkkkjjjiiihhhgg000000000000000000000',
      },
      'heat-2': {
        cold: '                                       eeeddddddddddddddcccccccccccccbbbbbbbbbbbb',
        hot: '                                                   vuuuttsssrrrqqqqpp000000000000',
      },
      'heat-4': {
        cold: '                              VVVVUUUUUUUUUUUUUUTTTTTTTTTTTTTSSSSSSSSSSSSSSRRRRRR',
        hot: '                                                           ((&&&%%###!!!zzzyy0000',
      },
      'cold-2': {
        cold: '                                                      mmmmmmmmmmmmmllllllllllllll',
        hot: '                                   nnmmmllkkkjjjiiihhhg00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                     mmllllllllll',
        hot: '                               nnmmmllkkjjjiihhhgffeed000000000000000000000000000',
      },
    },
    'trout carton-overnight': {
      none: {
        cold: '                                             oonnnnmmmmmlllllllkkkkkkkjjjjjjjjiii',
        hot: '                                                     jjiiii0000000000000000000000',
      },
      'heat-2': {
        cold: '                                          lkkkkjjjjjiiiiiihhhhhhhggggggggffffffff',
        hot: '                                                        mmmllll000000000000000000',
      },
      'heat-4': {
        cold: '                                      ihhhhgggggfffffeeeeeeeddddddddccccccccbbbbb',
        hot: '                                                           ppppooo000000000000000',
      },
      'cold-2': {
        cold: '                                               oonnnnmmmmmllllllkkkkkkkjjjjjjjjii',
        hot: '                                               kkjjjiiihgf00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                   nnnnmmmmllllllkkkkkkkjjjjjjjji',
        hot: '                                            kkjjjiihgfedd000000000000000000000000',
      },
    },
    'trout foam-25-overnight': {
      none: {
        cold: '                                           nnmllkkjjiiihhggffeeddccbbbaaZZYYXXWWV',
        hot: '                                                   ihhgffeeddcc000000000000000000',
      },
      'heat-2': {
        cold: '                                    ggffeddcccbbaaZZYYXXWWVVVUUTTSSRRQQPPOOONNMML',
        hot: '                                                         qpoonmmllkkjj00000000000',
      },
      'heat-4': {
        cold: '                             aZYYXWWWVVUUTTSSRRQQPPPOONNMMLLKKJJIIIHHGGFFEEDDCCBB',
        hot: '                                                                xwvvuttssrrq00000',
      },
      'cold-2': {
        cold: '                                                  nnmllkkjjiihhggffeeddccbbaaZZZY',
        hot: '                                          kjiihgfeedccbaZYX0000000000000000000000',
      },
      'cold-4': {
        cold: '                                                           mllkkjiiihggffeeddccbb',
        hot: '                                   kjihgffedcbaZYXWVUTSQPO00000000000000000000000',
      },
    },
    'trout foam-38-overnight': {
      none: {
        cold: '                                          nnmlkkjjihhggfeeddccbaaZZYXXWWVUUTTSRRQ',
        hot: '                                                  iihgfeedccbbaa00000000000000000',
      },
      'heat-2': {
        cold: '                                 fedccbbaZZYYXWWVVUTTSSRRQPPOONMMLLKJJIIHGGFFEDDC',
        hot: '                                                          srqpoonmmllkjji00000000',
      },
      'heat-4': {
        cold: '                         WVUTTSRRQQPOONNMLLKKJIIHHGFFEEDDCBBAA9887765544322110000',
        hot: '                                                                  #!zzyxwwvuuttsr',
      },
      'cold-2': {
        cold: '                                                    nmlkkjiihggffeedccbaaZYYXXWWV',
        hot: '                                        jihhgfeddcbaZYXWVUTS000000000000000000000',
      },
      'cold-4': {
        cold: '                                                               mlkjjihhgffeddcbba',
        hot: '                              ljihgfedccaaZYWWUTSRQONLKJIG00000000000000000000000',
      },
    },
    'trout carton-two-days': {
      none: {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                                     uu00000000000000000000000000',
      },
      'heat-2': {
        cold: '                                              kkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkk',
        hot: '                                                        xx00000000000000000000000',
      },
      'heat-4': {
        cold: '                                           hhhhhhhhgggggggggggggggggggggggggggggg',
        hot: '                                                          ,!!00000000000000000000',
      },
      'cold-2': {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                               uuuuuuu000000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                   nnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                            uuuuuuuutt000000000000000000000000000',
      },
    },
    'trout foam-25-two-days': {
      none: {
        cold: '                                               llllllllllllllllkkkkkkkkkkkkkkkkkk',
        hot: '                                                   ssrrrrq00000000000000000000000',
      },
      'heat-2': {
        cold: '                                        eeeeeeeeeeeeeeedddddddddddddddddddddddddc',
        hot: '                                                         zzzyyyyx0000000000000000',
      },
      'heat-4': {
        cold: '                                 XXXXXXXXXXXXXXWWWWWWWWWWWWWWWWWWWWWWWWVVVVVVVVVV',
        hot: '                                                                ***))))(000000000',
      },
      'cold-2': {
        cold: '                                                  llllllllllllllllkkkkkkkkkkkkkkk',
        hot: '                                           tttssssrrrqp00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                           llllllllllkkkkkkkkkkkk',
        hot: '                                       uttsssrrqqponnm000000000000000000000000000',
      },
    },
    'trout foam-38-two-days': {
      none: {
        cold: '                                              lllkkkkkkkkkkkkkjjjjjjjjjjjjjjiiiii',
        hot: '                                                  rrrqqqppp0000000000000000000000',
      },
      'heat-2': {
        cold: '                                     dcccbbbbbbbbbbbbbaaaaaaaaaaaaaaZZZZZZZZZZZZZ',
        hot: '                                                          #!!!zzyyyx0000000000000',
      },
      'heat-4': {
        cold: '                             TTTTSSSSSSSSSSSSSRRRRRRRRRRRRRRQQQQQQQQQQQQQPPPPPPPP',
        hot: '                                                                  ..--,,,+++00000',
      },
      'cold-2': {
        cold: '                                                    lkkkkkkkkkkkkkjjjjjjjjjjjjjji',
        hot: '                                         tttssrrrqqppon00000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                               kkkkkkkjjjjjjjjjjj',
        hot: '                                    ttsssrrqpponnmlkkj000000000000000000000000000',
      },
    },
    'redclaw carton-overnight': {
      none: {
        cold: '                                                          !!!!!!!!!!zzzzzzzzzzzzz',
        hot: '                                          YYYXXXXXXXXXXXXX00000000000000000000000',
      },
      'heat-2': {
        cold: '                                                       xxxxxxwwwwwwwwwwwwwwwwwwwv',
        hot: '                                             bbbbbbbaaaaaaaaa00000000000000000000',
      },
      'heat-4': {
        cold: '                                                    uuutttttttttttttttttsssssssss',
        hot: '                                                 eeeeeeeeeeedddd00000000000000000',
      },
      'cold-2': {
        cold: '                                                              !!!!!!zzzzzzzzzzzzz',
        hot: '                                      YYYYYYXXXXXXXXXXXXX000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                         zzzzzzzz',
        hot: '                                    YYYYYYYYXXXXXXXXXWWV0000000000000000000000000',
      },
    },
    'redclaw foam-25-overnight': {
      none: {
        cold: '                                                        !!zzzyyyyxxxxxwwwwwvvvvvu',
        hot: '                                        XWWWVVVUUUTTTTSSSSSSR00000000000000000000',
      },
      'heat-2': {
        cold: '                                                 ttsssrrrrqqqqppppppooooonnnnnnmm',
        hot: '                                               edddcccbbbbaaaZZZZZZY0000000000000',
      },
      'heat-4': {
        cold: '                                          mmlllkkkkjjjjiiiiihhhhhhgggggffffffeeee',
        hot: '                                                      lkkkjjjjiiihhhhgggggf000000',
      },
      'cold-2': {
        cold: '                                                                          wwwvvvv',
        hot: '                                 YYXXXWWWVVVUUUTTTSSSSSRR000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                             ZYXXXWWVVVUUTTTSSRRQQPOONMLK000000000000000000000000',
      },
    },
    'redclaw foam-38-overnight': {
      none: {
        cold: '                                                        !zzyyyxxxwwwvvvvuuuutttss',
        hot: '                                        WWVVUUTTTSSSRRRRQQQQPP0000000000000000000',
      },
      'heat-2': {
        cold: '                                               rqqpppooonnnnmmmllllkkkkjjjiiiihhh',
        hot: '                                                fffeeddccbbbbaaaaZZZYYY0000000000',
      },
      'heat-4': {
        cold: '                                      ihhhggffffeeeddddcccbbbbaaaaZZZYYYYXXXXWWWV',
        hot: '                                                         oonnnmmllkkkkjjjiiiihhh0',
      },
      'cold-2': {
        cold: '                                                                                t',
        hot: '                                YXXWWVVUUTTTSSSRRRQQQPPOON00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                          YXWWWVUUTTSSSRRQQPPONNLLKJIHGFD000000000000000000000000',
      },
    },
    'crawfish carton-overnight': {
      none: {
        cold: '                                                qqqqqqqqqqppppppppppppppppppppooo',
        hot: '                                              cccbbbbbbbbb00000000000000000000000',
      },
      'heat-2': {
        cold: '                                             nnnnnnmmmmmmmmmmmmmmmmmmmlllllllllll',
        hot: '                                                 fffffffeeeee00000000000000000000',
      },
      'heat-4': {
        cold: '                                          kkkjjjjjjjjjjjjjjjjjiiiiiiiiiiiiiiiiiii',
        hot: '                                                    iiiiiiiiiiii00000000000000000',
      },
      'cold-2': {
        cold: '                                                 qqqqqqqqqppppppppppppppppppppooo',
        hot: '                                         cccccccbbbbbbbba000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                      qqqqqpppppppppppppppppppooo',
        hot: '                                       ccccccccbbbbbaaZY0000000000000000000000000',
      },
    },
    'crawfish foam-25-overnight': {
      none: {
        cold: '                                              qqpppoooonnnnmmmmmmlllllkkkkkkjjjjj',
        hot: '                                           bbaaaZZZYYYXXXXWW000000000000000000000',
      },
      'heat-2': {
        cold: '                                       jjiiihhhhggggfffffeeeeeeddddddcccccbbbbbba',
        hot: '                                                  iihhhgggfffeeeedd00000000000000',
      },
      'heat-4': {
        cold: '                                cbbbbaaaZZZZZYYYYYXXXXXXWWWWWVVVVVVUUUUUTTTTTTSSS',
        hot: '                                                         ppooonnnmmmmlllkk0000000',
      },
      'cold-2': {
        cold: '                                                     ppooonnnnnmmmmmlllllkkkkkkjj',
        hot: '                                     cbbbaaaZZZYYXXWWWVVU000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                 nnmmmmmlllllkkkk',
        hot: '                                cbbaaaZZYYXWWVVUTSSQQPOML000000000000000000000000',
      },
    },
    'crawfish foam-38-overnight': {
      none: {
        cold: '                                             qpppoonnnmmmmllllkkkjjjjiiihhhhggggf',
        hot: '                                          baaaZZYYXXWWWWVVVVU00000000000000000000',
      },
      'heat-2': {
        cold: '                                     hggfffeeedddccccbbbbaaaZZZZYYYXXXXWWWWVVVUUU',
        hot: '                                                   kjjiiihhggffffeeedd00000000000',
      },
      'heat-4': {
        cold: '                            YXXWWWVVVUUUUTTTSSSSRRRRQQQPPPPOOOONNNMMMMLLLKKKKJJJJ',
        hot: '                                                            tssrrqqpppooonnnnmm00',
      },
      'cold-2': {
        cold: '                                                        onnnmmmllllkkkjjjjiiiihhh',
        hot: '                                   cbbaaZZYYXXWWWVVUTTSRRP00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                      mlllkkkjjji',
        hot: '                           cbbaaZYYXWWVVUUTSRRQOONMKJIHGE000000000000000000000000',
      },
    },
    'worms-and-larvae carton-overnight': {
      none: {
        cold: '                                                    uuuuuuuuuuttttttttttttttttttt',
        hot: '                                       XXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-2': {
        cold: '                                                 rrrrrrqqqqqqqqqqqqqqqqqqqppppppp',
        hot: '                                          YYYYYYYXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-4': {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                             bbbbbbbbbbbbaaaaaaaXXXXXXXXXXXXXXXXX',
      },
      'cold-2': {
        cold: '                                                     uuuuuuuuuttttttttttttttttttt',
        hot: '                                   XXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'cold-4': {
        cold: '                                                            uuutttttttttttttttttt',
        hot: '                                 XXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
    },
    'worms-and-larvae foam-25-overnight': {
      none: {
        cold: '                                                  uutttssssrrrrqqqqqqpppppoooooon',
        hot: '                                    UUTTTSSSRRRQQQQPPPPPOOOOO00000000000000000000',
      },
      'heat-2': {
        cold: '                                           nnmmmllllkkkkjjjjjiiiiiihhhhhggggggfff',
        hot: '                                          bbbaaaZZZYYYXXXXWWWWWWVVVV0000000000000',
      },
      'heat-4': {
        cold: '                                    gfffeeeedddddcccccbbbbbbaaaaaZZZZZZYYYYYXXXXX',
        hot: '                                                 iiihhhgggfffeeeeddddddcccc000000',
      },
      'cold-2': {
        cold: '                                                            ssrrrrqqqqqppppppoooo',
        hot: '                              VVUUUTTTSSSRRRQQQPPPPPOOONN000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                             pppo',
        hot: '                          VVUUUTTSSSRRQQQPPPOONNMMLKKJIHG000000000000000000000000',
      },
    },
    'worms-and-larvae foam-38-overnight': {
      none: {
        cold: '                                                 utttssrrrqqqqpppoooonnnnmmmllllk',
        hot: '                                   UTTSSSRRQQPPPPOOONNNNMMMMLL0000000000000000000',
      },
      'heat-2': {
        cold: '                                        llkkjjjiiihhhggggfffeeeeddddcccbbbbaaaaZZ',
        hot: '                                           ddccbbaaZZZYYYXXXXWWWWVVVUUU0000000000',
      },
      'heat-4': {
        cold: '                                cbbaaaZZZYYYXXXXWWWWVVVUUUUTTTTSSSRRRRQQQQPPPOOOO',
        hot: '                                                    mmllkkjjiihhhhggggfffeeeeddd0',
      },
      'cold-2': {
        cold: '                                                                qqppppoooonnnmmmm',
        hot: '                            VUUTTTSSRRQQPPPOOOONNNMMMLKKJJ00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                      VUUTTSSRQQQPPOOONNMMLLKJIIHGFEDCBA9000000000000000000000000',
      },
    },
    'worms-and-larvae carton-two-days': {
      none: {
        cold: '                                                        uuuuuuuuuuuuuuuuuuuuuuuuu',
        hot: '                                       gggggggggggggggXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-2': {
        cold: '                                                     rrrrrrrrrrrrrrrrrrrrrrrrrrrr',
        hot: '                                          jjjjjjjjjjjjjjjXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-4': {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                             mmmmmmmmmmmmmmmmXXXXXXXXXXXXXXXXXXXX',
      },
      'cold-2': {
        cold: '                                                        uuuuuuuuuuuuuuuuuuuuuuuuu',
        hot: '                                   gggggggggggggggggggXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'cold-4': {
        cold: '                                                            uuuuuuuuuuuuuuuuuuuuu',
        hot: '                                 ggggggggggggggggggggfXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
    },
    'worms-and-larvae foam-25-two-days': {
      none: {
        cold: '                                                       tttttttttttttttttttttttttt',
        hot: '                                    eeeeeeeeeeeddddddddd0000000000000000000000000',
      },
      'heat-2': {
        cold: '                                                mmmmmmmmmmmmmmmmmllllllllllllllll',
        hot: '                                          lllllllllllllkkkkkkkk000000000000000000',
      },
      'heat-4': {
        cold: '                                        fffeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeee',
        hot: '                                                 tsssssssssssssrrrrrrr00000000000',
      },
      'cold-2': {
        cold: '                                                            ttttttttttttttttttttt',
        hot: '                              fffeeeeeeeeeeeeedddddddd000000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                             tttt',
        hot: '                            ffffeeeeeeeeeeeeddddddccbb000000000000000000000000000',
      },
    },
    'worms-and-larvae foam-38-two-days': {
      none: {
        cold: '                                                      sssssssssssssssssssssssssss',
        hot: '                                   eeeddddddddccccccccbbb000000000000000000000000',
      },
      'heat-2': {
        cold: '                                             jjjjjjjjjjjjjjjjjjjjjjjjjjjjjjjjjjjj',
        hot: '                                           nnnnmmmmmmmmllllllllkk0000000000000000',
      },
      'heat-4': {
        cold: '                                    aaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaa',
        hot: '                                                    wwwvvvvvvvvuuuuuuuuttt0000000',
      },
      'cold-2': {
        cold: '                                                                sssssssssssssssss',
        hot: '                            feeeeeeeeddddddddcccccccbb000000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                                 ',
        hot: '                          feeeeeeedddddddcccccbbaaZZYY000000000000000000000000000',
      },
    },
    'nightcrawlers carton-overnight': {
      none: {
        cold: '                                                 ppppppppoooooooooooooooooooonnnn',
        hot: '                                         YYYYXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-2': {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                             bbbbbbbaaaaaaaaaXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-4': {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                                eeeeeeeeeeeeddddXXXXXXXXXXXXXXXXX',
      },
      'cold-2': {
        cold: '                                                 ppppppppoooooooooooooooooooonnnn',
        hot: '                                     YYYYYYYXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'cold-4': {
        cold: '                                                    ppppppooooooooooooooooooonnnn',
        hot: '                                   YYYYYYYYXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
    },
    'nightcrawlers foam-25-overnight': {
      none: {
        cold: '                                             ppooonnnnmmmmllllllkkkkkjjjjjjiiiiih',
        hot: '                                      XXXWWWVVVUUUTTTTSSSSSR000000000000000000000',
      },
      'heat-2': {
        cold: '                                      ihhhhgggfffffeeeeeddddddcccccbbbbbbaaaaaaZZ',
        hot: '                                             eeedddcccbbbaaaaZZZZZY00000000000000',
      },
      'heat-4': {
        cold: '                               baaaZZZZYYYYYXXXXXWWWWWVVVVVVUUUUUUTTTTTSSSSSSRRRR',
        hot: '                                                    lllkkkjjjiiihhhhgggggg0000000',
      },
      'cold-2': {
        cold: '                                                    oonnnmmmmllllllkkkkkjjjjjiiii',
        hot: '                                 YXXXWWWVVVUUUTTTSSSRRQQP000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                              nmmmlllllkkkkkjjjjj',
        hot: '                            YYXXWWWVVUUTTTSSRRQQPOOMLLKIH000000000000000000000000',
      },
    },
    'nightcrawlers foam-38-overnight': {
      none: {
        cold: '                                            poonnnmmmllllkkkjjjjiiiihhhggggffffee',
        hot: '                                     XXWWVVUUUTTSSSSRRRQQQQPPP0000000000000000000',
      },
      'heat-2': {
        cold: '                                   gfffeeddddcccbbbbaaaZZZZYYYYXXXWWWWVVVVUUUTTTT',
        hot: '                                              ggffeeddcccbbbaaaaZZZZYY00000000000',
      },
      'heat-4': {
        cold: '                          XXWWVVVUUUTTTSSSSRRRRQQQPPPPOOOONNNMMMMLLLLKKKJJJJIIIIH',
        hot: '                                                       pooonnmmllkkkkjjjjiiihhh00',
      },
      'cold-2': {
        cold: '                                                      nnmmmlllkkkjjjjiiihhhhggggf',
        hot: '                              YYXXWWVVUUTTSSSRRRQQQPPONMML00000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                  mllkkkkjjjiiihh',
        hot: '                        YXXWVVUUTTSSRRQQPPONNMLKJIHGFDDCA000000000000000000000000',
      },
    },
    'nightcrawlers carton-two-days': {
      none: {
        cold: '                                                   pppppppppppppppppppppppppppppp',
        hot: '                                         jjjjjjjjjjjjjXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-2': {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                             mmmmmmmmmmmmXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'heat-4': {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                                pppppppppppppXXXXXXXXXXXXXXXXXXXX',
      },
      'cold-2': {
        cold: '                                                   pppppppppppppppppppppppppppppp',
        hot: '                                     jjjjjjjjjjjjjjjjjXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
      'cold-4': {
        cold: '                                                    ppppppppppppppppppppppppppppp',
        hot: '                                   jjjjjjjjjjjjjjjjjjiXXXXXXXXXXXXXXXXXXXXXXXXXXX',
      },
    },
    'nightcrawlers foam-25-two-days': {
      none: {
        cold: '                                                  ooooooooooooooooooooooooooooooo',
        hot: '                                      hhhhhhhhhhhhgggggg0000000000000000000000000',
      },
      'heat-2': {
        cold: '                                           hhhhhhhhhhhhhhhhhggggggggggggggggggggg',
        hot: '                                             ooooooooooooonnnnn000000000000000000',
      },
      'heat-4': {
        cold: '                                   aaaZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZ',
        hot: '                                                    wvvvvvvvvvvvvvuuuu00000000000',
      },
      'cold-2': {
        cold: '                                                    ooooooooooooooooooooooooooooo',
        hot: '                                 iiihhhhhhhhhhhhhggggg000000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                              ooooooooooooooooooo',
        hot: '                              iiiiihhhhhhhhhhhggggffed000000000000000000000000000',
      },
    },
    'nightcrawlers foam-38-two-days': {
      none: {
        cold: '                                                 nnnnnnnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                                     hhhhggggggggfffffff0000000000000000000000000',
      },
      'heat-2': {
        cold: '                                        eeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeeee',
        hot: '                                              qqqqppppppppooooooo0000000000000000',
      },
      'heat-4': {
        cold: '                               VVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVVV',
        hot: '                                                       zzzyyyyyyyyxxxxxxxx0000000',
      },
      'cold-2': {
        cold: '                                                      nnnnnnnnnnnnnnnnnnnnnnnnnnn',
        hot: '                               ihhhhhhhggggggggffffffe000000000000000000000000000',
      },
      'cold-4': {
        cold: '                                                                  nnnnnnnnnnnnnnn',
        hot: '                            iihhhhhhggggggffffeedccbba000000000000000000000000000',
      },
    },
  },
}
