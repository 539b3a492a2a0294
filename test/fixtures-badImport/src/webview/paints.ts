export const paint = () => 'paint';
