/**
 */
package gapwright.model;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.util.Enumerator;

/**
 * <!-- begin-user-doc -->
 * A representation of the literals of the enumeration '<em><b>Winding Arrangement</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * How two windings lie in a window.
 * <!-- end-model-doc -->
 * @see gapwright.model.GapwrightPackage#getWindingArrangement()
 * @model
 * @generated
 */
public enum WindingArrangement implements Enumerator {
	/**
	 * The '<em><b>CONCENTRIC</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #CONCENTRIC_VALUE
	 * @generated
	 * @ordered
	 */
	CONCENTRIC(0, "CONCENTRIC", "CONCENTRIC"),

	/**
	 * The '<em><b>SIDE BY SIDE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #SIDE_BY_SIDE_VALUE
	 * @generated
	 * @ordered
	 */
	SIDE_BY_SIDE(1, "SIDE_BY_SIDE", "SIDE_BY_SIDE");

	/**
	 * The '<em><b>CONCENTRIC</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #CONCENTRIC
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int CONCENTRIC_VALUE = 0;

	/**
	 * The '<em><b>SIDE BY SIDE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #SIDE_BY_SIDE
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int SIDE_BY_SIDE_VALUE = 1;

	/**
	 * An array of all the '<em><b>Winding Arrangement</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final WindingArrangement[] VALUES_ARRAY =
		new WindingArrangement[] {
			CONCENTRIC,
			SIDE_BY_SIDE,
		};

	/**
	 * A public read-only list of all the '<em><b>Winding Arrangement</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<WindingArrangement> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Winding Arrangement</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static WindingArrangement get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			WindingArrangement result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Winding Arrangement</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static WindingArrangement getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			WindingArrangement result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Winding Arrangement</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static WindingArrangement get(int value) {
		switch (value) {
			case CONCENTRIC_VALUE: return CONCENTRIC;
			case SIDE_BY_SIDE_VALUE: return SIDE_BY_SIDE;
		}
		return null;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final int value;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String name;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String literal;

	/**
	 * Only this class can construct instances.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private WindingArrangement(int value, String name, String literal) {
		this.value = value;
		this.name = name;
		this.literal = literal;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getValue() {
	  return value;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
	  return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getLiteral() {
	  return literal;
	}

	/**
	 * Returns the literal value of the enumerator, which is its string representation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		return literal;
	}
	
} //WindingArrangement
