type Row = readonly [name: string, zip: string, state: 'OH' | 'KY' | 'IN']

// Sixty invented people who buy; the ZIP is where their fish will live.
// prettier-ignore
export const growers: readonly Row[] = [
  ['Maren Holt', '45223', 'OH'], ['Desmond Pike', '45206', 'OH'], ['Lucia Ferro', '45140', 'OH'], ['Wendell Crane', '45103', 'OH'],
  ['Saskia Boone', '45208', 'OH'], ['Tobias Grell', '45211', 'OH'], ['Yvonne Castle', '45215', 'OH'], ['Harlan Stipe', '45011', 'OH'],
  ['Mei Lindgren', '45056', 'OH'], ['Otis Barlow', '45036', 'OH'], ['Fern Adeyemi', '45402', 'OH'], ['Clark Wexler', '45414', 'OH'],
  ['Ruth Ibarra', '45387', 'OH'], ['Emil Novak', '45371', 'OH'], ['Dora Flynn', '45385', 'OH'], ['Isaac Thorne', '45305', 'OH'],
  ['Paula Renn', '45373', 'OH'], ['Jarvis Cole', '43201', 'OH'], ['Noor Haddad', '43206', 'OH'], ['Greta Simms', '43085', 'OH'],
  ['Leon Paxton', '43016', 'OH'], ['Vera Cutler', '43119', 'OH'], ['Abel Munro', '43015', 'OH'], ['Sunniva Day', '43113', 'OH'],
  ['Marcus Tilly', '43130', 'OH'], ['Joan Beck', '41011', 'KY'], ['Ravi Menon', '41014', 'KY'], ['Celia Drum', '41017', 'KY'],
  ['Hank Moseley', '41042', 'KY'], ['Anya Petrov', '41001', 'KY'], ['Boyd Latham', '41051', 'KY'], ['Tilda Crowe', '40502', 'KY'],
  ['Kofi Asante', '40503', 'KY'], ['Nell Draper', '40511', 'KY'], ['Simon Vance', '40383', 'KY'], ['Lena Ortiz', '40324', 'KY'],
  ['Grady Poole', '40340', 'KY'], ['Maude Easton', '40204', 'KY'], ['Victor Salas', '40205', 'KY'], ['Ingrid Hale', '40207', 'KY'],
  ['Elias Rook', '40214', 'KY'], ['Petra Lowe', '40299', 'KY'], ['Amos Keen', '40065', 'KY'], ['Judith Wray', '40071', 'KY'],
  ['Cyrus Bell', '47250', 'IN'], ['Hedda Strom', '47243', 'IN'], ['Luther Page', '47043', 'IN'], ['Rosa Quintero', '47374', 'IN'],
  ['Floyd Amsler', '47374', 'IN'], ['Nina Barrow', '47327', 'IN'], ['Owen Tate', '47353', 'IN'], ['Sybil Crane', '47401', 'IN'],
  ['Darius King', '47403', 'IN'], ['Wilma Brandt', '47404', 'IN'], ['Felix Arden', '47408', 'IN'], ['Corinne Yost', '47429', 'IN'],
  ['Edgar Nash', '47448', 'IN'], ['Thea Lund', '47150', 'IN'], ['Roland Speck', '47460', 'IN'], ['Mabel Ostrow', '47408', 'IN'],
]
