/** The inks of the identity: one set for paper, one for the night sheet. */
export interface Palette {
  paper: string;
  raised: string;
  ink: string;
  faded: string;
  /** Hairlines that only divide. */
  rule: string;
  /** Outlines of controls: at least 3:1 on the paper. */
  outline: string;
  lichen: string;
  onLichen: string;
  ochre: string;
  madder: string;
  slate: string;
}

export const PAPER: Palette = {
  paper: '#f6f3ea',
  raised: '#fdfbf5',
  ink: '#1d2b2a',
  faded: '#5b6764',
  rule: '#d5cfbf',
  outline: '#5b6764',
  lichen: '#3d6b57',
  onLichen: '#fdfbf5',
  ochre: '#936200',
  madder: '#9b2c2c',
  slate: '#3a5a78',
};

export const NIGHT: Palette = {
  paper: '#171e1d',
  raised: '#202827',
  ink: '#ece7d9',
  faded: '#a3aca8',
  rule: '#3b4543',
  outline: '#8e9994',
  lichen: '#8fc3aa',
  onLichen: '#14201b',
  ochre: '#dba945',
  madder: '#e58a80',
  slate: '#9dbbd8',
};
