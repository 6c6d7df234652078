import type { SheetWords } from '#shared/sheets/words/sheet-words'

export const ES: SheetWords = {
  stripSheet: 'Hoja de la tira',
  endTemplates: 'Extremos a tamaño real',
  page: (page, pages) => `página ${page} de ${pages}`,
  printed: (day) => `impresa el ${day}`,
  poNumber: (number) => `O.C. ${number}`,
  hand: { left: 'mano izquierda', right: 'mano derecha' },
  fact: {
    pieces: 'Piezas',
    left: 'de ellas izquierdas',
    right: 'de ellas derechas',
    length: 'Pieza, de punta a punta',
    stripWidth: 'Ancho de la tira',
    girth: 'Desarrollo nominal',
    statedGirth: 'Desarrollo que espera la cuadrilla',
    blank: 'Cortar a',
    weight: 'Cada pieza pesa',
    stock: 'Material',
    colorSide: 'Lado pintado',
    brake: 'Dobladora',
    notReleased: 'aún no liberado',
  },
  colorSide: {
    left: 'arriba, como está aquí',
    right: 'abajo, como está aquí',
    both: 'los dos lados',
    none: 'ninguno',
  },
  section: 'Perfil, visto desde su extremo derecho',
  strip: 'Tira, lado izquierdo arriba: pliegues desde el borde A',
  wholeStrip: 'La tira entera, lado izquierdo arriba',
  creases: {
    title: 'Pliegues',
    fold: 'Doblez',
    fromA: 'Desde A',
    way: 'Hacia',
    angle: 'Ángulo',
    up: 'arriba',
    down: 'abajo',
    bend: (bend) => `doblez ${bend}`,
    hem: (edge) => `dobladillo ${edge}`,
  },
  end: {
    title: { left: 'Extremo izquierdo', right: 'Extremo derecho' },
    low: 'EXTREMO BAJO',
    high: 'EXTREMO ALTO',
    square: 'Corte a escuadra.',
    under: 'Traslape que entra debajo de la vecina.',
    relief: (length) => `Recorte lo punteado, en ${length} desde el extremo.`,
    over: 'Traslape que recibe a la vecina.',
    miter: 'A inglete: marque los puntos y corte de uno al siguiente.',
    tab: (leg, length) =>
      `Tramo ${leg}: deje una lengüeta de ${length} más allá del corte y dóblela por la línea de corte.`,
    opening: (edge, gap, length) =>
      `Abra el dobladillo del borde ${edge} a ${gap} en ${length} desde el extremo.`,
    slits: (count) =>
      count === 1
        ? 'Haga un corte en el pliegue entre las lengüetas.'
        : `Haga cortes en los ${count} pliegues entre las lengüetas.`,
  },
  marks: {
    title: 'Marcas, lado izquierdo arriba',
    at: 'En',
    fromA: 'Desde el borde A',
    fromEnd: 'Desde el extremo',
    edgeA: 'borde A',
    edgeB: 'borde B',
  },
  template: {
    check: (length) => `Mida esta línea: debe tener ${length} de largo.`,
    full: 'Imprima al 100 %, sin ajustar a la página.',
    join: 'Corte por los marcos y una las páginas por sus letras.',
    noDressedEnd: 'Los dos extremos van a escuadra: no hay extremo que poner sobre la lámina.',
  },
  caution: {
    title: 'Precauciones',
    edges: 'Los bordes cortados y las rebabas tienen filo: guantes puestos.',
    brake: 'La dobladora atrapa: primero las protecciones del fabricante y las reglas de bloqueo.',
    film: 'Despegue la película del dobladillo antes de cerrarlo; quite el resto poco después de montar.',
    lift: {
      twoPeople: (weight, length) => `La levantan dos personas: más de ${weight} o de ${length}.`,
      neverOne: (_weight, _length, never) =>
        `La levantan dos personas, nunca una: más de ${never}.`,
    },
  },
  figure: {
    section: (name) => `Perfil de ${name} con sus medidas`,
    strip: (name) => `Tira plana de ${name} con sus pliegues, borde A a la izquierda`,
    wholeStrip: (name) => `Contorno de la tira de ${name}`,
    end: (name, end) => `${end} de ${name}: contorno con sus marcas`,
  },
}
