// Some packages export nothing but the "import" condition; Jest asks for "require" first.
module.exports = (request, options) => {
  try {
    return options.defaultResolver(request, options);
  } catch (error) {
    try {
      return options.defaultResolver(request, { ...options, conditions: ['node', 'import', 'default'] });
    } catch {
      throw error;
    }
  }
};
