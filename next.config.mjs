import createMDX from '@next/mdx'

// Plugins are named as strings: Turbopack hands them to its worker by name.
const withMDX = createMDX({
  extension: /\.mdx$/,
  options: {
    remarkPlugins: ['remark-gfm', 'remark-math', 'remark-frontmatter', 'remark-mdx-frontmatter'],
    rehypePlugins: [['rehype-katex', { strict: 'error' }]],
  },
})

/** @type {import('next').NextConfig} */
const config = {
  // Tests build beside the app that may be running, never under it.
  distDir: process.env.NEXT_DIST_DIR || '.next',
  // `npm run check` holds the types, over tests and scripts too: a build need not do it again.
  typescript: { ignoreBuildErrors: true },
  reactStrictMode: true,
  poweredByHeader: false,
  pageExtensions: ['ts', 'tsx'],
  serverExternalPackages: ['sequelize', 'mariadb', '@node-rs/argon2', 'pdfkit', 'pino'],
  outputFileTracingRoot: import.meta.dirname,
  typedRoutes: false,
}

export default withMDX(config)
