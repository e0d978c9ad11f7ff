using System.Reflection;
using System.Reflection.Emit;

namespace RangeReduce.Tests.House;

/// <summary>Finds the types whose members a method calls or touches, by walking its instructions.</summary>
internal static class MethodBodyReader
{
    private static readonly Dictionary<short, OpCode> OpCodesByValue = typeof(OpCodes)
        .GetFields(BindingFlags.Public | BindingFlags.Static)
        .Select(field => (OpCode)field.GetValue(null)!)
        .ToDictionary(code => code.Value);

    /// <summary>Gives the declaring types of all members named in the body.</summary>
    public static IEnumerable<Type> TypesNamedIn(MethodBase method)
    {
        var bytes = method.GetMethodBody()?.GetILAsByteArray();
        if (bytes is null)
        {
            yield break;
        }

        var at = 0;
        while (at < bytes.Length)
        {
            var value = bytes[at] == 0xFE ? unchecked((short)(0xFE00 | bytes[at + 1])) : bytes[at];
            var code = OpCodesByValue[value];
            at += code.Size;
            if (code.OperandType is OperandType.InlineMethod or OperandType.InlineField or OperandType.InlineType or OperandType.InlineTok)
            {
                if (Resolve(method, BitConverter.ToInt32(bytes, at)) is { } type)
                {
                    yield return type;
                }
            }

            at += OperandSize(code.OperandType, bytes, at);
        }
    }

    private static Type? Resolve(MethodBase method, int token)
    {
        var typeArguments = method.DeclaringType is { IsGenericType: true } owner ? owner.GetGenericArguments() : null;
        var methodArguments = method is { IsGenericMethod: true } ? method.GetGenericArguments() : null;
        var member = method.Module.ResolveMember(token, typeArguments, methodArguments);
        return member as Type ?? member?.DeclaringType;
    }

    private static int OperandSize(OperandType type, byte[] bytes, int at) => type switch
    {
        OperandType.InlineNone => 0,
        OperandType.ShortInlineBrTarget or OperandType.ShortInlineI or OperandType.ShortInlineVar => 1,
        OperandType.InlineVar => 2,
        OperandType.InlineI8 or OperandType.InlineR => 8,
        OperandType.InlineSwitch => 4 + (4 * BitConverter.ToInt32(bytes, at)),
        _ => 4,
    };
}
