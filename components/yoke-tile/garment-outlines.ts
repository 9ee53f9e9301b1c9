/** The outlines of the small raglan garment, in a box 100 wide and 88 high: shared by the yoke tile and the mark. */
export const garmentBox = '-1.5 -1.5 103 91';
export const leftSleeve = 'M37.8 0C21 .8 5.5 10 0 27l10.4 17.8L25 37.3 24 24.4z';
export const rightSleeve = 'M62.2 0C79 .8 94.5 10 100 27L89.6 44.8 75 37.3l1-12.9z';
export const body = 'M37.8 0q12.2 7.5 24.4 0L76 24.4l-2.8 62.6H26.8L24 24.4z';
