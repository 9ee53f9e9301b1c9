import type { BatchSnapshot, SnapshotTeam } from '@/lib/domain/batch/batch-snapshot';
import { findSize, listKitsOfGarment, listPieces } from '@/lib/domain/packing/list-pieces';
import { pullDigits } from '@/lib/domain/packing/pull-digits';
import { pullGarments } from '@/lib/domain/packing/pull-garments';
import type { Column, DataTable } from './data-table';

const column = (name: string, meaning: string): Column => ({ name, meaning });

const colourColumns = [
  column('body', 'colour of the body, # and six hexadecimal digits of sRGB'),
  column('sleeves', 'colour of the sleeves, written likewise'),
];

/** Every piece of the batch, a row each, in the order of the batch. */
export function tabulatePieces(snapshot: BatchSnapshot): DataTable {
  return {
    format: 'raglan-pieces',
    columns: [
      column('piece', 'running number in this batch, from 1'),
      column('team', 'name of the team'),
      column('division', 'name of its division'),
      column('player', 'name of the player as entered'),
      column('role', 'what the player is, as entered; often empty'),
      column('bag_code', 'code on the bag label'),
      column('garment', 'name of the garment'),
      column('garment_code', 'short name of the garment'),
      column('kit', 'home or away'),
      column('colour', 'name of the kit’s colour'),
      ...colourColumns,
      column('number_colour', 'colour of number and name'),
      column('outline_colour', 'colour of their outline; empty without one'),
      column('size', 'size code; empty when the player has none'),
      column('size_label', 'size in words, or “no size”'),
      column('number', 'number to apply, as text: 07 is not 7; empty for none'),
      column('name_on_back', 'name to apply; empty for none'),
    ],
    rows: listPieces(snapshot).map((piece, at) => [
      at + 1,
      piece.team.name,
      piece.team.division,
      piece.player.name,
      piece.player.role,
      piece.player.bagCode,
      piece.garment.name,
      piece.garment.code,
      piece.kitKind,
      piece.kit.name,
      piece.kit.body.toLowerCase(),
      piece.kit.sleeves.toLowerCase(),
      piece.kit.number.toLowerCase(),
      piece.kit.outline?.toLowerCase() ?? '',
      piece.size,
      piece.sizeLabel,
      piece.number,
      piece.nameOnBack,
    ]),
  };
}

/** The garments to pull, a row for each style, colour and size that is wanted. */
export function tabulateGarments(snapshot: BatchSnapshot): DataTable {
  return {
    format: 'raglan-garment-pull-list',
    columns: [
      column('garment', 'name of the garment'),
      column('colour', 'name of the kit’s colour'),
      ...colourColumns,
      column('size', 'size code; empty for pieces without a size'),
      column('size_label', 'size in words, or “no size”'),
      column('count', 'pieces to pull'),
    ],
    rows: pullGarments(listPieces(snapshot)).flatMap(({ style, colours }) =>
      colours.flatMap(({ colour, body, sleeves, sizes }) =>
        sizes.map((size) => [style, colour, body, sleeves, size.code, size.label, size.count]),
      ),
    ),
  };
}

/** The digits to pull, a row for each colour and character; the ten digits also where none is wanted. */
export function tabulateDigits(snapshot: BatchSnapshot): DataTable {
  return {
    format: 'raglan-digit-pull-list',
    columns: [
      column('number_colour', 'colour of the digit, # and six hexadecimal digits of sRGB'),
      column('outline_colour', 'colour of its outline; empty without one'),
      column('character', 'the digit, or another character of a number'),
      column('count', 'applications, 6 and 9 counted apart'),
    ],
    rows: pullDigits(listPieces(snapshot)).flatMap(({ number, outline, digits, others }) =>
      [...digits, ...others].map(({ character, count }) => [number, outline ?? '', character, count]),
    ),
  };
}

/** A team's packing list, a row for each player and a column for each garment in each kit. */
export function tabulatePackingList(team: SnapshotTeam): DataTable {
  const garments = team.garments.flatMap((garment) =>
    listKitsOfGarment(team, garment).map(({ kind }) => ({ garment, kind })),
  );
  return {
    format: 'raglan-packing-list',
    columns: [
      column('number', 'the player’s number, as text'),
      column('player', 'name of the player as entered'),
      column('name_on_back', 'name to apply; empty for none'),
      column('bag_code', 'code on the bag label'),
      ...garments.map(({ garment, kind }) =>
        column(`${garment.name}, ${kind}`, 'size of this piece; empty when the player has none'),
      ),
    ],
    rows: team.players.map((player) => [
      player.number,
      player.name,
      player.nameOnBack,
      player.bagCode,
      ...garments.map(({ garment }) => findSize(player, garment).size),
    ]),
  };
}
