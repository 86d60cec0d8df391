/** @type {import('next').NextConfig} */
export default {
  poweredByHeader: false,
  reactStrictMode: true,
  compress: true,
  devIndicators: false,
  // Types are checked by the build of the whole project, once.
  typescript: { ignoreBuildErrors: false },
};
