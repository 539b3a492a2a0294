import Papa from 'papaparse';
export const parse = Papa.parse;
