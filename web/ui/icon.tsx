const drawings = {
  close: 'M4 4l8 8M12 4l-8 8',
  sun: 'M8 5.2a2.8 2.8 0 1 0 0 5.6 2.8 2.8 0 0 0 0-5.6zM8 1v1.6M8 13.4V15M1 8h1.6M13.4 8H15M3 3l1.2 1.2M11.8 11.8L13 13M13 3l-1.2 1.2M4.2 11.8L3 13',
  moon: 'M13.2 9.8A5.8 5.8 0 0 1 6.2 2.8a5.8 5.8 0 1 0 7 7z',
  screen: 'M2 3h12v8H2zM6 14h4M8 11v3',
  eye: 'M1.2 8S3.6 3.6 8 3.6 14.8 8 14.8 8 12.4 12.4 8 12.4 1.2 8 1.2 8zM8 6a2 2 0 1 0 0 4 2 2 0 0 0 0-4z',
  eyeClosed: 'M1.5 6.2C2.8 8.6 5 10.4 8 10.4s5.2-1.8 6.5-4.2M4.2 9.2l-1.2 2M8 10.4V13M11.8 9.2l1.2 2',
  arrowRight: 'M2.5 8h11M9.5 4l4 4-4 4',
  plus: 'M8 2.5v11M2.5 8h11',
  search: 'M6.8 2.2a4.6 4.6 0 1 0 0 9.2 4.6 4.6 0 0 0 0-9.2zM10.2 10.2L14 14',
};

/** Small line drawing beside words; never the only carrier of a meaning. */
export function Icon({ name, size = 16 }: { name: keyof typeof drawings; size?: number }) {
  return (
    <svg
      aria-hidden="true"
      className="shrink-0"
      width={size}
      height={size}
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.4"
      strokeLinecap="round"
      strokeLinejoin="round"
    >
      <path d={drawings[name]} />
    </svg>
  );
}
